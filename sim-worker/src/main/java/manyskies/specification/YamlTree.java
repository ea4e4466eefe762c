package manyskies.specification;

import java.util.Locale;
import java.util.Optional;
import org.snakeyaml.engine.v2.api.LoadSettings;
import org.snakeyaml.engine.v2.api.lowlevel.Compose;
import org.snakeyaml.engine.v2.api.lowlevel.Parse;
import org.snakeyaml.engine.v2.common.Anchor;
import org.snakeyaml.engine.v2.events.AliasEvent;
import org.snakeyaml.engine.v2.events.CollectionEndEvent;
import org.snakeyaml.engine.v2.events.CollectionStartEvent;
import org.snakeyaml.engine.v2.events.DocumentStartEvent;
import org.snakeyaml.engine.v2.events.Event;
import org.snakeyaml.engine.v2.events.NodeEvent;
import org.snakeyaml.engine.v2.events.ScalarEvent;
import org.snakeyaml.engine.v2.exceptions.Mark;
import org.snakeyaml.engine.v2.exceptions.MarkedYamlEngineException;
import org.snakeyaml.engine.v2.exceptions.ReaderException;
import org.snakeyaml.engine.v2.exceptions.YamlEngineException;
import org.snakeyaml.engine.v2.nodes.Node;

/**
 * YAML text as a tree of nodes that know their lines; no objects are built from it.
 *
 * <p>Anchors, aliases, tags, further documents and deep nesting are faults: a specification needs
 * none of them, and with aliases a small file can stand for a huge one.
 */
final class YamlTree {
    private static final int DEEPEST = 16;
    private static final LoadSettings SETTINGS =
            LoadSettings.builder().setAllowNonScalarKeys(true).build();

    private YamlTree() {}

    /** The line of a mark, from 1. */
    static int line(Optional<Mark> mark) {
        return mark.map(m -> m.getLine() + 1).orElse(0);
    }

    /** The root of a text; none if the text is empty or the faults tell why there is none. */
    static Optional<Node> of(String text, Faults faults) {
        try {
            return plain(text, faults)
                    ? new Compose(SETTINGS).composeString(text)
                    : Optional.empty();
        } catch (MarkedYamlEngineException e) {
            faults.add(line(e.getProblemMark()), syntax(e));
        } catch (ReaderException e) {
            faults.add(
                    1
                            + (int)
                                    text.codePoints()
                                            .limit(e.getPosition())
                                            .filter(c -> c == '\n')
                                            .count(),
                    String.format(
                            Locale.ROOT,
                            "the text holds the control character U+%04X; remove it.",
                            e.getCodePoint()));
        } catch (YamlEngineException e) {
            faults.add(0, "the file is not YAML: " + firstLine(e.getMessage()) + ".");
        }
        return Optional.empty();
    }

    private static String syntax(MarkedYamlEngineException e) {
        int begun = line(e.getContextMark());
        return "the text is not YAML: "
                + firstLine(e.getProblem())
                + (e.getContext() == null ? "" : " " + firstLine(e.getContext()))
                + (begun > 0 && begun != line(e.getProblemMark()) ? " begun in line " + begun : "")
                + "; check indentation, colons, quotes and brackets here and in the line above.";
    }

    private static String firstLine(String text) {
        return text == null ? "unknown reason" : text.lines().findFirst().orElse("").strip();
    }

    /** Whether the text has only mappings, lists and scalars; adds a fault for all else. */
    private static boolean plain(String text, Faults faults) {
        int depth = 0;
        int documents = 0;
        boolean plain = true;
        for (Event event : new Parse(SETTINGS).parseString(text)) {
            depth += event instanceof CollectionStartEvent ? 1 : 0;
            depth -= event instanceof CollectionEndEvent ? 1 : 0;
            documents += event instanceof DocumentStartEvent ? 1 : 0;
            Optional<String> fault = fault(event, depth, documents);
            if (fault.isPresent()) {
                faults.add(line(event.getStartMark()), fault.get());
                plain = false;
            }
            if (depth > DEEPEST || documents > 1) {
                return false; // what follows would only repeat the fault
            }
        }
        return plain;
    }

    private static Optional<String> fault(Event event, int depth, int documents) {
        if (event instanceof AliasEvent alias) {
            return Optional.of("'*" + alias.getAlias() + "' is an alias; write the value out.");
        }
        if (event instanceof NodeEvent node && node.getAnchor().isPresent()) {
            Anchor anchor = node.getAnchor().get();
            return Optional.of("'&" + anchor + "' is an anchor; write the value without it.");
        }
        Optional<String> tag = tag(event);
        if (tag.isPresent()) {
            return Optional.of("'" + tag.get() + "' is a tag; write the value without it.");
        }
        if (depth > DEEPEST) {
            return Optional.of("the nesting is deeper than " + DEEPEST + "; three levels suffice.");
        }
        return documents > 1 && event instanceof DocumentStartEvent
                ? Optional.of("a second document begins; a file holds one specification.")
                : Optional.empty();
    }

    private static Optional<String> tag(Event event) {
        return event instanceof ScalarEvent scalar
                ? scalar.getTag()
                : event instanceof CollectionStartEvent start ? start.getTag() : Optional.empty();
    }
}
