package manyskies.estimator;

import java.util.Collections;
import java.util.ServiceLoader;
import java.util.SortedMap;
import java.util.TreeMap;

/** Lookup of installed estimators by name. */
public final class Estimators {
    private Estimators() {}

    /**
     * All estimators on the class path, by name.
     *
     * @throws IllegalStateException if two have one name
     */
    public static SortedMap<String, EstimatorFactory> installed() {
        return byName(ServiceLoader.load(EstimatorFactory.class));
    }

    static SortedMap<String, EstimatorFactory> byName(Iterable<EstimatorFactory> factories) {
        SortedMap<String, EstimatorFactory> found = new TreeMap<>();
        for (EstimatorFactory factory : factories) {
            EstimatorFactory other = found.put(factory.name(), factory);
            if (other != null) {
                throw new IllegalStateException(
                        "two estimators are called '"
                                + factory.name()
                                + "': "
                                + other.getClass().getName()
                                + " and "
                                + factory.getClass().getName()
                                + "; remove or rename one");
            }
        }
        return Collections.unmodifiableSortedMap(found);
    }

    /**
     * One estimator by name.
     *
     * @throws IllegalArgumentException if it is not installed; the message lists those that are
     */
    public static EstimatorFactory named(String name) {
        SortedMap<String, EstimatorFactory> all = installed();
        EstimatorFactory found = all.get(name);
        if (found == null) {
            throw new IllegalArgumentException(
                    "no estimator '"
                            + name
                            + "' is installed; there are "
                            + String.join(", ", all.keySet()));
        }
        return found;
    }
}
