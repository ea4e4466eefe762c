package manyskies.realisation;

import java.util.Map;
import manyskies.estimator.LegMaps;
import manyskies.estimator.Reconstruction;
import manyskies.field.Modes;
import manyskies.random.Address;
import manyskies.result.Block;
import manyskies.result.BlockId;
import manyskies.sky.UnlensedSky;
import manyskies.spectrum.Bandpowers;

/**
 * Runs the realisations of a block in the order of their indices and measures each.
 *
 * <p>Spectra are of phi. Auto-spectra are divided by mean(W^4) and cross-spectra with the input by
 * mean(W^2), W the edge taper, so that the remaining transfer is near one; field sums are divided by
 * sqrt(mean(W^4)), so that their power is corrected likewise. One thread at a time.
 */
public final class BlockRunner {
    /** Name of the set of skies that are reconstructed. */
    public static final String DATA = "data";

    /** Name of the set of pairs of independent skies. */
    public static final String PAIRS = "pairs";

    private final SkyWorker worker;
    private final Bandpowers bandpowers;
    private final double auto;
    private final double cross;

    private BlockRunner(SkyWorker worker) {
        this.worker = worker;
        bandpowers = worker.model().bandpowers();
        auto = 1 / worker.model().meanMask4();
        cross = 1 / worker.model().meanMask2();
    }

    /** A runner for one thread. */
    public static BlockRunner of(RunModel model) {
        return new BlockRunner(SkyWorker.of(model));
    }

    /**
     * The finished block.
     *
     * @throws RealisationException if a realisation fails, or the set is unknown; it names set and
     *     index
     */
    public Block run(BlockId id) {
        Measurements measured = new Measurements();
        for (int index = id.first(); index < id.first() + id.count(); index++) {
            try {
                measure(id.set(), index, measured);
            } catch (RuntimeException e) {
                throw new RealisationException(id.set(), index, e);
            }
        }
        return measured.block(id);
    }

    private void measure(String set, int index, Measurements to) {
        switch (set) {
            case DATA -> measureSky(index, to);
            case PAIRS -> measurePair(index, to);
            default -> throw new IllegalArgumentException("there is no set '" + set + "'");
        }
    }

    private void measureSky(int index, Measurements to) {
        Address address = worker.address(DATA, index);
        UnlensedSky sky = worker.draw(address);
        LegMaps legs = worker.legs(sky, address);
        Modes input = worker.input(sky);
        to.row("input.auto", bandpowers.average(input, input));
        worker.reconstruct(legs, legs).forEach((name, found) -> measureSky(name, found, input, to));
    }

    private void measureSky(String name, Reconstruction found, Modes input, Measurements to) {
        Modes phi = found.gradient();
        Modes psi = found.curl();
        to.row(name + ".auto", scaled(bandpowers.average(phi, phi), auto));
        to.row(name + ".cross_input", scaled(bandpowers.average(phi, input), cross));
        to.row(name + ".curl_auto", scaled(bandpowers.average(psi, psi), auto));
        to.row(name + ".curl_cross", scaled(bandpowers.average(psi, input), cross));
        to.add(name, phi, Math.sqrt(auto));
    }

    /** C[ss', ss'] + C[ss', s's] of two independent skies, whose mean is N0. */
    private void measurePair(int index, Measurements to) {
        LegMaps a = pairLegs("a", index);
        LegMaps b = pairLegs("b", index);
        Map<String, Reconstruction> swapped = worker.reconstruct(b, a);
        worker.reconstruct(a, b)
                .forEach((name, found) -> measurePair(name, found, swapped.get(name), to));
    }

    private LegMaps pairLegs(String half, int index) {
        Address address = worker.address(PAIRS + "/" + half, index);
        return worker.legs(worker.draw(address), address);
    }

    private void measurePair(String name, Reconstruction ab, Reconstruction ba, Measurements to) {
        to.row(name + ".n0_mc", pairPower(ab.gradient(), ba.gradient()));
        to.row(name + ".curl_n0_mc", pairPower(ab.curl(), ba.curl()));
    }

    private double[] pairPower(Modes ab, Modes ba) {
        return scaled(bandpowers.average(ab, ab.combine(1, ba, 1)), auto);
    }

    private static double[] scaled(double[] power, double factor) {
        for (int band = 0; band < power.length; band++) {
            power[band] *= factor;
        }
        return power;
    }
}
