package manyskies.realisation;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import manyskies.estimator.LegMaps;
import manyskies.field.Modes;
import manyskies.flat.ModeCopy;
import manyskies.random.Address;
import manyskies.sky.UnlensedSky;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** A sky that is rotated as well as lensed: the curl estimate must find psi, with its sign. */
class CurlTest {
    private static final int SKIES = 12;

    /**
     * With C_L^psipsi a tenth of C_L^phiphi the extra deflection is not in the assumed spectra, so
     * that a few per cent of bias are expected; a wrong sign or normalisation is not.
     */
    @ParameterizedTest
    @ValueSource(strings = {"tt", "eb", "joint"})
    void theCurlEstimateIsTheCurlPotential(String name) {
        RunModel model = RunModel.of(SmallRun.with(0, 0.1, List.of(name)));
        SkyWorker worker = SkyWorker.of(model);
        ModeCopy crop = ModeCopy.of(model.mapGrid(), model.productGrid(), Double.POSITIVE_INFINITY);
        double cross = 0;
        double input = 0;
        for (int index = 0; index < SKIES; index++) {
            Address address = worker.address("data", index);
            UnlensedSky sky = worker.draw(address);
            Modes psi = model.reconstructed().pack(crop.copy(sky.psi().orElseThrow()));
            LegMaps legs = worker.legs(sky, address);
            Modes found = worker.reconstruct(legs, legs).get(name).curl();
            cross += model.bandpowers().average(found, psi)[0];
            input += model.bandpowers().average(psi, psi)[0];
        }
        // 100 < L < 300: 140 modes a sky, N0 at most 15 C^psipsi: error of the ratio below 0.1
        assertThat(cross / input).isBetween(0.5, 1.5);
    }
}
