package manyskies.aggregate;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import manyskies.spectrum.Bands;
import manyskies.statistic.MeanVector;
import manyskies.statistic.Measurement;

/**
 * Turns committed blocks into tables.
 *
 * <p>It reads each set once, block by block, and may run while the farm works: it uses what is
 * there and says how much that is. The same blocks give the same bytes, whoever made them.
 */
public final class Aggregation {
    private static final String DATA = "data";
    private static final String PAIRS = "pairs";

    private final RunFacts facts;
    private final AnalyticBands known;

    /** An aggregation for the given run. */
    public Aggregation(RunFacts facts, AnalyticBands known) {
        this.facts = facts;
        this.known = known;
    }

    /**
     * The tables of all blocks that are there.
     *
     * @throws IllegalArgumentException if a block does not fit the run; the message names it
     */
    public Tables of(BlockSource source) {
        int bands = known.bands().count();
        FieldHalves halves = new FieldHalves(known.space());
        SetStatistics data = SetStatistics.read(DATA, bands, source.blocks(DATA), halves::add);
        SetStatistics pairs = SetStatistics.read(PAIRS, bands, source.blocks(PAIRS), block -> {});
        List<EstimatorResult> results = new ArrayList<>();
        for (String estimator : known.estimators()) {
            results.add(new EstimatorResult(estimator, known, data, pairs, halves));
        }
        return new Tables(
                rows(results, data, pairs), covariance(data), summary(results, data, pairs));
    }

    private List<BandRow> rows(
            List<EstimatorResult> results, SetStatistics data, SetStatistics pairs) {
        BandRows rows = new BandRows(known);
        rows.addMeans("input", data);
        for (EstimatorResult result : results) {
            String name = result.name();
            rows.addComputed(name);
            rows.addMeans(name, data);
            result.transfer().ifPresent(vector -> rows.add(name, "transfer", vector));
            result.meanField().ifPresent(list -> rows.add(name, "mean_field", list));
            rows.addMeans(name, pairs);
            result.debiased().ifPresent(list -> rows.add(name, "debiased", list));
        }
        return rows.list();
    }

    private LabelledCovariance covariance(SetStatistics data) {
        List<String> present = new ArrayList<>();
        List<String> columns = new ArrayList<>();
        for (String estimator : known.estimators()) {
            if (data.columns().contains(estimator + ".auto")) {
                present.add(estimator);
                columns.add(estimator + ".auto");
            }
        }
        Optional<MeanVector> autos = data.vector(columns.toArray(String[]::new));
        return new LabelledCovariance(
                present, known.bands().count(), autos.map(MeanVector::covariance));
    }

    private Summary summary(
            List<EstimatorResult> results, SetStatistics data, SetStatistics pairs) {
        List<SetCount> sets =
                List.of(count(data, facts.planned().data()), count(pairs, facts.planned().pairs()));
        List<EstimatorSummary> estimators = results.stream().map(EstimatorSummary::of).toList();
        return new Summary(
                facts, sets, edges(known.bands()), estimators, Summary.notes(sets, estimators));
    }

    private static SetCount count(SetStatistics set, int planned) {
        return new SetCount(set.set(), planned, set.count(), set.blocks());
    }

    private static List<Double> edges(Bands bands) {
        List<Double> edges = new ArrayList<>();
        edges.add(bands.lower(0));
        for (int band = 0; band < bands.count(); band++) {
            edges.add(bands.upper(band));
        }
        return edges;
    }

    /** Collects rows of the table. */
    private static final class BandRows {
        private final AnalyticBands known;
        private final double[] meanMultipole;
        private final List<BandRow> rows = new ArrayList<>();

        BandRows(AnalyticBands known) {
            this.known = known;
            meanMultipole = known.bandpowers().meanMultipole();
        }

        List<BandRow> list() {
            return rows;
        }

        void addComputed(String estimator) {
            for (String name : known.names()) {
                if (name.startsWith(estimator + ".")) {
                    double[] vector = known.vector(name).orElseThrow();
                    for (int band = 0; band < vector.length; band++) {
                        String quantity = name.substring(estimator.length() + 1);
                        add(estimator, quantity, band, Measurement.computed(vector[band]));
                    }
                }
            }
        }

        void addMeans(String estimator, SetStatistics set) {
            for (String column : set.columns()) {
                if (column.startsWith(estimator + ".")) {
                    String quantity = column.substring(estimator.length() + 1);
                    set.vector(column).ifPresent(mean -> add(estimator, quantity, mean));
                }
            }
        }

        void add(String estimator, String quantity, MeanVector vector) {
            for (int band = 0; band < vector.size(); band++) {
                add(estimator, quantity, band, vector.measurement(band));
            }
        }

        void add(String estimator, String quantity, List<Measurement> vector) {
            for (int band = 0; band < vector.size(); band++) {
                add(estimator, quantity, band, vector.get(band));
            }
        }

        private void add(String estimator, String quantity, int band, Measurement measurement) {
            Bands bands = known.bands();
            rows.add(
                    new BandRow(
                            estimator,
                            quantity,
                            band,
                            bands.lower(band),
                            bands.upper(band),
                            meanMultipole[band],
                            measurement));
        }
    }
}
