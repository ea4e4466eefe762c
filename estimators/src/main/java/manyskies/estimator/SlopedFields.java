package manyskies.estimator;

import java.util.HashMap;
import java.util.Map;
import manyskies.field.SkyTransform;

/**
 * Leg fields times the slope of a spin-raising or -lowering derivative, made once per field.
 *
 * <p>Fields are compared by identity. One thread at a time.
 */
final class SlopedFields {
    private final SkyTransform transform;
    private final Map<Key, LegField> made = new HashMap<>();

    private record Key(int spin, LegField field) {}

    SlopedFields(SkyTransform transform) {
        this.transform = transform;
    }

    /** The field times slope(spin, l); null for null. */
    LegField of(int spin, LegField field) {
        return field == null
                ? null
                : made.computeIfAbsent(
                        new Key(spin, field),
                        key -> field.times(mode -> transform.slope(spin, mode)));
    }
}
