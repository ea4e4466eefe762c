package manyskies.instrument;

import java.util.ArrayList;
import java.util.List;
import manyskies.field.CmbModes;
import manyskies.field.Modes;
import manyskies.flat.FlatGrid;
import manyskies.flat.ModeDisc;
import manyskies.flat.StokesMaps;
import manyskies.flat.StokesTransform;
import manyskies.random.Address;
import manyskies.specification.Survey;

/**
 * Observes lensed skies: X_obs = beam X + noise, with the taper over both where there is one.
 *
 * <p>Without a taper only the modes asked for are transformed, convolved and given noise. With one,
 * the full disc of modes is, then the maps are tapered, and the modes asked for are taken from
 * those. The noise of T has the survey's power in T, that of E and B the power in P (white and equal
 * noise of Q and U is white and equal noise of E and B).
 *
 * <p>Holds scratch memory: one thread at a time.
 */
public final class Observer {
    private final FlatGrid grid;
    private final int splits;
    private final List<BeamAndNoise> fields; // T, E, B
    private final StokesTransform signal; // the modes that are observed
    private final StokesTransform wanted; // the modes that are returned
    private final EdgeTaper taper; // or null

    private Observer(Survey survey, ModeDisc disc, ModeDisc wanted) {
        grid = disc.grid();
        splits = survey.splits();
        GaussianBeam beam = new GaussianBeam(survey.beam());
        fields =
                List.of(
                        BeamAndNoise.of(disc, "T", beam, survey.temperature(), splits),
                        BeamAndNoise.of(disc, "E", beam, survey.polarisation(), splits),
                        BeamAndNoise.of(disc, "B", beam, survey.polarisation(), splits));
        signal = StokesTransform.of(disc);
        this.wanted = StokesTransform.of(wanted);
        taper = survey.edgeTaper() == 0 ? null : EdgeTaper.of(grid, survey.edgeTaper());
    }

    /**
     * An observer that returns modes with |l| &le; limit.
     *
     * @throws IllegalArgumentException if the survey's beam, splits or taper are impossible here
     */
    public static Observer of(FlatGrid grid, Survey survey, double limit) {
        ModeDisc wanted = ModeDisc.of(grid, limit);
        boolean tapered = survey.edgeTaper() != 0;
        ModeDisc observed = tapered ? ModeDisc.of(grid, grid.nyquist()) : wanted;
        return new Observer(survey, observed, wanted);
    }

    /**
     * Observed modes, all splits together; beam (and taper) included.
     *
     * @param sky lensed maps
     * @param noise address of the noise
     */
    public CmbModes observe(StokesMaps sky, Address noise) {
        return tapered(coadd(signal.analyse(sky), noise));
    }

    /** Observed modes of each split, in order. Their mean is {@link #observe}, to rounding. */
    public List<CmbModes> observeSplits(StokesMaps sky, Address noise) {
        CmbModes modes = signal.analyse(sky);
        List<CmbModes> all = new ArrayList<>();
        for (int split = 0; split < splits; split++) {
            int number = split;
            all.add(tapered(each(modes, (field, of) -> field.split(of, noise, number))));
        }
        return all;
    }

    /**
     * Observed maps, all splits together, of the modes this observer works with; to look at.
     *
     * @param sky lensed maps
     */
    public StokesMaps observedMaps(StokesMaps sky, Address noise) {
        StokesMaps maps = signal.synthesise(coadd(signal.analyse(sky), noise));
        if (taper != null) {
            taper.apply(maps);
        }
        return maps;
    }

    private CmbModes coadd(CmbModes sky, Address noise) {
        return each(sky, (field, of) -> field.coadd(of, noise));
    }

    private CmbModes tapered(CmbModes observed) {
        if (taper == null) {
            return observed;
        }
        StokesMaps maps = signal.synthesise(observed);
        taper.apply(maps);
        return wanted.analyse(maps);
    }

    private CmbModes each(CmbModes sky, FieldStep step) {
        return new CmbModes(
                step.apply(fields.get(0), sky.temperature()),
                step.apply(fields.get(1), sky.gradient()),
                step.apply(fields.get(2), sky.curl()));
    }

    /** What is done to each field in turn. */
    private interface FieldStep {
        Modes apply(BeamAndNoise field, Modes sky);
    }
}
