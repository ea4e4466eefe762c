package manyskies.spectrum;

import java.util.ArrayList;
import java.util.List;

/**
 * The distinct functions d^l_mn behind many pairs of orders, which symmetries make few.
 *
 * <p>d_mn = d_-n-m = (-1)^(m-n) d_nm = (-1)^(m-n) d_-m-n (DLMF has none of these; Varshalovich et
 * al. 1988, section 4.4): each pair equals {@link #sign} times a function with m &ge; |n|.
 */
final class WignerSet {
    private record Orders(int m, int n) {
        /** The pair with m &ge; |n| among the four that symmetries connect. */
        Orders canonical() {
            int high = Math.max(Math.abs(m), Math.abs(n));
            int low = Math.abs(m) == high ? (m < 0 ? -n : n) : (n < 0 ? -m : m);
            return new Orders(high, low);
        }
    }

    private final int lmax;
    private final List<Orders> orders = new ArrayList<>();
    private final List<WignerD> functions = new ArrayList<>();

    WignerSet(int lmax) {
        this.lmax = lmax;
    }

    /** Which of the functions stands for d_mn; it is added if it is new. */
    int index(int m, int n) {
        Orders canonical = new Orders(m, n).canonical();
        if (!orders.contains(canonical)) {
            orders.add(canonical);
            functions.add(WignerD.of(canonical.m, canonical.n, lmax));
        }
        return orders.indexOf(canonical);
    }

    /** What to multiply that function by, 1 or -1. */
    static int sign(int m, int n) {
        boolean asItStands = m >= Math.abs(n) || -n >= Math.abs(m);
        return asItStands || (m - n) % 2 == 0 ? 1 : -1;
    }

    /** Number of functions. */
    int size() {
        return functions.size();
    }

    /** All functions at one angle: values[index][l]. */
    void fill(double beta, double[][] values) {
        for (int i = 0; i < values.length; i++) {
            functions.get(i).fill(beta, values[i]);
        }
    }
}
