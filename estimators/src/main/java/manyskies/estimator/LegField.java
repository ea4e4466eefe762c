package manyskies.estimator;

import java.util.Arrays;
import java.util.EnumMap;
import java.util.Map;
import java.util.function.IntToDoubleFunction;
import manyskies.field.CmbModes;
import manyskies.field.Modes;
import manyskies.field.SkyField;
import manyskies.spectrum.ModeSpectra;

/**
 * A linear combination of T, E and B, mode by mode: U_l = sum_X u_X(l) X_l with real u.
 *
 * <p>Filters and weights are such combinations. Two are the same only if they are one object, so
 * that maps made from them can be shared. Immutable.
 */
public final class LegField {
    private final EnumMap<SkyField, double[]> coefficients;

    private LegField(EnumMap<SkyField, double[]> coefficients) {
        this.coefficients = coefficients;
    }

    /** A combination with the given coefficients per mode; absent fields and nulls count as zero. */
    public static LegField of(Map<SkyField, double[]> coefficients) {
        EnumMap<SkyField, double[]> kept = new EnumMap<>(SkyField.class);
        coefficients.forEach(
                (field, array) -> {
                    if (array != null) {
                        kept.put(field, array.clone());
                    }
                });
        return new LegField(kept);
    }

    /** One field alone. */
    public static LegField of(SkyField field, double[] coefficient) {
        return of(Map.of(field, coefficient));
    }

    /** This combination multiplied by a real factor per mode. */
    public LegField times(double[] factor) {
        return times(mode -> factor[mode]);
    }

    /** This combination multiplied by a real factor per mode. */
    public LegField times(IntToDoubleFunction factor) {
        EnumMap<SkyField, double[]> out = new EnumMap<>(SkyField.class);
        coefficients.forEach(
                (field, u) -> {
                    double[] scaled = new double[u.length];
                    Arrays.setAll(scaled, mode -> u[mode] * factor.applyAsDouble(mode));
                    out.put(field, scaled);
                });
        return new LegField(out);
    }

    /** The sum of this combination and another. */
    public LegField plus(LegField other) {
        EnumMap<SkyField, double[]> out = new EnumMap<>(coefficients);
        other.coefficients.forEach((field, v) -> out.merge(field, v, LegField::sum));
        return new LegField(out);
    }

    private static double[] sum(double[] a, double[] b) {
        double[] out = new double[a.length];
        Arrays.setAll(out, mode -> a[mode] + b[mode]);
        return out;
    }

    /** The coefficient of a field per mode, read only, or null if it is zero throughout. */
    public double[] coefficient(SkyField field) {
        return coefficients.get(field);
    }

    /** The modes of this combination in one sky. */
    public Modes of(CmbModes legs) {
        double[] out = new double[legs.temperature().values().length];
        coefficients.forEach((field, u) -> addTo(out, u, legs.of(field).values()));
        return Modes.of(legs.temperature().space(), out);
    }

    private static void addTo(double[] out, double[] u, double[] x) {
        for (int mode = 0; mode < u.length; mode++) {
            out[2 * mode] += u[mode] * x[2 * mode];
            out[2 * mode + 1] += u[mode] * x[2 * mode + 1];
        }
    }

    /**
     * Spectrum of this combination with another, sum_XY u_X v_Y C^XY per mode, or null if it is
     * zero throughout.
     */
    public double[] covariance(LegField other, ModeSpectra c) {
        double[] out = null;
        for (Map.Entry<SkyField, double[]> u : coefficients.entrySet()) {
            for (Map.Entry<SkyField, double[]> v : other.coefficients.entrySet()) {
                double[] cxy = c.of(u.getKey(), v.getKey());
                if (cxy != null) {
                    out = addProduct(out, u.getValue(), v.getValue(), cxy);
                }
            }
        }
        return out;
    }

    private static double[] addProduct(double[] sum, double[] u, double[] v, double[] c) {
        double[] out = sum == null ? new double[c.length] : sum;
        for (int mode = 0; mode < c.length; mode++) {
            out[mode] += u[mode] * v[mode] * c[mode];
        }
        return out;
    }
}
