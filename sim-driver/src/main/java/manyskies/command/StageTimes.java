package manyskies.command;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import manyskies.estimator.LegMaps;
import manyskies.estimator.Reconstruction;
import manyskies.field.CmbModes;
import manyskies.field.Modes;
import manyskies.flat.FlatGrid;
import manyskies.flat.RealFft2;
import manyskies.flat.StokesMaps;
import manyskies.flat.UnitTransform;
import manyskies.random.Address;
import manyskies.realisation.BlockRunner;
import manyskies.realisation.RunModel;
import manyskies.realisation.SkyWorker;
import manyskies.sky.UnlensedSky;
import manyskies.spectrum.Bandpowers;

/**
 * Times the stages of a realisation on one thread, in units of one transform of the map's size.
 *
 * <p>Stages and transforms are timed in turn, realisation by realisation, and the median taken of
 * each, so that other load on the machine falls on all alike.
 */
final class StageTimes {
    private static final int WARM_UP = 8;
    private static final int MEASURED = 25;

    private final SkyWorker worker;
    private final Bandpowers bandpowers;
    private final UnitTransform unit;
    private final Timed mapTransform;
    private final Timed observedTransform;
    private final Timed productTransform;
    private final Map<String, List<Long>> times = new LinkedHashMap<>();
    private long reconstructing;

    /** A transform of one kind, to be timed alone. */
    private static final class Timed {
        private final RealFft2 fft;
        private final double[] map;
        private final double[] modes;

        Timed(FlatGrid grid, double limit) {
            fft = RealFft2.of(grid, limit);
            map = new double[grid.pixels()];
            modes = new double[2 * grid.size()];
        }

        void run() {
            fft.inverse(modes, map);
        }
    }

    StageTimes(RunModel model) {
        worker = SkyWorker.of(model);
        bandpowers = model.bandpowers();
        unit = UnitTransform.of(model.mapGrid());
        mapTransform = new Timed(model.mapGrid(), model.mapGrid().nyquist());
        observedTransform = new Timed(model.mapGrid(), model.lmax());
        productTransform = new Timed(model.productGrid(), model.lmax());
    }

    /** The table, ready to print. */
    String table() {
        for (int index = 0; index < WARM_UP + MEASURED; index++) {
            if (index == WARM_UP) {
                times.clear();
            }
            transforms();
            realisation(index);
        }
        return render();
    }

    private void transforms() {
        unit.prepare();
        time("unit", unit::run);
        time("map transform", mapTransform::run);
        time("observed transform", observedTransform::run);
        time("product transform", productTransform::run);
    }

    private void realisation(int index) {
        long start = System.nanoTime();
        Address address = worker.address(BlockRunner.DATA, index);
        UnlensedSky sky = worker.draw(address);
        long drawn = System.nanoTime();
        StokesMaps lensed = worker.lens(sky);
        long remapped = System.nanoTime();
        CmbModes observed = worker.observe(lensed, address);
        long seen = System.nanoTime();
        LegMaps legs = worker.legs(observed);
        long before = worker.productTransforms();
        Map<String, Reconstruction> found = worker.reconstruct(legs, legs);
        reconstructing = worker.productTransforms() - before;
        long reconstructed = System.nanoTime();
        measure(found, worker.input(sky));
        long measured = System.nanoTime();
        add("draw", drawn - start);
        add("lens", remapped - drawn);
        add("observe", seen - remapped);
        add("reconstruct", reconstructed - seen);
        add("measure", measured - reconstructed);
        add("all", measured - start);
    }

    private void measure(Map<String, Reconstruction> found, Modes input) {
        for (Reconstruction r : found.values()) {
            bandpowers.average(r.gradient(), r.gradient());
            bandpowers.average(r.gradient(), input);
            bandpowers.average(r.curl(), r.curl());
            bandpowers.average(r.curl(), input);
        }
    }

    private void time(String name, Runnable work) {
        long start = System.nanoTime();
        work.run();
        add(name, System.nanoTime() - start);
    }

    private void add(String name, long nanoseconds) {
        times.computeIfAbsent(name, key -> new ArrayList<>()).add(nanoseconds);
    }

    private double median(String name) {
        long[] sorted = times.get(name).stream().mapToLong(Long::longValue).sorted().toArray();
        return sorted[sorted.length / 2];
    }

    private String render() {
        StringBuilder out = new StringBuilder();
        RunModel model = worker.model();
        FlatGrid map = model.mapGrid();
        FlatGrid product = model.productGrid();
        line(
                out,
                "unit: one JTransforms 2-D real transform of %d x %d, %.2f ms (one thread)",
                map.nx(),
                map.ny(),
                median("unit") / 1e6);
        line(
                out,
                "our transforms, in units: map %.2f, map up to lmax %.2f, %d x %d product %.2f",
                median("map transform") / median("unit"),
                median("observed transform") / median("unit"),
                product.nx(),
                product.ny(),
                median("product transform") / median("unit"));
        line(
                out,
                "%-12s %9s %7s %11s %22s",
                "stage",
                "ms",
                "units",
                "transforms",
                "time / transform time");
        stage(out, "draw", 0, 0);
        stage(out, "lens", 5, 5 * median("map transform"));
        stage(out, "observe", 3, 3 * median("observed transform"));
        stage(out, "reconstruct", reconstructing, reconstructing * median("product transform"));
        stage(out, "measure", 0, 0);
        stage(
                out,
                "all",
                8 + reconstructing,
                5 * median("map transform")
                        + 3 * median("observed transform")
                        + reconstructing * median("product transform"));
        return out.toString();
    }

    private void stage(StringBuilder out, String name, long count, double transformTime) {
        String ratio =
                count == 0 ? "-" : String.format(Locale.ROOT, "%.2f", median(name) / transformTime);
        line(
                out,
                "%-12s %9.2f %7.1f %11d %22s",
                name,
                median(name) / 1e6,
                median(name) / median("unit"),
                count,
                ratio);
    }

    private static void line(StringBuilder out, String format, Object... values) {
        out.append(String.format(Locale.ROOT, format, values)).append(System.lineSeparator());
    }
}
