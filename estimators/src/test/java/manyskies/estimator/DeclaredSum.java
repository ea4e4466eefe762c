package manyskies.estimator;

import java.util.function.IntPredicate;
import manyskies.estimator.SeparableTerm.Kind;
import manyskies.estimator.SeparableTerm.Order;
import manyskies.field.CmbModes;
import manyskies.field.Modes;
import manyskies.flat.FlatGrid;

/**
 * A declared weight as a sum over the plane, after the formula in {@link SeparableTerm}: slow,
 * obvious, and without maps or transforms.
 */
final class DeclaredSum {
    private final FlatGrid grid;
    private final BilinearWeight weight;

    DeclaredSum(FlatGrid grid, BilinearWeight weight) {
        this.grid = grid;
        this.weight = weight;
    }

    /** The fields U and V of a term, in modes; null for absent ones. */
    private record Fields(Modes uE, Modes uB, Modes vE, Modes vB) {
        static Fields of(SeparableTerm term, CmbModes u, CmbModes v) {
            return new Fields(
                    modes(term.gradientE(), u),
                    modes(term.gradientB(), u),
                    modes(term.plainE(), v),
                    modes(term.plainB(), v));
        }

        private static Modes modes(LegField field, CmbModes sky) {
            return field == null ? null : field.of(sky);
        }
    }

    Reconstruction reconstruct(CmbModes a, CmbModes b, IntPredicate wanted) {
        double[] phi = new double[2 * grid.size()];
        double[] psi = new double[2 * grid.size()];
        for (BilinearWeight.Part part : weight.parts()) {
            for (SeparableTerm term : part.terms()) {
                Order order = term.order();
                double factor = order == Order.SYMMETRIC ? 0.5 : 1;
                Fields forward = order == Order.REVERSED ? null : Fields.of(term, a, b);
                Fields reversed = order == Order.FORWARD ? null : Fields.of(term, b, a);
                for (int mode = 0; mode < grid.size(); mode++) {
                    if (wanted.test(mode)) {
                        double[] g = new double[4];
                        add(g, mode, term.kind(), forward);
                        add(g, mode, term.kind(), reversed);
                        add(phi, mode, factor * at(part.gradientFactor(), mode), g[0], g[1]);
                        add(psi, mode, factor * at(part.curlFactor(), mode), g[2], g[3]);
                    }
                }
            }
        }
        return new Reconstruction(Modes.of(grid, phi), Modes.of(grid, psi));
    }

    private static double at(double[] factor, int mode) {
        return factor.length == 0 ? 1 : factor[mode];
    }

    private static void add(double[] sum, int mode, double factor, double re, double im) {
        sum[2 * mode] += factor * re;
        sum[2 * mode + 1] += factor * im;
    }

    /** Adds (1/A) sum over l1 of L.l1 (l1 x L for the curl) U V h. */
    private void add(double[] g, int mode, Kind kind, Fields f) {
        if (f == null) {
            return;
        }
        int kx = mode % grid.columns();
        int ky = grid.ky(mode / grid.columns());
        for (int k1y = -grid.ny() / 2 + 1; k1y < grid.ny() / 2; k1y++) {
            for (int k1x = -grid.nx() / 2 + 1; k1x < grid.nx() / 2; k1x++) {
                int k2x = kx - k1x;
                int k2y = ky - k1y;
                if (Math.abs(k2x) < grid.nx() / 2 && Math.abs(k2y) < grid.ny() / 2) {
                    double[] product = product(kind, f, k1x, k1y, k2x, k2y);
                    double l1x = k1x * grid.stepX();
                    double l1y = k1y * grid.stepY();
                    double along = (l1x * grid.lx(mode) + l1y * grid.ly(mode)) / grid.area();
                    double across = (l1x * grid.ly(mode) - l1y * grid.lx(mode)) / grid.area();
                    g[0] += along * product[0];
                    g[1] += along * product[1];
                    g[2] += across * product[0];
                    g[3] += across * product[1];
                }
            }
        }
    }

    private double[] product(Kind kind, Fields f, int k1x, int k1y, int k2x, int k2y) {
        double[] sum = new double[2];
        if (kind == Kind.SCALAR) {
            addProduct(sum, 1, f.uE(), k1x, k1y, f.vE(), k2x, k2y);
            return sum;
        }
        double phi1 = Math.atan2(k1y * grid.stepY(), k1x * grid.stepX());
        double phi2 = Math.atan2(k2y * grid.stepY(), k2x * grid.stepX());
        double cos = Math.cos(2 * (phi1 - phi2));
        double sin = Math.sin(2 * (phi1 - phi2));
        addProduct(sum, cos, f.uE(), k1x, k1y, f.vE(), k2x, k2y);
        addProduct(sum, cos, f.uB(), k1x, k1y, f.vB(), k2x, k2y);
        addProduct(sum, sin, f.uE(), k1x, k1y, f.vB(), k2x, k2y);
        addProduct(sum, -sin, f.uB(), k1x, k1y, f.vE(), k2x, k2y);
        return sum;
    }

    private void addProduct(
            double[] sum, double h, Modes u, int k1x, int k1y, Modes v, int k2x, int k2y) {
        if (u != null && v != null) {
            int one = k1x >= 0 ? grid.mode(k1x, k1y) : grid.mode(-k1x, -k1y);
            int two = k2x >= 0 ? grid.mode(k2x, k2y) : grid.mode(-k2x, -k2y);
            double ui = k1x >= 0 ? u.im(one) : -u.im(one);
            double vi = k2x >= 0 ? v.im(two) : -v.im(two);
            sum[0] += h * (u.re(one) * v.re(two) - ui * vi);
            sum[1] += h * (u.re(one) * vi + ui * v.re(two));
        }
    }
}
