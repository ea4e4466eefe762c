package manyskies.spectrum;

/**
 * Gauss-Legendre nodes and weights on an interval: n of them integrate polynomials of degree 2n - 1
 * exactly.
 *
 * <p>Roots of P_n by Newton's method from the asymptotic guess (DLMF 18.16), weights 2 / ((1 - x^2)
 * P_n'(x)^2). The same bits on every host.
 */
final class GaussLegendre {
    private static final int NEWTON_STEPS = 6; // quadratic from 1e-3 or better: four reach rounding

    private final double[] nodes;
    private final double[] weights;

    private GaussLegendre(double[] nodes, double[] weights) {
        this.nodes = nodes;
        this.weights = weights;
    }

    /** Count nodes between two limits, in rising order. */
    static GaussLegendre on(double lower, double upper, int count) {
        double[] nodes = new double[count];
        double[] weights = new double[count];
        double middle = (lower + upper) / 2;
        double half = (upper - lower) / 2;
        for (int i = 0; i < count; i++) {
            double x = -StrictMath.cos(Math.PI * (i + 0.75) / (count + 0.5));
            double slope = 0;
            for (int step = 0; step < NEWTON_STEPS; step++) {
                double p = 1;
                double before = 0;
                for (int k = 1; k <= count; k++) {
                    double next = ((2 * k - 1) * x * p - (k - 1) * before) / k;
                    before = p;
                    p = next;
                }
                slope = count * (before - x * p) / (1 - x * x);
                x -= p / slope;
            }
            nodes[i] = middle + half * x;
            weights[i] = half * 2 / ((1 - x * x) * slope * slope);
        }
        return new GaussLegendre(nodes, weights);
    }

    int count() {
        return nodes.length;
    }

    double node(int i) {
        return nodes[i];
    }

    double weight(int i) {
        return weights[i];
    }
}
