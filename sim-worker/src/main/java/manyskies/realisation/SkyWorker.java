package manyskies.realisation;

import java.util.LinkedHashMap;
import java.util.Map;
import manyskies.estimator.Belief;
import manyskies.estimator.Estimator;
import manyskies.estimator.LegMaps;
import manyskies.estimator.LegPair;
import manyskies.estimator.Reconstruction;
import manyskies.field.CmbModes;
import manyskies.field.Modes;
import manyskies.flat.FlatGrid;
import manyskies.flat.FlatTransform;
import manyskies.flat.ModeCopy;
import manyskies.flat.StokesMaps;
import manyskies.instrument.Observer;
import manyskies.random.Address;
import manyskies.sky.GaussianSky;
import manyskies.sky.SkyLensing;
import manyskies.sky.UnlensedSky;
import manyskies.specification.Specification;
import manyskies.specification.Survey;

/**
 * The steps of a realisation: draw, lens, observe, make legs, reconstruct.
 *
 * <p>Each is a pure function of its arguments and the run's model. Holds scratch memory: one thread
 * at a time.
 */
public final class SkyWorker {
    private final RunModel model;
    private final GaussianSky gaussian;
    private final SkyLensing lensing;
    private final Observer observer;
    private final FlatTransform transform;
    private final Belief belief;
    private final ModeCopy crop;
    private final ModeCopy cropInput;

    private SkyWorker(RunModel model) {
        this.model = model;
        Specification specification = model.specification();
        Survey survey = specification.survey();
        FlatGrid grid = model.mapGrid();
        gaussian = GaussianSky.of(grid, specification.unlensed(), survey.curl());
        lensing =
                SkyLensing.of(
                        gaussian.disc(),
                        specification.unlensed(),
                        survey.curl(),
                        survey.splineDegree());
        observer = Observer.of(grid, survey, model.lmax());
        transform = model.transform();
        belief = model.belief().on(transform);
        crop = ModeCopy.of(grid, model.productGrid(), model.lmax());
        cropInput = ModeCopy.of(grid, model.productGrid(), Double.POSITIVE_INFINITY);
    }

    /** A worker for one thread. */
    public static SkyWorker of(RunModel model) {
        return new SkyWorker(model);
    }

    /** The run's model. */
    public RunModel model() {
        return model;
    }

    /** Where the random numbers of a sky are found. */
    public Address address(String set, int index) {
        return new Address(model.specification().seed(), set, index);
    }

    /** An unlensed sky and its lenses. */
    public UnlensedSky draw(Address address) {
        return gaussian.draw(address);
    }

    /** Lensed maps of T, Q and U. */
    public StokesMaps lens(UnlensedSky sky) {
        return lensing.lens(sky);
    }

    /** Observed modes: beam, noise and taper included. */
    public CmbModes observe(StokesMaps lensed, Address address) {
        return observer.observe(lensed, address);
    }

    /** The legs of a sky on the product grid, beam deconvolved. */
    public LegMaps legs(CmbModes observed) {
        return belief.maps(
                new CmbModes(
                        deconvolved(observed.temperature()),
                        deconvolved(observed.gradient()),
                        deconvolved(observed.curl())));
    }

    private Modes deconvolved(Modes observed) {
        return crop.copy(observed).times(model.deconvolution());
    }

    /** A whole sky, from its address to its legs. */
    LegMaps legs(UnlensedSky sky, Address address) {
        return legs(observe(lens(sky), address));
    }

    /** Normalised reconstructions of all estimators from two legs, by name. */
    public Map<String, Reconstruction> reconstruct(LegMaps a, LegMaps b) {
        LegPair pair = belief.pair(a, b);
        Map<String, Reconstruction> all = new LinkedHashMap<>();
        for (Estimator estimator : model.estimators()) {
            all.put(
                    estimator.name(),
                    model.normalisation(estimator).normalise(pair.reconstruct(estimator)));
        }
        return all;
    }

    /** The input potential on the modes of a reconstruction. */
    public Modes input(UnlensedSky sky) {
        return model.reconstructed().pack(cropInput.copy(sky.phi()));
    }

    /** Transforms of the product grid done so far by this worker. */
    public long productTransforms() {
        return transform.transforms();
    }
}
