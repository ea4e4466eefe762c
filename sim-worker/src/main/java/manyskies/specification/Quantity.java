package manyskies.specification;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;

/**
 * Kinds of quantities, with the units in which people write them. In the code an angle is in
 * radian, a noise depth in uK radian.
 */
final class Quantity {
    /** An angle. */
    static final Quantity ANGLE =
            new Quantity(
                    "an angle",
                    fraction("arcmin", 10800),
                    fraction("deg", 180),
                    fraction("arcsec", 648000),
                    new Unit("rad", BigDecimal.ONE));

    /** A white noise depth, the square root of a noise power. */
    static final Quantity DEPTH = new Quantity("a depth", fraction("uK-arcmin", 10800));

    private record Unit(String name, BigDecimal size) {}

    private final String noun;
    private final List<Unit> units; // in the order of preference when printed

    private Quantity(String noun, Unit... units) {
        this.noun = noun;
        this.units = List.of(units);
    }

    private static Unit fraction(String name, int ofPi) {
        return new Unit(name, Decimal.PI.divide(BigDecimal.valueOf(ofPi), new MathContext(50)));
    }

    /** With its article, for sentences. */
    String noun() {
        return noun;
    }

    /** The size of a unit in the code's unit; none if it is no unit of this kind. */
    Optional<BigDecimal> size(String name) {
        // the micro sign and the Greek mu are what a keyboard may give for the u
        String plain = name.replace('\u00b5', 'u').replace('\u03bc', 'u');
        return units.stream().filter(u -> u.name.equals(plain)).map(Unit::size).findFirst();
    }

    /** The names of the units for a sentence. */
    String units() {
        return units.stream().map(Unit::name).collect(Collectors.joining(", "));
    }

    /** An example of a value for a sentence. */
    String example() {
        return "5 " + units.get(0).name;
    }

    /**
     * A value in the unit that needs the fewest digits, the first of equals. Reading the text back
     * gives the same double.
     */
    String text(double value) {
        String best = null;
        int least = Integer.MAX_VALUE;
        for (Unit unit : units) {
            String number = Decimal.shortest(value, unit.size);
            int digits = number.replace(".", "").length();
            if (digits < least) {
                least = digits;
                best = number + " " + unit.name;
            }
        }
        return best;
    }
}
