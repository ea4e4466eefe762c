package manyskies.spectrum;

import java.io.Serializable;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.Map;

/**
 * A set of power spectra C_l for l = 0 .. lmax; a spectrum that was not given is zero.
 *
 * <p>Units as in {@link Spectrum}. Immutable.
 */
public final class Spectra implements Serializable {
    private static final long serialVersionUID = 1L;

    private final int lmax;
    private final EnumMap<Spectrum, double[]> values;

    private Spectra(int lmax, EnumMap<Spectrum, double[]> values) {
        this.lmax = lmax;
        this.values = values;
    }

    /**
     * Spectra from arrays indexed by l, all of length lmax + 1; arrays are copied.
     *
     * @throws IllegalArgumentException if lengths differ from lmax + 1 or a value is not finite
     */
    public static Spectra of(int lmax, Map<Spectrum, double[]> values) {
        EnumMap<Spectrum, double[]> copy = new EnumMap<>(Spectrum.class);
        values.forEach((name, array) -> copy.put(name, checked(lmax, name, array)));
        return new Spectra(lmax, copy);
    }

    private static double[] checked(int lmax, Spectrum name, double[] array) {
        if (array.length != lmax + 1) {
            throw new IllegalArgumentException(
                    name + " has " + array.length + " values, expected " + (lmax + 1));
        }
        for (int l = 0; l <= lmax; l++) {
            if (!Double.isFinite(array[l])) {
                throw new IllegalArgumentException(
                        name + " is " + array[l] + " at l = " + l + "; a spectrum is finite");
            }
        }
        return array.clone();
    }

    /** The largest multipole of the table. */
    public int lmax() {
        return lmax;
    }

    /** C_l for l = 0 .. lmax, as a copy. */
    public double[] values(Spectrum name) {
        double[] found = values.get(name);
        return found == null ? new double[lmax + 1] : found.clone();
    }

    /** Whether the spectrum was given and is not zero throughout. */
    public boolean has(Spectrum name) {
        double[] found = values.get(name);
        return found != null && Arrays.stream(found).anyMatch(v -> v != 0);
    }

    /** C_l at a multipole that need not be whole: linear in l between entries, zero outside. */
    public double at(Spectrum name, double l) {
        double[] table = values.get(name);
        if (table == null || l < 0 || l > lmax) {
            return 0;
        }
        int below = (int) l;
        return below == lmax
                ? table[lmax]
                : table[below] + (l - below) * (table[below + 1] - table[below]);
    }

    /**
     * These spectra with some replaced.
     *
     * @throws IllegalArgumentException as {@link #of}
     */
    public Spectra with(Map<Spectrum, double[]> replaced) {
        EnumMap<Spectrum, double[]> all = new EnumMap<>(values);
        all.putAll(replaced);
        return of(lmax, all);
    }

    /** Whether every C_l is the same; a spectrum that was not given equals zeros. */
    @Override
    public boolean equals(Object other) {
        if (!(other instanceof Spectra spectra) || lmax != spectra.lmax) {
            return false;
        }
        for (Spectrum name : Spectrum.values()) {
            if (!Arrays.equals(values(name), spectra.values(name))) {
                return false;
            }
        }
        return true;
    }

    @Override
    public int hashCode() {
        int hash = lmax;
        for (Spectrum name : Spectrum.values()) {
            hash = 31 * hash + Arrays.hashCode(values(name));
        }
        return hash;
    }
}
