package manyskies.specification;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Numbers and quantities: what people write is what is printed, and nothing is lost. */
class DecimalTest {

    @ParameterizedTest
    @CsvSource({
        "3 arcmin, 3 arcmin",
        "0.1 arcmin, 6 arcsec",
        "1.47 arcmin, 1.47 arcmin",
        "60 arcmin, 1 deg",
        "17 deg, 17 deg",
        "30 arcsec, 0.5 arcmin",
        "1 arcsec, 1 arcsec",
        "0.001 rad, 0.001 rad",
    })
    void anglesArePrintedAsPeopleWriteThem(String written, String printed) {
        assertThat(Quantity.ANGLE.text(value(Quantity.ANGLE, written))).isEqualTo(printed);
    }

    @Test
    void printedQuantitiesReadBackToTheLastBit() {
        SplittableRandom random = new SplittableRandom(20261201);
        for (int i = 0; i < 2000; i++) {
            double value = StrictMath.pow(10, random.nextDouble(-9, 2)) * random.nextDouble(1, 2);
            for (Quantity kind : new Quantity[] {Quantity.ANGLE, Quantity.DEPTH}) {
                assertThat(value(kind, kind.text(value))).isEqualTo(value);
            }
            assertThat(Double.parseDouble(Decimal.text(value))).isEqualTo(value);
        }
    }

    @Test
    void anArcminuteIsThePartOfPiThatItIs() {
        assertThat(value(Quantity.ANGLE, "10800 arcmin")).isEqualTo(Math.PI);
        assertThat(value(Quantity.ANGLE, "180 deg")).isEqualTo(Math.PI);
        assertThat(value(Quantity.ANGLE, "648000 arcsec")).isEqualTo(Math.PI);
        assertThat(value(Quantity.DEPTH, "10800 uK-arcmin")).isEqualTo(Math.PI);
    }

    @ParameterizedTest
    @CsvSource({
        "0, 0",
        "0.1, 0.1",
        "3000, 3000",
        "1e15, 1000000000000000",
        "1e16, 1e16",
        "1e-6, 0.000001",
        "1e-7, 1e-7",
        "-2.5, -2.5",
        "1.7976931348623157e308, 1.7976931348623157e308",
        "4.9e-324, 5e-324"
    })
    void numbersAreShort(double value, String text) {
        assertThat(Decimal.text(value)).isEqualTo(text);
        assertThat(Double.parseDouble(text)).isEqualTo(value);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"", "NaN", "Infinity", "0x10", "1f", "1e9999", "1_000", "1,5", "1 2", "."})
    void otherTextsAreNoNumbers(String text) {
        assertThat(Decimal.parse(text)).isEmpty();
    }

    @ParameterizedTest
    @CsvSource({
        "lmaks, lmax",
        "LMAX, lmax",
        "lmx, lmax",
        "l_min, lmin",
        "pixel_size, pixel-size",
        "tapre, taper"
    })
    void aNearNameIsFound(String unknown, String near) {
        assertThat(NearName.of(unknown, List.of("lmin", "lmax", "pixel-size", "taper")))
                .contains(near);
    }

    @ParameterizedTest
    @ValueSource(strings = {"telescope", "foo", "x", ""})
    void aFarNameIsNot(String unknown) {
        assertThat(NearName.of(unknown, List.of("lmin", "lmax", "pixel-size", "taper"))).isEmpty();
    }

    private static double value(Quantity kind, String text) {
        String[] parts = text.split(" ", 2);
        return Decimal.scaled(new BigDecimal(parts[0]), kind.size(parts[1]).orElseThrow());
    }
}
