package manyskies.combine;

import java.util.ArrayList;
import java.util.List;
import java.util.function.IntPredicate;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.ArrayRealVector;
import org.hipparchus.linear.LUDecomposition;
import org.hipparchus.linear.RealMatrix;
import org.hipparchus.linear.RealVector;

/**
 * Factors p_a(L) of unnormalised estimators in their minimum-variance combination.
 *
 * <p>p = S^-1 R / (R^T S^-1 R), with R the responses and S the covariance of the unnormalised
 * estimates; the same as w_a / R_a with w = N^-1 1 / (1^T N^-1 1), N_ab = S_ab / (R_a R_b).
 */
final class CombinationWeights {
    private CombinationWeights() {}

    /** The covariance of two unnormalised estimates at a mode. */
    interface Covariance {
        double at(int a, int b, int mode);
    }

    /** One array of factors per estimator; zero at modes that are not reconstructed. */
    static List<double[]> of(
            List<double[]> responses, Covariance covariance, IntPredicate reconstructed) {
        int modes = responses.get(0).length;
        List<double[]> out = new ArrayList<>();
        responses.forEach(r -> out.add(new double[modes]));
        for (int mode = 0; mode < modes; mode++) {
            if (reconstructed.test(mode)) {
                solve(mode, responses, covariance, out);
            }
        }
        return out;
    }

    private static void solve(
            int mode, List<double[]> responses, Covariance covariance, List<double[]> out) {
        List<Integer> alive = new ArrayList<>();
        for (int a = 0; a < responses.size(); a++) {
            if (responses.get(a)[mode] > 0 && covariance.at(a, a, mode) > 0) {
                alive.add(a);
            }
        }
        if (alive.isEmpty()) {
            return;
        }
        RealVector scale = new ArrayRealVector(alive.size());
        for (int i = 0; i < alive.size(); i++) {
            int a = alive.get(i);
            scale.setEntry(i, 1 / Math.sqrt(covariance.at(a, a, mode)));
        }
        RealVector r = new ArrayRealVector(alive.size());
        for (int i = 0; i < alive.size(); i++) {
            r.setEntry(i, responses.get(alive.get(i))[mode] * scale.getEntry(i));
        }
        RealMatrix s = correlations(mode, alive, covariance, scale);
        RealVector solved = new LUDecomposition(s).getSolver().solve(r);
        double norm = solved.dotProduct(r);
        for (int i = 0; i < alive.size(); i++) {
            out.get(alive.get(i))[mode] = solved.getEntry(i) * scale.getEntry(i) / norm;
        }
    }

    /** S with a unit diagonal, so that no small pivot is a matter of units. */
    private static RealMatrix correlations(
            int mode, List<Integer> alive, Covariance covariance, RealVector scale) {
        RealMatrix s = new Array2DRowRealMatrix(alive.size(), alive.size());
        for (int i = 0; i < alive.size(); i++) {
            for (int j = 0; j < alive.size(); j++) {
                double c = covariance.at(alive.get(i), alive.get(j), mode);
                s.setEntry(i, j, c * scale.getEntry(i) * scale.getEntry(j));
            }
        }
        return s;
    }
}
