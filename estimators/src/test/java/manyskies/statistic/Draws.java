package manyskies.statistic;

import java.util.ArrayList;
import java.util.List;
import org.hipparchus.random.RandomGenerator;
import org.hipparchus.random.Well19937c;

/** Gaussian numbers for tests, from a library's generator with a seed written once. */
final class Draws {
    private final RandomGenerator generator;

    Draws(long seed) {
        generator = new Well19937c(seed);
    }

    double gaussian() {
        return generator.nextGaussian();
    }

    /** A chi-square number divided by its degrees of freedom: a bandpower of that many modes. */
    double bandpower(int modes) {
        double sum = 0;
        for (int mode = 0; mode < modes; mode++) {
            double g = gaussian();
            sum += g * g;
        }
        return sum / modes;
    }

    /** Rows whose elements share one Gaussian number: covariance delta_ij + shared^2. */
    List<double[]> correlated(int rows, int size, double shared) {
        List<double[]> out = new ArrayList<>();
        for (int r = 0; r < rows; r++) {
            double common = shared * gaussian();
            double[] row = new double[size];
            for (int i = 0; i < size; i++) {
                row[i] = common + gaussian();
            }
            out.add(row);
        }
        return out;
    }

    static MeanVector mean(List<double[]> rows) {
        MomentSums sums = new MomentSums(rows.get(0).length);
        sums.add(rows);
        return sums.mean();
    }

    /**
     * Kolmogorov's distance of numbers from the uniform law on 0 to 1. By Massart 1990 (Annals of
     * Probability 18, 1269) it exceeds sqrt(ln(2/a) / 2N) with a probability of at most a.
     */
    static double distanceFromUniform(double[] numbers) {
        double[] sorted = numbers.clone();
        java.util.Arrays.sort(sorted);
        double distance = 0;
        for (int i = 0; i < sorted.length; i++) {
            double below = sorted[i] - (double) i / sorted.length;
            double above = (i + 1.0) / sorted.length - sorted[i];
            distance = Math.max(distance, Math.max(below, above));
        }
        return distance;
    }

    static double massartBound(int numbers, double falseAlarm) {
        return Math.sqrt(Math.log(2 / falseAlarm) / (2 * numbers));
    }
}
