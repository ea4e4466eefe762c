package manyskies.specification;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.DoublePredicate;
import org.snakeyaml.engine.v2.nodes.MappingNode;
import org.snakeyaml.engine.v2.nodes.Node;
import org.snakeyaml.engine.v2.nodes.NodeTuple;
import org.snakeyaml.engine.v2.nodes.ScalarNode;
import org.snakeyaml.engine.v2.nodes.SequenceNode;

/**
 * One mapping of the file with its known keys; adds a fault for every key that is unknown or stands
 * twice and for every value that is not of the kind asked for.
 *
 * <p>A value that is faulty is given as NaN or as absent. Comparisons with NaN are false, so a
 * check written as "if (a &gt; b) fault" does not complain a second time.
 */
final class Section {
    private final String path;
    private final int line;
    private final Faults faults;
    private final Map<String, NodeTuple> entries = new LinkedHashMap<>();
    private final Set<String> excused = new LinkedHashSet<>(); // keys a fault already speaks of
    private boolean whole = true;

    private Section(String path, int line, Faults faults) {
        this.path = path;
        this.line = line;
        this.faults = faults;
    }

    /** The whole file. */
    static Section file(Node root, Faults faults, List<String> keys) {
        Section file = new Section("", 1, faults);
        file.fill(root, keys);
        return file;
    }

    /** The mapping under a key; one without entries if the key is not there. */
    Section section(String key, List<String> keys) {
        Section inner = new Section(path(key), line(key), faults);
        node(key).ifPresent(node -> inner.fill(node, keys));
        inner.whole &= whole && !excused.contains(key);
        return inner;
    }

    private void fill(Node node, List<String> keys) {
        if (!(node instanceof MappingNode mapping)) {
            String subject = path.isEmpty() ? "the file" : path;
            faults.add(
                    YamlTree.line(node.getStartMark()),
                    subject + " is no mapping; its keys are " + String.join(", ", keys) + ".");
            whole = false;
            return;
        }
        for (NodeTuple entry : mapping.getValue()) {
            add(entry, keys);
        }
    }

    private void add(NodeTuple entry, List<String> keys) {
        int at = YamlTree.line(entry.getKeyNode().getStartMark());
        String key = entry.getKeyNode() instanceof ScalarNode scalar ? scalar.getValue() : "[...]";
        if (!keys.contains(key)) {
            String owner = path.isEmpty() ? "a specification" : path;
            faults.add(at, "'" + key + "' is no key of " + owner + "; " + NearName.mend(key, keys));
            NearName.of(key, keys).ifPresent(excused::add);
        } else if (entries.containsKey(key)) {
            faults.add(
                    at, path(key) + " stands twice, first in line " + line(key) + "; remove one.");
        } else {
            entries.put(key, entry);
        }
    }

    /** The faults of the file. */
    Faults faults() {
        return faults;
    }

    /** A key as sentences name it. */
    String path(String key) {
        return path.isEmpty() ? key : path + "." + key;
    }

    /** The line of a key, or of this mapping if the key is not there. */
    int line(String key) {
        return has(key) ? YamlTree.line(entries.get(key).getKeyNode().getStartMark()) : line;
    }

    /** Whether this is a mapping, or is not there; false if a fault already speaks of it. */
    boolean isWhole() {
        return whole;
    }

    boolean has(String key) {
        return entries.containsKey(key);
    }

    /** Adds a fault about a key's value: "path is text; allowed". */
    void fault(String key, String found, String allowed) {
        faults.add(line(key), path(key) + " is " + found + "; " + allowed + ".");
    }

    /** Adds a fault about a scalar's value, which is quoted as it stands in the file. */
    void fault(String key, String allowed) {
        fault(key, text(key, allowed).orElse("something else"), allowed);
    }

    /** Adds a fault if a key that has no default is not there; the example shows how to write it. */
    void require(String key, String example) {
        if (!has(key) && whole && !excused.contains(key)) {
            faults.add(line, path(key) + " is missing; write for example '" + example + "'.");
        }
    }

    Optional<Node> node(String key) {
        return Optional.ofNullable(entries.get(key)).map(NodeTuple::getValueNode);
    }

    /** The text of a scalar; none, with a fault if the value is something else. */
    Optional<String> text(String key, String allowed) {
        Optional<Node> node = node(key);
        return node.isEmpty() ? Optional.empty() : scalar(node.get(), key, allowed);
    }

    private Optional<String> scalar(Node node, String key, String allowed) {
        if (!(node instanceof ScalarNode scalar)) {
            String kind = node instanceof SequenceNode ? "a list" : "a mapping";
            fault(key, kind, allowed);
            return Optional.empty();
        }
        String text = scalar.getValue().strip();
        if (text.isEmpty()) {
            fault(key, "empty", allowed);
            return Optional.empty();
        }
        return Optional.of(text);
    }

    /** The texts of a list of scalars, or of one scalar alone; none if a fault was added. */
    Optional<List<String>> list(String key, String allowed) {
        Node node = node(key).orElseThrow();
        if (!(node instanceof SequenceNode sequence)) {
            return scalar(node, key, allowed).map(List::of);
        }
        List<String> texts = new ArrayList<>();
        for (Node item : sequence.getValue()) {
            scalar(item, key, allowed).ifPresent(texts::add);
        }
        return texts.size() == sequence.getValue().size() ? Optional.of(texts) : Optional.empty();
    }

    /** A number that passes a test; the default if the key is not there, NaN after a fault. */
    double number(String key, double otherwise, DoublePredicate test, String allowed) {
        if (!has(key)) {
            return otherwise;
        }
        return text(key, allowed).map(text -> number(key, text, test, allowed)).orElse(Double.NaN);
    }

    double number(String key, String text, DoublePredicate test, String allowed) {
        double value = Decimal.parse(text).map(BigDecimal::doubleValue).orElse(Double.NaN);
        if (Double.isFinite(value) && test.test(value)) {
            return value;
        }
        fault(key, Decimal.parse(text).isPresent() ? text : "'" + text + "'", allowed);
        return Double.NaN;
    }

    /** A whole number within limits; the default if the key is not there, NaN after a fault. */
    double whole(String key, double otherwise, int least, int most) {
        String allowed = "it must be a whole number from " + least + " to " + most;
        return number(key, otherwise, n -> n == Math.rint(n) && n >= least && n <= most, allowed);
    }

    /**
     * A positive quantity with its unit; the default if the key is not there, NaN after a fault.
     *
     * @param none whether the word "none" stands for 0
     */
    double quantity(String key, double otherwise, Quantity kind, boolean none) {
        String allowed =
                "write "
                        + kind.noun()
                        + " such as '"
                        + kind.example()
                        + (none ? "' or 'none'" : "'");
        return has(key)
                ? text(key, allowed)
                        .map(text -> quantity(key, text, kind, none, allowed))
                        .orElse(Double.NaN)
                : otherwise;
    }

    private double quantity(String key, String text, Quantity kind, boolean none, String allowed) {
        if (none && text.equals("none")) {
            return 0;
        }
        String[] parts = text.split("\\s+", 2);
        Optional<BigDecimal> number = Decimal.parse(parts[0]);
        if (number.isEmpty()) {
            fault(key, "'" + text + "'", allowed);
        } else if (parts.length == 1) {
            fault(key, text + " without a unit", "allowed units are " + kind.units());
        } else if (kind.size(parts[1]).isEmpty()) {
            fault(
                    key,
                    "'" + text + "'",
                    "'"
                            + parts[1]
                            + "' is no unit of "
                            + kind.noun()
                            + ", allowed are "
                            + kind.units());
        } else {
            return positive(key, text, kind, number.get(), kind.size(parts[1]).get(), none);
        }
        return Double.NaN;
    }

    private double positive(
            String key,
            String text,
            Quantity kind,
            BigDecimal number,
            BigDecimal unit,
            boolean none) {
        double value = Decimal.scaled(number, unit);
        if (value > 0 && Double.isFinite(value)) {
            return value;
        }
        fault(key, text, kind.noun() + " must be positive" + (none ? ", or 'none'" : ""));
        return Double.NaN;
    }
}
