package manyskies.estimator;

import java.util.EnumMap;
import java.util.HashMap;
import java.util.Map;
import java.util.function.Function;
import manyskies.field.CmbModes;
import manyskies.field.SkyField;
import manyskies.field.SkyTransform;
import manyskies.filter.InverseVariance;
import manyskies.spectrum.ModeSpectra;
import manyskies.spectrum.Spectrum;

/**
 * What an analysis believes: weight spectra, filters and totals, on the modes it works with.
 *
 * <p>Hands out the same {@link LegField} object for the same request, so that estimators built from
 * one belief share their maps. One thread at a time, as its transform.
 */
public final class Belief {
    private final SkyTransform transform;
    private final ModeSpectra weights;
    private final ModeSpectra total;
    private final double lout;
    private final SlopedFields sloped;
    private final EnumMap<SkyField, LegField> filtered = new EnumMap<>(SkyField.class);
    private final EnumMap<SkyField, LegField> jointlyFiltered = new EnumMap<>(SkyField.class);
    private final Map<Weighted, LegField> weighted = new HashMap<>();
    private final Map<Class<?>, Object> shared = new HashMap<>();

    private record Weighted(SkyField field, Spectrum spectrum) {}

    /**
     * A belief.
     *
     * @param transform the transform in which products of legs are taken
     * @param weights spectra in the weights and in the assumed response, uK^2 sr
     * @param total believed total spectra of the beam-deconvolved sky, uK^2 sr
     * @param filter the inverse-variance filter
     * @param lout largest L that is reconstructed; up to it products on the transform's grid must
     *     be exact
     */
    public Belief(
            SkyTransform transform,
            ModeSpectra weights,
            ModeSpectra total,
            InverseVariance filter,
            double lout) {
        this.transform = transform;
        this.weights = weights;
        this.total = total;
        this.lout = lout;
        sloped = new SlopedFields(transform);
        for (SkyField x : SkyField.values()) {
            filtered.put(x, LegField.of(x, filter.separate(x)));
            EnumMap<SkyField, double[]> row = new EnumMap<>(SkyField.class);
            for (SkyField y : SkyField.values()) {
                row.put(y, filter.joint(x, y));
            }
            jointlyFiltered.put(x, LegField.of(row));
        }
    }

    private Belief(Belief belief, SkyTransform transform) {
        this.transform = transform;
        weights = belief.weights;
        total = belief.total;
        lout = belief.lout;
        sloped = new SlopedFields(transform);
        filtered.putAll(belief.filtered);
        jointlyFiltered.putAll(belief.jointlyFiltered);
        weighted.putAll(belief.weighted);
    }

    /** The transform in which products of legs are taken. */
    public SkyTransform transform() {
        return transform;
    }

    /** Spectra in the weights and in the assumed response. */
    public ModeSpectra weights() {
        return weights;
    }

    /** Total spectra believed. */
    public ModeSpectra total() {
        return total;
    }

    /** Whether a mode is reconstructed: 0 &lt; L &le; lout. */
    public boolean reconstructs(int mode) {
        double multipole = transform.space().multipole(mode);
        return multipole > 0 && multipole <= lout;
    }

    /**
     * The same belief, working with another transform of the same space: for another thread. The
     * leg fields are shared, so that estimators made for one serve the other; what {@link #shared}
     * has made is not, since it may hold the transform.
     *
     * @throws IllegalArgumentException if the transform is one of another space
     */
    public Belief on(SkyTransform other) {
        if (!other.space().equals(transform.space())) {
            throw new IllegalArgumentException(
                    "a belief about modes of "
                            + transform.space()
                            + " cannot work with a transform of "
                            + other.space());
        }
        return new Belief(this, other);
    }

    /** X_bar: a field filtered on its own. */
    public LegField filtered(SkyField x) {
        return filtered.get(x);
    }

    /** C^XY X_bar: a field filtered on its own, times a weight spectrum. */
    public LegField weighted(SkyField x, Spectrum spectrum) {
        return weighted.computeIfAbsent(
                new Weighted(x, spectrum), key -> filtered(x).times(weights.of(spectrum)));
    }

    /** X_bar: a field of the joint filter. */
    public LegField jointlyFiltered(SkyField x) {
        return jointlyFiltered.get(x);
    }

    /** An object that all estimators of this belief share, made when first asked for. */
    public <S> S shared(Class<S> type, Function<Belief, S> make) {
        return type.cast(shared.computeIfAbsent(type, key -> make.apply(this)));
    }

    /** Maps of a sky, to be shared by all estimators of this belief. */
    public LegMaps maps(CmbModes legs) {
        return new LegMaps(legs, transform, sloped);
    }

    /** Two skies, or the same one twice, ready for this belief's estimators. */
    public LegPair pair(LegMaps a, LegMaps b) {
        return new LegPair(transform, a, b);
    }
}
