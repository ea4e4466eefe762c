package manyskies.flat;

import java.util.Collection;
import java.util.EnumMap;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
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
import org.openjdk.jmh.results.RunResult;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.OptionsBuilder;
import org.openjdk.jmh.runner.options.VerboseMode;

/**
 * Time of our transforms in units of one JTransforms {@code DoubleFFT_2D.realForward} of the same
 * size, on one thread. Run from the project's root, about three minutes:
 *
 * <pre>
 * mvn -q -B -pl estimators test-compile dependency:build-classpath -Dmdep.outputFile=target/classpath
 * java -cp estimators/target/test-classes:estimators/target/classes:$(cat estimators/target/classpath) \\
 *   manyskies.flat.TransformBenchmark 512 1024 2048
 * </pre>
 *
 * Sizes that are no power of two are left out, because the unit does not exist for them. Rounds
 * alternate between the transforms, and the medians of a round are compared with each other, so
 * that a slowly changing load on the machine shows little.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.SampleTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 2, time = 500, timeUnit = TimeUnit.MILLISECONDS)
@Measurement(iterations = 4, time = 500, timeUnit = TimeUnit.MILLISECONDS)
@Fork(value = 1, jvmArgsAppend = "-Xmx1g")
public class TransformBenchmark {
    private static final int ROUNDS = 3;

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
    public static void main(String[] args) throws RunnerException {
        String[] sizes = args.length == 0 ? new String[] {"512", "1024", "2048"} : args;
        System.out.println(
                "round  n     ms of one unit, then units: forward inverse, at half band");
        for (int round = 1; round <= ROUNDS; round++) {
            Collection<RunResult> results =
                    new Runner(
                                    new OptionsBuilder()
                                            .include(TransformBenchmark.class.getName())
                                            .param("n", sizes)
                                            .verbosity(VerboseMode.SILENT)
                                            .build())
                            .run();
            print(round, results);
        }
    }

    private static void print(int round, Collection<RunResult> results) {
        Map<Integer, Map<Kind, Double>> median = new TreeMap<>();
        for (RunResult result : results) {
            int size = Integer.parseInt(result.getParams().getParam("n"));
            median.computeIfAbsent(size, k -> new EnumMap<>(Kind.class))
                    .put(
                            Kind.valueOf(result.getParams().getParam("kind")),
                            result.getPrimaryResult().getStatistics().getPercentile(50));
        }
        median.forEach((size, ofKind) -> print(round, size, ofKind));
    }

    private static void print(int round, int size, Map<Kind, Double> ofKind) {
        double unit = ofKind.get(Kind.UNIT);
        System.out.printf(
                Locale.ROOT,
                "%-6d %-5d %7.2f   %.3f %.3f   %.3f %.3f%n",
                round,
                size,
                unit,
                ofKind.get(Kind.FORWARD) / unit,
                ofKind.get(Kind.INVERSE) / unit,
                ofKind.get(Kind.FORWARD_HALF) / unit,
                ofKind.get(Kind.INVERSE_HALF) / unit);
    }
}
