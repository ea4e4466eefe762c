package manyskies.sky;

import java.lang.management.ManagementFactory;
import java.util.Arrays;
import java.util.Locale;
import manyskies.field.CmbModes;
import manyskies.flat.FlatGrid;
import manyskies.flat.ModeDisc;
import manyskies.flat.RealFft2;
import manyskies.flat.StokesMaps;
import manyskies.instrument.Observer;
import manyskies.random.Address;
import manyskies.specification.Noise;
import manyskies.specification.Survey;
import manyskies.spectrum.Spectra;
import org.jtransforms.fft.DoubleFFT_2D;

/**
 * Times of the stages up to the observed modes, in units of one JTransforms real transform of the
 * map, on one thread. Arguments: pixels a side, degree, repetitions. The median is quoted.
 */
final class StageTimes {
    private static final double ARCMIN = Math.PI / 180 / 60;

    private StageTimes() {}

    public static void main(String[] arguments) {
        int n = Integer.parseInt(arguments[0]);
        int degree = Integer.parseInt(arguments[1]);
        int repeats = Integer.parseInt(arguments[2]);
        FlatGrid grid = new FlatGrid(n, n, 2 * ARCMIN);
        Spectra spectra = Tables.unlensed();
        GaussianSky skies = GaussianSky.of(grid, spectra, 0);
        ModeDisc disc = skies.disc();
        SkyLensing lensing = SkyLensing.of(disc, spectra, 0, degree);
        Noise noise = new Noise(6 * ARCMIN, 0, 1);
        Observer observer =
                Observer.of(grid, new Survey(1.4 * ARCMIN, noise, noise, 1, 0, 0, degree), 3000);
        RealFft2 full = RealFft2.of(grid, disc.limit());
        RealFft2 limited = RealFft2.of(grid, 3000);
        DoubleFFT_2D unit = new DoubleFFT_2D(n, n);
        double[] map = new double[grid.pixels()];
        double[] half = new double[2 * grid.size()];
        String[] names = {
            "unit",
            "inverse",
            "forward",
            "draw",
            "coefficients",
            "load",
            "displacement",
            "evaluate",
            "observe"
        };
        double[][] times = new double[names.length][repeats];
        double sum = 0;
        for (int r = 0; r < repeats; r++) {
            long[] t = new long[names.length + 1];
            t[0] = cpu();
            unit.realForward(map);
            t[1] = cpu();
            full.inverse(half, map);
            t[2] = cpu();
            limited.forward(map, half);
            t[3] = cpu();
            UnlensedSky sky = skies.draw(new Address(1, "time", r));
            t[4] = cpu();
            StokesMaps maps = StokesMaps.zero(grid);
            lensing.coefficients(sky, maps);
            t[5] = cpu();
            lensing.splines.load(maps);
            t[6] = cpu();
            lensing.displacement(sky);
            t[7] = cpu();
            lensing.splines.evaluate(lensing.dx, lensing.dy, maps);
            t[8] = cpu();
            CmbModes observed = observer.observe(maps, new Address(1, "time", r));
            t[9] = cpu();
            sum += observed.curl().re(5);
            for (int i = 0; i < names.length; i++) {
                times[i][r] = (t[i + 1] - t[i]) * 1e-6;
            }
        }
        double one = median(times[0]);
        for (int i = 0; i < names.length; i++) {
            double ms = median(times[i]);
            System.out.printf(Locale.ROOT, "%-14s %8.3f ms %6.2f units%n", names[i], ms, ms / one);
        }
        System.out.println(sum);
    }

    /** Time this thread has run, in ns: unlike the clock it does not see other programs. */
    private static long cpu() {
        return ManagementFactory.getThreadMXBean().getCurrentThreadCpuTime();
    }

    private static double median(double[] times) {
        double[] sorted = Arrays.copyOfRange(times, times.length / 3, times.length);
        Arrays.sort(sorted);
        return sorted[sorted.length / 2];
    }
}
