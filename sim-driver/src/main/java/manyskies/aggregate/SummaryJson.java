package manyskies.aggregate;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.StreamWriteFeature;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import manyskies.statistic.Deviation;
import manyskies.statistic.HotellingTest;
import manyskies.statistic.Measurement;

/** The summary as JSON, for scripts; keys in a fixed order, numbers in full precision. */
final class SummaryJson {
    /** Writes numbers as {@link Numbers} does. */
    private static final JsonFactory FACTORY =
            JsonFactory.builder().enable(StreamWriteFeature.USE_FAST_DOUBLE_WRITER).build();

    private final JsonGenerator json;
    private final Summary summary;

    private SummaryJson(JsonGenerator json, Summary summary) {
        this.json = json;
        this.summary = summary;
    }

    static byte[] encode(Summary summary) {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        DefaultIndenter indenter = new DefaultIndenter("  ", "\n"); // the same on every host
        try (JsonGenerator json = FACTORY.createGenerator(bytes)) {
            json.setPrettyPrinter(new DefaultPrettyPrinter().withObjectIndenter(indenter));
            new SummaryJson(json, summary).write();
            json.writeRaw("\n");
        } catch (IOException e) { // memory does not fail
            throw new UncheckedIOException(e);
        }
        return bytes.toByteArray();
    }

    private void write() throws IOException {
        json.writeStartObject();
        json.writeStringField("run", summary.facts().name());
        json.writeStringField("hash", summary.facts().hash());
        writeSets();
        json.writeNumberField("false_alarm", Summary.FALSE_ALARM);
        json.writeNumberField("verdicts", summary.verdicts());
        json.writeNumberField("threshold", summary.threshold());
        json.writeArrayFieldStart("notes");
        for (String note : summary.notes()) {
            json.writeString(note);
        }
        json.writeEndArray();
        json.writeObjectFieldStart("estimators");
        for (EstimatorSummary estimator : summary.estimators()) {
            writeEstimator(estimator);
        }
        json.writeEndObject();
        json.writeEndObject();
    }

    private void writeSets() throws IOException {
        json.writeObjectFieldStart("sets");
        for (SetCount set : summary.sets()) {
            json.writeObjectFieldStart(set.set());
            json.writeNumberField("planned", set.planned());
            json.writeNumberField("realisations", set.realisations());
            json.writeNumberField("blocks", set.blocks());
            json.writeEndObject();
        }
        json.writeEndObject();
    }

    private void writeEstimator(EstimatorSummary estimator) throws IOException {
        json.writeObjectFieldStart(estimator.estimator());
        writeCheck("transfer", estimator.transfer());
        writeCheck("curl_cross", estimator.curl());
        writeCheck("n0_ratio", estimator.n0());
        json.writeObjectFieldStart("debiased");
        if (estimator.debiasedWith().isPresent()) {
            json.writeStringField("n0", estimator.debiasedWith().get());
        }
        json.writeBooleanField("mean_field_removed", estimator.meanFieldRemoved());
        if (estimator.signalToNoise().isPresent()) {
            json.writeNumberField("signal_to_noise_of_one_sky", estimator.signalToNoise().get());
        }
        json.writeEndObject();
        json.writeEndObject();
    }

    private void writeCheck(String name, Check check) throws IOException {
        json.writeObjectFieldStart(name);
        json.writeStringField("verdict", check.verdict(summary.threshold()).words());
        json.writeNumberField("expected", check.expected());
        json.writeNumberField("realisations", check.count());
        json.writeNumberField("realisations_needed", check.needed());
        if (check.mean().isPresent()) {
            writeMean(check.mean().get(), check.expected());
        }
        if (check.jackknifeError().isPresent()) {
            json.writeNumberField("mean_error_jackknife", check.jackknifeError().get());
        }
        if (check.largest().isPresent()) {
            writeDeviation(check.largest().get());
        }
        if (check.test().isPresent()) {
            writeTest(check.test().get());
        }
        if (!check.reason().isEmpty()) {
            json.writeStringField("reason", check.reason());
        }
        json.writeEndObject();
    }

    private void writeMean(Measurement mean, double expected) throws IOException {
        json.writeNumberField("mean", mean.value());
        json.writeNumberField("mean_error", mean.error());
        json.writeNumberField("mean_deviation", mean.value() - expected);
    }

    private void writeDeviation(Deviation largest) throws IOException {
        json.writeObjectFieldStart("largest_deviation");
        json.writeNumberField("sigma", largest.sigma());
        json.writeNumberField("band", largest.index());
        json.writeNumberField("l_min", summary.bandEdges().get(largest.index()));
        json.writeNumberField("l_max", summary.bandEdges().get(largest.index() + 1));
        json.writeEndObject();
    }

    private void writeTest(HotellingTest test) throws IOException {
        json.writeNumberField("chi_square", test.tSquared());
        json.writeNumberField("bands", test.dimension());
        json.writeNumberField("probability_to_exceed", test.probabilityToExceed());
    }
}
