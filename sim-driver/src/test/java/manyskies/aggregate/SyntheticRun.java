package manyskies.aggregate;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import manyskies.flat.FlatGrid;
import manyskies.result.Block;
import manyskies.result.BlockId;
import manyskies.specification.Sets;
import manyskies.spectrum.Bands;
import org.hipparchus.random.RandomGenerator;
import org.hipparchus.random.Well19937c;

/**
 * Blocks drawn from known laws, as a run with two estimators and three bands would leave them.
 *
 * <p>input.auto is chi-square with 12 modes; cross_input is transfer times that plus Gaussian noise;
 * auto, curl_auto and n0_mc scatter about 2, 1.5 and 1; curl_cross is Gaussian. Reconstructed fields
 * are Gaussian modes of unit power (variance equal to the area) plus a constant mean field.
 */
record SyntheticRun(long seed, int count, int block, int pairs, double transfer, double curl) {
    static final FlatGrid GRID = new FlatGrid(12, 12, 0.01);
    static final Bands BANDS = Bands.between(40, 120, 200, 300);
    static final List<String> ESTIMATORS = List.of("tt", "eb");
    private static final int MODES = 12;
    static final double NOISE = 0.2;
    static final double N0 = 1;

    static SyntheticRun of(long seed, int count, int block) {
        return new SyntheticRun(seed, count, block, count, 1, 0);
    }

    RunFacts facts() {
        return new RunFacts("drawn", "0123abcd", new Sets(count, pairs));
    }

    static AnalyticBands known() {
        return known(N0);
    }

    /** What is known of the run, with the given belief of n0. */
    static AnalyticBands known(double n0) {
        Map<String, double[]> vectors = new TreeMap<>();
        for (String e : ESTIMATORS) {
            vectors.put(e + ".response", new double[] {10, 20, 30});
            vectors.put(e + ".n0_analytic", new double[] {n0, n0, n0});
            vectors.put(e + ".curl_n0_analytic", new double[] {1.5, 1.5, 1.5});
        }
        return AnalyticBands.of(ESTIMATORS, BANDS, GRID, vectors);
    }

    Tables tables() {
        return new Aggregation(facts(), known()).of(BlockSource.of(blocks()));
    }

    List<Block> blocks() {
        List<Block> blocks = new ArrayList<>();
        RandomGenerator random = new Well19937c(seed);
        for (BlockId id : ids("data", count)) {
            blocks.add(Block.of(id, dataColumns(id, random), fields(id, random)));
        }
        for (BlockId id : ids("pairs", pairs)) {
            Map<String, List<double[]>> columns = new TreeMap<>();
            for (String e : ESTIMATORS) {
                columns.put(e + ".n0_mc", scattered(id, N0, random));
                columns.put(e + ".curl_n0_mc", scattered(id, 1.5, random));
            }
            blocks.add(Block.of(id, columns, Map.of()));
        }
        return blocks;
    }

    private List<BlockId> ids(String set, int of) {
        List<BlockId> ids = new ArrayList<>();
        for (int first = 0; first < of; first += block) {
            ids.add(new BlockId(set, first / block, first, Math.min(block, of - first)));
        }
        return ids;
    }

    private Map<String, List<double[]>> dataColumns(BlockId id, RandomGenerator random) {
        Map<String, List<double[]>> columns = new TreeMap<>();
        List<double[]> input = scattered(id, 1, random);
        columns.put("input.auto", input);
        for (String e : ESTIMATORS) {
            columns.put(e + ".auto", scattered(id, 2, random));
            columns.put(e + ".curl_auto", scattered(id, 1.5, random));
            columns.put(e + ".cross_input", along(input, transfer, random));
            columns.put(e + ".curl_cross", along(input, curl, random));
        }
        return columns;
    }

    private static List<double[]> scattered(BlockId id, double mean, RandomGenerator random) {
        List<double[]> rows = new ArrayList<>();
        for (int r = 0; r < id.count(); r++) {
            double[] row = new double[BANDS.count()];
            for (int band = 0; band < row.length; band++) {
                for (int mode = 0; mode < MODES; mode++) {
                    double g = random.nextGaussian();
                    row[band] += mean * g * g / MODES;
                }
            }
            rows.add(row);
        }
        return rows;
    }

    private static List<double[]> along(
            List<double[]> input, double factor, RandomGenerator random) {
        List<double[]> rows = new ArrayList<>();
        for (double[] in : input) {
            rows.add(
                    Arrays.stream(in)
                            .map(x -> factor * x + NOISE * random.nextGaussian())
                            .toArray());
        }
        return rows;
    }

    private static Map<String, double[]> fields(BlockId id, RandomGenerator random) {
        Map<String, double[]> sums = new TreeMap<>();
        for (String e : ESTIMATORS) {
            sums.put(e, gaussianField(Math.sqrt(id.count()), random));
        }
        return sums;
    }

    /** Modes of a real Gaussian map with the power sigma^2: self-conjugate where they have to be. */
    static double[] gaussianField(double sigma, RandomGenerator random) {
        double[] field = new double[2 * GRID.size()];
        double scale = sigma * Math.sqrt(GRID.area() / 2);
        for (int mode = 0; mode < GRID.size(); mode++) {
            int kx = mode % GRID.columns();
            int ky = GRID.ky(mode / GRID.columns());
            double re = scale * random.nextGaussian();
            double im = scale * random.nextGaussian();
            boolean column = kx == 0 || kx == GRID.nx() / 2;
            if (column && (ky == 0 || ky == GRID.ny() / 2)) {
                field[2 * mode] = re * Math.sqrt(2);
            } else if (column && ky < 0) {
                int other = GRID.mode(kx, -ky);
                field[2 * mode] = field[2 * other];
                field[2 * mode + 1] = -field[2 * other + 1];
            } else {
                field[2 * mode] = re;
                field[2 * mode + 1] = im;
            }
        }
        return field;
    }
}
