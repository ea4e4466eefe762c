package manyskies.farm;

import java.util.List;
import java.util.function.Consumer;
import manyskies.result.BlockId;
import org.apache.spark.SparkConf;
import org.apache.spark.SparkContext;
import org.apache.spark.api.java.JavaSparkContext;
import org.apache.spark.rdd.RDD;
import scala.reflect.ClassTag$;
import scala.runtime.AbstractFunction2;
import scala.runtime.BoxedUnit;

/** A quiet Spark: in this JVM, or the driver of a cluster. */
final class Cluster implements AutoCloseable {
    private final JavaSparkContext java;
    private final SparkContext context;

    private Cluster(SparkContext context) {
        this.context = context;
        this.java = JavaSparkContext.fromSparkContext(context);
    }

    /**
     * Starts Spark.
     *
     * @throws FarmException if there is no such master, or Spark does not start
     */
    static Cluster start(FarmSettings settings) {
        try {
            return new Cluster(new SparkContext(configuration(settings)));
        } catch (Exception e) { // Scala throws checked exceptions undeclared
            throw new FarmException(
                    "Spark did not start on "
                            + settings.masterUrl()
                            + ": "
                            + e.getMessage()
                            + "; nothing was lost, the same command resumes",
                    e);
        }
    }

    /** System properties named spark.* are kept, so that a cluster can be tuned from outside. */
    private static SparkConf configuration(FarmSettings settings) {
        SparkConf conf =
                new SparkConf()
                        .setAppName("manyskies")
                        .setMaster(settings.masterUrl())
                        .set("spark.speculation", "false") // a repeat gives the same bytes: waste
                        .set("spark.driver.maxResultSize", "0") // the farm bounds what is in flight
                        .set("spark.ui.showConsoleProgress", "false")
                        .setIfMissing("spark.ui.enabled", "false");
        if (settings.isLocal()) {
            conf.set("spark.driver.bindAddress", "127.0.0.1").set("spark.driver.host", "127.0.0.1");
        }
        return conf;
    }

    /**
     * Runs one job, a task per block, and returns when all have ended; throws what Spark throws
     * (undeclared) if a task failed on every try or the job was cancelled.
     *
     * @param outcomes called on Spark's scheduler thread: must not wait
     */
    void run(List<BlockId> blocks, BlockTask task, Consumer<TaskOutcome> outcomes) {
        RDD<BlockId> rdd = java.parallelize(blocks, blocks.size()).rdd();
        context.runJob(
                rdd, task, new Handler(outcomes), ClassTag$.MODULE$.apply(TaskOutcome.class));
    }

    /** Ends all jobs; tasks that run already are left to their fate. */
    void cancel() {
        context.cancelAllJobs();
    }

    /** Whether Spark has given up. */
    boolean isStopped() {
        return context.isStopped();
    }

    /** Executors that can take tasks; in this JVM one. */
    int executors() {
        int known = context.statusTracker().getExecutorInfos().length;
        return context.isLocal() ? known : known - 1; // the driver counts itself
    }

    @Override
    public void close() {
        context.stop();
    }

    private static final class Handler extends AbstractFunction2<Object, TaskOutcome, BoxedUnit> {
        private final Consumer<TaskOutcome> outcomes;

        Handler(Consumer<TaskOutcome> outcomes) {
            this.outcomes = outcomes;
        }

        @Override
        public BoxedUnit apply(Object partition, TaskOutcome outcome) {
            outcomes.accept(outcome);
            return BoxedUnit.UNIT;
        }
    }
}
