package manyskies.specification;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Collects the faults of one file while it is read to its end. */
final class Faults {
    private final List<Fault> found = new ArrayList<>();

    void add(int line, String sentence) {
        found.add(new Fault(line, sentence));
    }

    boolean none() {
        return found.isEmpty();
    }

    int count() {
        return found.size();
    }

    /** In the order of the lines; faults of one line in the order in which they were found. */
    List<Fault> sorted() {
        return found.stream().sorted(Comparator.comparingInt(Fault::line)).toList();
    }
}
