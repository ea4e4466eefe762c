package manyskies.estimator;

import java.util.HashMap;
import java.util.Map;
import manyskies.field.SkyTransform;

/**
 * Two legs, with everything estimators have made of them so far.
 *
 * <p>Reconstructions are kept by the estimator's name, so that a combination reuses its parts. One
 * thread at a time.
 */
public final class LegPair {
    private final SkyTransform transform;
    private final LegMaps a;
    private final LegMaps b;
    private final Map<String, Reconstruction> made = new HashMap<>();

    LegPair(SkyTransform transform, LegMaps a, LegMaps b) {
        this.transform = transform;
        this.a = a;
        this.b = b;
    }

    /** The transform in which products are analysed. */
    public SkyTransform transform() {
        return transform;
    }

    /** Maps of leg a. */
    public LegMaps a() {
        return a;
    }

    /** Maps of leg b. */
    public LegMaps b() {
        return b;
    }

    /** Whether both legs are one sky. */
    public boolean isOneSky() {
        return a == b;
    }

    /** The unnormalised reconstruction of an estimator, made once. */
    public Reconstruction reconstruct(Estimator estimator) {
        Reconstruction found = made.get(estimator.name());
        if (found == null) {
            found = estimator.reconstruct(this);
            made.put(estimator.name(), found);
        }
        return found;
    }
}
