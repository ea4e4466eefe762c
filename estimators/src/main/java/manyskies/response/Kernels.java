package manyskies.response;

import java.util.HashMap;
import java.util.Map;
import manyskies.field.Modes;
import manyskies.field.SkyTransform;
import manyskies.field.SpinMap;

/** The kernels of one function of l for several spins; each |s| is transformed once. */
final class Kernels {
    private final SkyTransform transform;
    private final Modes function;
    private final Map<Integer, SpinMap> made = new HashMap<>();

    Kernels(SkyTransform transform, Modes function) {
        this.transform = transform;
        this.function = function;
    }

    Kernel of(int spin) {
        return Kernel.of(
                spin,
                made.computeIfAbsent(Math.abs(spin), s -> transform.synthesise(s, function, null)));
    }
}
