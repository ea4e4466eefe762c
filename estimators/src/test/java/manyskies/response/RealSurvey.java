package manyskies.response;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;
import java.util.function.IntToDoubleFunction;
import manyskies.estimator.Belief;
import manyskies.estimator.BilinearWeight;
import manyskies.estimator.Estimators;
import manyskies.filter.InverseVariance;
import manyskies.flat.FlatGrid;
import manyskies.flat.FlatTransform;
import manyskies.flat.ProductGrid;
import manyskies.spectrum.Bandpowers;
import manyskies.spectrum.Bands;
import manyskies.spectrum.ModeSpectra;
import manyskies.spectrum.Spectra;
import manyskies.spectrum.SpectraReader;
import manyskies.spectrum.Spectrum;

/** Analytic noise of a survey with the fiducial spectra: white noise, a Gaussian beam, no mask. */
final class RealSurvey {
    static final double ARCMIN = Math.PI / 180 / 60;
    static final double LMAX = 3500;
    static final double LOUT = 1300;

    private final FlatGrid grid;
    private final Belief belief;
    private final AnalyticResponse analytic;
    private final Map<String, BilinearWeight> weights = new HashMap<>();

    /**
     * A survey.
     *
     * @param pixels side of the patch in pixels of 3 arcmin
     * @param depth noise of temperature, uK arcmin; polarisation has sqrt(2) times as much
     * @param beam full width at half maximum, arcmin
     * @param lensed spectra of the sky
     * @param used spectra in the weights and responses
     */
    RealSurvey(int pixels, double depth, double beam, Spectra lensed, Spectra used) {
        grid = ProductGrid.of(new FlatGrid(pixels, pixels, 3 * ARCMIN), LMAX, LOUT);
        double sigma = beam * ARCMIN / Math.sqrt(8 * Math.log(2));
        double white = depth * ARCMIN * (depth * ARCMIN);
        double[] noise = new double[grid.size()];
        Arrays.setAll(noise, mode -> white * Math.exp(Math.pow(grid.multipole(mode) * sigma, 2)));
        double[] twice = Arrays.stream(noise).map(n -> 2 * n).toArray();
        ModeSpectra total =
                ModeSpectra.sample(lensed, grid)
                        .plus(Map.of(Spectrum.TT, noise, Spectrum.EE, twice, Spectrum.BB, twice));
        belief =
                new Belief(
                        FlatTransform.of(grid, LMAX),
                        ModeSpectra.sample(used, grid),
                        total,
                        InverseVariance.of(total, RealSurvey::kept, RealSurvey::kept),
                        LOUT);
        analytic = AnalyticResponse.of(belief);
    }

    private static boolean kept(double l) {
        return l >= 2 && l <= LMAX;
    }

    /** The fiducial spectra, read from conf. */
    static Spectra fiducial(String kind) throws IOException {
        Path file = Path.of("..", "conf", "spectra", "fiducial_" + kind + ".txt");
        try (var reader = Files.newBufferedReader(file)) {
            return SpectraReader.requiring(Spectrum.TT, Spectrum.EE, Spectrum.TE)
                    .read(reader, file.toString());
        }
    }

    private BilinearWeight weight(String name) {
        return weights.computeIfAbsent(
                name, n -> Estimators.named(n).prepare(belief).weight().orElseThrow());
    }

    /** R_L per mode. */
    double[] response(String name) {
        return analytic.response(weight(name), belief.weights()).lens();
    }

    /** N0_L of an estimator, or of two. */
    double[] n0(String a, String b) {
        double[] n = analytic.noise(weight(a), weight(b), belief.total()).lens();
        double[] ra = response(a);
        double[] rb = response(b);
        return ofModes(mode -> n[mode] / (ra[mode] * rb[mode]));
    }

    /** N0_L of the best combination of two estimators, 1 / (1^T N^-1 1). */
    double[] n0OfBoth(String a, String b) {
        double[] aa = n0(a, a);
        double[] bb = n0(b, b);
        double[] ab = n0(a, b);
        return ofModes(
                mode ->
                        (aa[mode] * bb[mode] - ab[mode] * ab[mode])
                                / (aa[mode] + bb[mode] - 2 * ab[mode]));
    }

    /** C_L^phiphi of a table per mode. */
    double[] lenses(Spectra table) {
        return ofModes(mode -> table.at(Spectrum.PP, grid.fullSkyMultipole(mode)));
    }

    /** The mean over all modes of an annulus. */
    double mean(double from, double to, double[] ofMode) {
        return Bandpowers.of(grid, Bands.between(from, to)).mean(ofMode)[0];
    }

    /** Whether a mode is reconstructed. */
    boolean reconstructs(int mode) {
        return !grid.isNyquist(mode) && belief.reconstructs(mode);
    }

    /** |l| of a mode. */
    double multipole(int mode) {
        return grid.multipole(mode);
    }

    private double[] ofModes(IntToDoubleFunction f) {
        double[] out = new double[grid.size()];
        for (int mode = 0; mode < out.length; mode++) {
            out[mode] = reconstructs(mode) ? f.applyAsDouble(mode) : 0;
        }
        return out;
    }
}
