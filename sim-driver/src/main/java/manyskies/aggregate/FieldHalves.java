package manyskies.aggregate;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import manyskies.field.ModeSpace;
import manyskies.field.Modes;
import manyskies.result.Block;
import manyskies.spectrum.Bandpowers;
import manyskies.statistic.Measurement;

/**
 * The mean reconstruction of two disjoint halves of the skies: blocks of even and of odd number.
 *
 * <p>The cross-spectrum of the two means is the spectrum of the mean field alone: no sky is in both,
 * so that their Monte Carlo noise does not enter. Its error is that of Gaussian fields, Var C_b =
 * (C_xy^2 + C_xx C_yy) / N_b with the spectra of the two means and N_b modes; where there is a mean
 * field it is counted as if it scattered too, and the error is on the safe side.
 *
 * <p>Memory: two fields per estimator. Mutable: one owner.
 */
final class FieldHalves {
    private final ModeSpace space;
    private final SortedMap<String, double[][]> sums = new TreeMap<>();
    private final int[] counts = new int[2];

    FieldHalves(ModeSpace space) {
        this.space = space;
    }

    /**
     * Adds the next block.
     *
     * @throws IllegalArgumentException if it has other fields than those before, or of another size
     */
    void add(Block block) {
        if (counts[0] + counts[1] == 0) {
            for (String name : block.fieldSums().keySet()) {
                sums.put(name, new double[2][2 * space.size()]);
            }
        } else if (!block.fieldSums().keySet().equals(sums.keySet())) {
            throw new IllegalArgumentException(
                    block.id().stem()
                            + " has the fields "
                            + block.fieldSums().keySet()
                            + ", the blocks before it "
                            + sums.keySet()
                            + "; delete this block and run again");
        }
        int half = block.id().number() % 2;
        counts[half] += block.id().count();
        block.fieldSums()
                .forEach((name, field) -> addField(block, name, sums.get(name)[half], field));
    }

    private static void addField(Block block, String name, double[] sum, double[] field) {
        if (field.length != sum.length) {
            throw new IllegalArgumentException(
                    block.id().stem()
                            + ": field "
                            + name
                            + " has "
                            + field.length
                            + " numbers, the run's patch needs "
                            + sum.length
                            + "; delete this block and run again");
        }
        for (int i = 0; i < sum.length; i++) {
            sum[i] += field[i];
        }
    }

    /** The mean field's spectrum per band, or nothing if one half is empty or has no such field. */
    Optional<List<Measurement>> spectrum(String estimator, Bandpowers bandpowers) {
        if (!sums.containsKey(estimator) || counts[0] == 0 || counts[1] == 0) {
            return Optional.empty();
        }
        Modes even = mean(estimator, 0);
        Modes odd = mean(estimator, 1);
        double[] cross = bandpowers.average(even, odd);
        double[] evenAuto = bandpowers.average(even, even);
        double[] oddAuto = bandpowers.average(odd, odd);
        double[] modes = bandpowers.modesInBand();
        List<Measurement> out = new ArrayList<>();
        for (int band = 0; band < cross.length; band++) {
            double variance =
                    (cross[band] * cross[band] + evenAuto[band] * oddAuto[band]) / modes[band];
            out.add(
                    new Measurement(
                            cross[band], Math.sqrt(variance), (long) counts[0] + counts[1]));
        }
        return Optional.of(out);
    }

    private Modes mean(String estimator, int half) {
        double[] mean = sums.get(estimator)[half].clone();
        for (int i = 0; i < mean.length; i++) {
            mean[i] /= counts[half];
        }
        return Modes.of(space, mean);
    }
}
