package manyskies.picture;

/** A map with what it shows and in which unit: ny rows of nx values, x running fastest. */
public final class NamedMap {
    private final String name;
    private final String unit;
    private final double[] values;

    private NamedMap(String name, String unit, double[] values) {
        this.name = name;
        this.unit = unit;
        this.values = values;
    }

    /**
     * A map; the array is kept, not copied, and not to be changed.
     *
     * @param unit as FITS spells it, for example {@code uK} or {@code rad2}; empty if none
     */
    public static NamedMap of(String name, String unit, double[] values) {
        return new NamedMap(name, unit, values);
    }

    /** What it shows, for example {@code lensed T}. */
    public String name() {
        return name;
    }

    /** The unit of its values. */
    public String unit() {
        return unit;
    }

    /** Its values, read only. */
    public double[] values() {
        return values;
    }
}
