package manyskies.estimator;

import java.util.HashMap;
import java.util.Map;
import manyskies.field.CmbModes;
import manyskies.field.Modes;
import manyskies.field.SkyTransform;
import manyskies.field.SpinMap;

/**
 * The spin maps of one leg, each made when first asked for and then shared by all estimators.
 *
 * <p>One thread at a time; lives as long as one reconstruction.
 */
public final class LegMaps {
    private final CmbModes legs;
    private final SkyTransform transform;
    private final SlopedFields sloped;
    private final Map<Key, SpinMap> made = new HashMap<>();

    private record Key(int spin, LegField e, LegField b) {}

    LegMaps(CmbModes legs, SkyTransform transform, SlopedFields sloped) {
        this.legs = legs;
        this.transform = transform;
        this.sloped = sloped;
    }

    /** The modes of the sky itself, for estimators that need more than maps. */
    public CmbModes legs() {
        return legs;
    }

    /** The spin-0 map of a field. */
    public SpinMap scalar(LegField field) {
        return map(0, field, null);
    }

    /** The complex gradient d_x + i d_y of a spin-0 field, a map of spin 1. */
    public SpinMap scalarGradient(LegField field) {
        return map(1, sloped.of(0, field), null);
    }

    /** The spin-2 map of a gradient and a curl part, null for none. */
    public SpinMap polarised(LegField e, LegField b) {
        return map(2, e, b);
    }

    /** (d_x + i d_y) of a spin-2 field, a map of spin 3. */
    public SpinMap raised(LegField e, LegField b) {
        return map(3, sloped.of(2, e), sloped.of(2, b));
    }

    /** -(d_x - i d_y) of a spin-2 field, a map of spin 1. */
    public SpinMap lowered(LegField e, LegField b) {
        return map(1, sloped.of(-2, e), sloped.of(-2, b));
    }

    private SpinMap map(int spin, LegField e, LegField b) {
        Key key = new Key(spin, e, b);
        SpinMap found = made.get(key);
        if (found == null) {
            Modes gradient = e == null ? Modes.zero(transform.space()) : e.of(legs);
            found = transform.synthesise(spin, gradient, b == null ? null : b.of(legs));
            made.put(key, found);
        }
        return found;
    }
}
