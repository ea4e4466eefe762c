package manyskies.realisation;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import manyskies.estimator.Belief;
import manyskies.estimator.BilinearWeight;
import manyskies.estimator.Estimator;
import manyskies.estimator.Estimators;
import manyskies.field.ModeSubset;
import manyskies.filter.InverseVariance;
import manyskies.flat.FlatGrid;
import manyskies.flat.FlatTransform;
import manyskies.flat.ProductGrid;
import manyskies.instrument.EdgeTaper;
import manyskies.instrument.GaussianBeam;
import manyskies.response.AnalyticResponse;
import manyskies.response.LensAndCurl;
import manyskies.specification.Analysis;
import manyskies.specification.Patch;
import manyskies.specification.Specification;
import manyskies.specification.Survey;
import manyskies.spectrum.Bandpowers;
import manyskies.spectrum.LensedGradientSpectra;
import manyskies.spectrum.LensedSpectra;
import manyskies.spectrum.ModeSpectra;
import manyskies.spectrum.Spectra;
import manyskies.spectrum.Spectrum;

/**
 * What all realisations of a run share; made once per JVM, then only read.
 *
 * <p>Spectra: the truth is the unlensed table; filters use the lensed spectra plus noise over beam
 * squared; weights and responses what the specification names. Products of legs are taken on the
 * smallest grid on which they are exact up to the last band.
 */
public final class RunModel {
    private final Specification specification;
    private final FlatGrid mapGrid;
    private final FlatGrid productGrid;
    private final double lout; // largest L that is reconstructed
    private final Belief belief;
    private final double[] deconvolution; // 1 / B_l on the product grid
    private final List<Estimator> estimators = new ArrayList<>();
    private final Map<String, Normalisation> normalisation = new LinkedHashMap<>();
    private final Map<String, double[]> analytic = new TreeMap<>();
    private final ModeSubset reconstructed;
    private final Bandpowers bandpowers;
    private final double meanMask2;
    private final double meanMask4;

    private RunModel(Specification specification) {
        this.specification = specification;
        Patch patch = specification.patch();
        Analysis analysis = specification.analysis();
        mapGrid = new FlatGrid(patch.nx(), patch.ny(), patch.pixel());
        lout = analysis.bands().upper(analysis.bands().count() - 1);
        productGrid = ProductGrid.of(mapGrid, lmax(), lout);
        Belief preparing = assumed();
        belief = preparing.on(preparing.transform()); // without the integrals of the preparation
        deconvolution = deconvolution(specification.survey());
        reconstructed = ModeSubset.of(productGrid, preparing::reconstructs);
        bandpowers = Bandpowers.of(reconstructed, analysis.bands());
        Optional<EdgeTaper> taper =
                specification.survey().edgeTaper() == 0
                        ? Optional.empty()
                        : Optional.of(EdgeTaper.of(mapGrid, specification.survey().edgeTaper()));
        meanMask2 = taper.map(t -> t.meanPower(2)).orElse(1.0);
        meanMask4 = taper.map(t -> t.meanPower(4)).orElse(1.0);
        analysis.estimators().forEach(name -> prepare(name, preparing));
    }

    /**
     * Everything that follows from a specification; takes some seconds.
     *
     * @throws IllegalArgumentException if an estimator is not installed or a filter impossible
     */
    public static RunModel of(Specification specification) {
        return new RunModel(specification);
    }

    private Belief assumed() {
        Analysis analysis = specification.analysis();
        Spectra unlensed = specification.unlensed();
        Spectra lensed = LensedSpectra.of(unlensed);
        Spectra weights =
                switch (analysis.weights()) {
                    case LENSED_GRADIENT -> LensedGradientSpectra.of(unlensed);
                    case LENSED -> lensed;
                    case UNLENSED -> unlensed;
                };
        ModeSpectra total = ModeSpectra.sample(lensed, productGrid).plus(noise());
        InverseVariance filter =
                InverseVariance.of(
                        total, analysis.temperature()::contains, analysis.polarisation()::contains);
        return new Belief(
                transform(), ModeSpectra.sample(weights, productGrid), total, filter, lout);
    }

    /** Noise over squared beam, per mode of the product grid. */
    private Map<Spectrum, double[]> noise() {
        Survey survey = specification.survey();
        GaussianBeam beam = new GaussianBeam(survey.beam());
        double[] t = new double[productGrid.size()];
        double[] p = new double[productGrid.size()];
        for (int mode = 0; mode < t.length; mode++) {
            double l = productGrid.fullSkyMultipole(mode);
            double b = beam.at(l);
            t[mode] = survey.temperature().power(l) / (b * b);
            p[mode] = survey.polarisation().power(l) / (b * b);
        }
        return Map.of(Spectrum.TT, t, Spectrum.EE, p, Spectrum.BB, p);
    }

    private double[] deconvolution(Survey survey) {
        GaussianBeam beam = new GaussianBeam(survey.beam());
        double[] inverse = new double[productGrid.size()];
        Arrays.setAll(
                inverse,
                mode ->
                        productGrid.multipole(mode) <= lmax()
                                ? 1 / beam.at(productGrid.fullSkyMultipole(mode))
                                : 0);
        return inverse;
    }

    private void prepare(String name, Belief preparing) {
        Estimator estimator = Estimators.named(name).prepare(preparing);
        BilinearWeight weight =
                estimator
                        .weight()
                        .orElseThrow(
                                () ->
                                        new IllegalArgumentException(
                                                "estimator '"
                                                        + name
                                                        + "' declares no weight; its response"
                                                        + " cannot be computed"));
        AnalyticResponse response = AnalyticResponse.of(preparing);
        LensAndCurl r = response.response(weight, preparing.weights());
        LensAndCurl n = response.noise(weight, weight, preparing.total());
        estimators.add(estimator);
        Normalisation made = Normalisation.of(name, r, reconstructed);
        normalisation.put(name, made);
        analytic.put(name + ".response", bandpowers.mean(reconstructed.pack(r.lens())));
        analytic.put(name + ".n0_analytic", bandpowers.mean(made.lensNoise(n)));
        analytic.put(name + ".curl_n0_analytic", bandpowers.mean(made.curlNoise(n)));
    }

    /** A transform of the product grid for one thread. */
    FlatTransform transform() {
        return FlatTransform.of(productGrid, Math.max(lmax(), lout));
    }

    /** The largest multipole of T, E and B that is used. */
    public double lmax() {
        Analysis analysis = specification.analysis();
        return Math.max(analysis.temperature().lmax(), analysis.polarisation().lmax());
    }

    /** The specification this follows from. */
    public Specification specification() {
        return specification;
    }

    /** The grid of the maps. */
    public FlatGrid mapGrid() {
        return mapGrid;
    }

    /** The grid on which products of legs are taken. */
    public FlatGrid productGrid() {
        return productGrid;
    }

    /** The belief, with a transform that is nobody's in particular: use {@link Belief#on}. */
    public Belief belief() {
        return belief;
    }

    double[] deconvolution() {
        return deconvolution;
    }

    /** The estimators, in the order of the specification. */
    public List<Estimator> estimators() {
        return List.copyOf(estimators);
    }

    Normalisation normalisation(Estimator estimator) {
        return normalisation.get(estimator.name());
    }

    /** The modes of a reconstruction that are kept, as in the blocks' field sums. */
    public ModeSubset reconstructed() {
        return reconstructed;
    }

    /** Bandpowers of reconstructions. */
    public Bandpowers bandpowers() {
        return bandpowers;
    }

    /** The mean over the patch of the mask squared, 1 without one. */
    public double meanMask2() {
        return meanMask2;
    }

    /** The mean over the patch of the mask to the fourth power, 1 without one. */
    public double meanMask4() {
        return meanMask4;
    }

    /**
     * Computed bandpowers: {@code estimator.response}, {@code .n0_analytic} and {@code
     * .curl_n0_analytic}, one number per band, spectra of phi.
     */
    public Map<String, double[]> analytic() {
        return new TreeMap<>(analytic);
    }
}
