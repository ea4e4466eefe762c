package manyskies.flat;

import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.Locale;
import java.util.Map;
import java.util.concurrent.TimeUnit;
import org.jtransforms.fft.DoubleFFT_2D;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Level;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/**
 * Time of our transforms in units of one JTransforms {@code DoubleFFT_2D.realForward} of the same
 * size, on one thread. From the project's root:
 *
 * <pre>
 * mvn -q -B -pl estimators test-compile dependency:build-classpath -Dmdep.outputFile=target/classpath
 * CP=estimators/target/test-classes:estimators/target/classes:$(cat estimators/target/classpath)
 * java -cp $CP org.openjdk.jmh.Main TransformBenchmark -p n=512,1024,2048   # times, by JMH
 * java -cp $CP manyskies.flat.TransformBenchmark 512 1024 2048              # ratios, half a minute
 * </pre>
 *
 * JMH measures one thing after another by the wall clock, so that on a shared machine its ratios
 * say little. The table of ratios takes the transforms in turn and counts the thread's own time.
 * Sizes that are no power of two are left out, because the unit does not exist for them.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.SampleTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 2, time = 500, timeUnit = TimeUnit.MILLISECONDS)
@Measurement(iterations = 4, time = 500, timeUnit = TimeUnit.MILLISECONDS)
@Fork(value = 1, jvmArgsAppend = "-Xmx1g")
public class TransformBenchmark {
    /** What is timed. */
    public enum Kind {
        /** JTransforms' own two-dimensional transform: the unit. */
        UNIT(0),
        /** Map to modes, all of them. */
        FORWARD(2),
        /** Modes to map, all of them. */
        INVERSE(2),
        /** Map to the modes within half of the Nyquist multipole. */
        FORWARD_HALF(0.5),
        /** Modes within half of the Nyquist multipole to map. */
        INVERSE_HALF(0.5);

        private final double fractionOfNyquist;

        Kind(double fractionOfNyquist) {
            this.fractionOfNyquist = fractionOfNyquist;
        }
    }

    /** Pixels per side. */
    @Param({"512"})
    public int n;

    /** What is timed. */
    @Param public Kind kind;

    private double[] source;
    private double[] map;
    private double[] modes;
    private DoubleFFT_2D unit;
    private RealFft2 ours;

    /** Makes a map and its modes. */
    @Setup
    public void prepare() {
        FlatGrid grid = new FlatGrid(n, n, 1e-3);
        ours = RealFft2.of(grid, Math.max(0.1, kind.fractionOfNyquist) * grid.nyquist());
        source = Skies.noise(grid.pixels(), 1);
        map = source.clone();
        modes = new double[2 * grid.size()];
        ours.forward(map, modes);
        unit = kind == Kind.UNIT ? new DoubleFFT_2D(n, n) : null;
    }

    /** The unit works in place: without a fresh map its numbers would overflow. */
    @Setup(Level.Invocation)
    public void refill() {
        System.arraycopy(source, 0, map, 0, map.length);
    }

    /** One transform. */
    @Benchmark
    public double[] transform() {
        switch (kind) {
            case UNIT -> unit.realForward(map);
            case FORWARD, FORWARD_HALF -> ours.forward(map, modes);
            case INVERSE, INVERSE_HALF -> ours.inverse(modes, map);
        }
        return map;
    }

    /**
     * Prints the table of ratios.
     *
     * @param args sizes, powers of two
     */
    public static void main(String[] args) {
        System.out.println("units of one JTransforms transform: least (median) of the repetitions");
        for (String arg : args.length == 0 ? new String[] {"512", "1024", "2048"} : args) {
            int size = Integer.parseInt(arg);
            Map<Kind, long[]> times = measure(size, Math.max(25, 60_000_000 / (size * size)));
            long[] unit = times.get(Kind.UNIT);
            times.forEach((kind, time) -> print(size, kind, time, unit));
        }
    }

    /** Sorted nanoseconds of this thread, one entry per repetition. */
    private static Map<Kind, long[]> measure(int size, int repetitions) {
        Map<Kind, TransformBenchmark> benchmarks = new EnumMap<>(Kind.class);
        Map<Kind, long[]> times = new EnumMap<>(Kind.class);
        for (Kind kind : Kind.values()) {
            TransformBenchmark benchmark = new TransformBenchmark();
            benchmark.n = size;
            benchmark.kind = kind;
            benchmark.prepare();
            benchmarks.put(kind, benchmark);
            times.put(kind, new long[repetitions]);
        }
        ThreadMXBean clock = ManagementFactory.getThreadMXBean();
        for (int repetition = 0; repetition < repetitions; repetition++) {
            for (Kind kind : Kind.values()) {
                benchmarks.get(kind).refill();
                long start = clock.getCurrentThreadCpuTime();
                benchmarks.get(kind).transform();
                times.get(kind)[repetition] = clock.getCurrentThreadCpuTime() - start;
            }
        }
        times.values().forEach(Arrays::sort);
        return times;
    }

    private static void print(int size, Kind kind, long[] time, long[] unit) {
        int middle = time.length / 2;
        System.out.printf(
                Locale.ROOT,
                "%5d %-13s %.3f (%.3f)   %.2f (%.2f) ms%n",
                size,
                kind,
                (double) time[0] / unit[0],
                (double) time[middle] / unit[middle],
                time[0] / 1e6,
                time[middle] / 1e6);
    }
}
