package manyskies.spectrum;

import java.util.EnumMap;
import java.util.Map;
import java.util.function.IntToDoubleFunction;
import manyskies.field.ModeSpace;
import manyskies.field.SkyField;

/**
 * C_l^TT, TE, EE and BB at each mode of a space, in uK^2 sr.
 *
 * <p>Correlations of T or E with B are zero, as parity demands. Arrays are read only to others.
 */
public final class ModeSpectra {
    private final ModeSpace space;
    private final EnumMap<Spectrum, double[]> values;

    private ModeSpectra(ModeSpace space, EnumMap<Spectrum, double[]> values) {
        this.space = space;
        this.values = values;
    }

    /** A table read at the full-sky multipole of each mode; zero outside the table. */
    public static ModeSpectra sample(Spectra table, ModeSpace space) {
        return sample(table, space, space::fullSkyMultipole);
    }

    /** A table read at a multipole of the caller's choice for each mode. */
    public static ModeSpectra sample(
            Spectra table, ModeSpace space, IntToDoubleFunction multipole) {
        EnumMap<Spectrum, double[]> values = new EnumMap<>(Spectrum.class);
        for (Spectrum name : new Spectrum[] {Spectrum.TT, Spectrum.TE, Spectrum.EE, Spectrum.BB}) {
            double[] ofMode = new double[space.size()];
            for (int mode = 0; mode < ofMode.length; mode++) {
                ofMode[mode] = table.at(name, multipole.applyAsDouble(mode));
            }
            values.put(name, ofMode);
        }
        return new ModeSpectra(space, values);
    }

    /** The space of modes. */
    public ModeSpace space() {
        return space;
    }

    /**
     * One spectrum, per mode.
     *
     * @throws IllegalArgumentException for a spectrum of the lensing potential
     */
    public double[] of(Spectrum name) {
        double[] found = values.get(name);
        if (found == null) {
            throw new IllegalArgumentException("no spectrum " + name + " of the CMB fields");
        }
        return found;
    }

    /** The spectrum of two fields per mode, or null where parity makes it zero. */
    public double[] of(SkyField x, SkyField y) {
        if (x == y) {
            return of(
                    switch (x) {
                        case T -> Spectrum.TT;
                        case E -> Spectrum.EE;
                        case B -> Spectrum.BB;
                    });
        }
        return x == SkyField.B || y == SkyField.B ? null : of(Spectrum.TE);
    }

    /**
     * These spectra plus others (noise), per mode.
     *
     * @throws IllegalArgumentException if an array has another length than the space
     */
    public ModeSpectra plus(Map<Spectrum, double[]> added) {
        EnumMap<Spectrum, double[]> sum = new EnumMap<>(values);
        added.forEach((name, array) -> sum.put(name, sum(of(name), array)));
        return new ModeSpectra(space, sum);
    }

    private static double[] sum(double[] a, double[] b) {
        if (a.length != b.length) {
            throw new IllegalArgumentException(
                    "expected " + a.length + " numbers, found " + b.length);
        }
        double[] out = a.clone();
        for (int mode = 0; mode < out.length; mode++) {
            out[mode] += b[mode];
        }
        return out;
    }
}
