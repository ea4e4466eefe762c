package manyskies.command;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import manyskies.estimator.LegMaps;
import manyskies.estimator.Reconstruction;
import manyskies.field.CmbModes;
import manyskies.field.Modes;
import manyskies.figure.ContactSheet;
import manyskies.figure.MapPanel;
import manyskies.flat.FlatGrid;
import manyskies.flat.ModeCopy;
import manyskies.flat.RealFft2;
import manyskies.flat.StokesMaps;
import manyskies.flat.StokesTransform;
import manyskies.instrument.Observer;
import manyskies.picture.FitsMaps;
import manyskies.picture.NamedMap;
import manyskies.random.Address;
import manyskies.realisation.BlockRunner;
import manyskies.realisation.RunModel;
import manyskies.realisation.SkyWorker;
import manyskies.result.AtomicFile;
import manyskies.sky.GaussianSky;
import manyskies.sky.UnlensedSky;
import manyskies.specification.Specification;

/**
 * The maps of one realisation, to look at: as FITS, and on one sheet as PNG.
 *
 * <p>kappa = -(1/2) laplacian phi, kappa_L = L^2 phi_L / 2. Reconstructions hold the L of the bands;
 * on the sheet true and reconstructed kappa are cut at one L, for at high L there is mostly noise.
 */
final class SkyMaps {
    private static final double SHEET_LMAX = 400;

    private final RunModel model;
    private final SkyWorker worker;
    private final FlatGrid grid;
    private final RealFft2 fft;
    private final StokesTransform stokes;

    SkyMaps(RunModel model) {
        this.model = model;
        worker = SkyWorker.of(model);
        grid = model.mapGrid();
        fft = RealFft2.of(grid, Double.POSITIVE_INFINITY);
        Specification specification = model.specification();
        stokes =
                StokesTransform.of(
                        GaussianSky.of(
                                        grid,
                                        specification.unlensed(),
                                        specification.survey().curl())
                                .disc());
    }

    /** Writes the maps of a realisation and returns the files. */
    List<Path> write(int index, Path folder) {
        Address address = worker.address(BlockRunner.DATA, index);
        UnlensedSky sky = worker.draw(address);
        StokesMaps unlensed = stokes.synthesise(unlensedModes(sky));
        StokesMaps lensed = worker.lens(sky);
        Observer whole = Observer.of(grid, model.specification().survey(), grid.nyquist());
        StokesMaps observed = whole.observedMaps(lensed, address);
        LegMaps legs = worker.legs(worker.observe(lensed, address));
        Map<String, Reconstruction> found = worker.reconstruct(legs, legs);
        List<Path> files = new ArrayList<>();
        files.add(fits(folder, index, "unlensed", stokesMaps("unlensed", unlensed)));
        files.add(fits(folder, index, "lensed", stokesMaps("lensed", lensed)));
        files.add(fits(folder, index, "observed", stokesMaps("observed", observed)));
        files.add(fits(folder, index, "lensing", lensing(sky, found)));
        Path sheet = folder.resolve(stem(index) + "-sheet.png");
        AtomicFile.write(sheet, sheet(index, sky, lensed, observed, found).png());
        files.add(sheet);
        return files;
    }

    private CmbModes unlensedModes(UnlensedSky sky) {
        return new CmbModes(
                sky.temperature(), sky.gradient(), sky.curl().orElseGet(() -> Modes.zero(grid)));
    }

    private String stem(int index) {
        return String.format(Locale.ROOT, "%s-%d", model.specification().name(), index);
    }

    private Path fits(Path folder, int index, String what, List<NamedMap> maps) {
        Path file = folder.resolve(stem(index) + "-" + what + ".fits");
        FitsMaps.write(
                file,
                grid,
                maps,
                List.of(
                        "Run " + model.specification().name() + ", set data, realisation " + index,
                        "Seed " + model.specification().seed()));
        return file;
    }

    private List<NamedMap> stokesMaps(String what, StokesMaps maps) {
        CmbModes modes =
                stokes.analyse(
                        new StokesMaps(grid, maps.t().clone(), maps.q().clone(), maps.u().clone()));
        return List.of(
                NamedMap.of(what + " T", "uK", maps.t()),
                NamedMap.of(what + " Q", "uK", maps.q()),
                NamedMap.of(what + " U", "uK", maps.u()),
                NamedMap.of(what + " E", "uK", map(modes.gradient())),
                NamedMap.of(what + " B", "uK", map(modes.curl())));
    }

    private List<NamedMap> lensing(UnlensedSky sky, Map<String, Reconstruction> found) {
        List<NamedMap> maps = new ArrayList<>();
        maps.add(NamedMap.of("phi", "", map(sky.phi())));
        maps.add(NamedMap.of("kappa", "", map(kappa(sky.phi(), Double.POSITIVE_INFINITY))));
        found.forEach(
                (name, r) ->
                        maps.add(
                                NamedMap.of(
                                        "kappa " + name,
                                        "",
                                        map(kappa(onMap(r), Double.POSITIVE_INFINITY)))));
        return maps;
    }

    private ContactSheet sheet(
            int index,
            UnlensedSky sky,
            StokesMaps lensed,
            StokesMaps observed,
            Map<String, Reconstruction> found) {
        CmbModes modes =
                stokes.analyse(
                        new StokesMaps(
                                grid, lensed.t().clone(), lensed.q().clone(), lensed.u().clone()));
        List<MapPanel> panels = new ArrayList<>();
        panels.add(panel("lensed T", "uK", lensed.t()));
        panels.add(panel("lensed E", "uK", map(modes.gradient())));
        panels.add(panel("lensed B", "uK", map(modes.curl())));
        panels.add(panel("observed T", "uK", observed.t()));
        panels.add(panel("observed Q", "uK", observed.q()));
        panels.add(panel("observed U", "uK", observed.u()));
        String cut = String.format(Locale.ROOT, ", L < %.0f", SHEET_LMAX);
        panels.add(panel("kappa true" + cut, "", map(kappa(sky.phi(), SHEET_LMAX))));
        found.forEach(
                (name, r) ->
                        panels.add(
                                panel(
                                        "kappa " + name + cut,
                                        "",
                                        map(kappa(onMap(r), SHEET_LMAX)))));
        return ContactSheet.of(stem(index), panels);
    }

    private MapPanel panel(String title, String unit, double[] map) {
        return MapPanel.signed(title, unit, grid.nx(), grid.ny(), map);
    }

    /** Reconstructed modes on the grid of the maps. */
    private Modes onMap(Reconstruction found) {
        return ModeCopy.of(model.productGrid(), grid, Double.POSITIVE_INFINITY)
                .copy(model.reconstructed().unpack(found.gradient()));
    }

    private Modes kappa(Modes phi, double limit) {
        double[] factor = new double[grid.size()];
        for (int mode = 0; mode < factor.length; mode++) {
            double l = grid.multipole(mode);
            factor[mode] = l <= limit ? l * l / 2 : 0;
        }
        return phi.times(factor);
    }

    private double[] map(Modes modes) {
        double[] map = new double[grid.pixels()];
        fft.inverse(modes.values(), map);
        return map;
    }
}
