package org.steamwitness.plan;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Function;
import org.snakeyaml.engine.v2.exceptions.Mark;
import org.snakeyaml.engine.v2.nodes.MappingNode;
import org.snakeyaml.engine.v2.nodes.Node;
import org.snakeyaml.engine.v2.nodes.NodeTuple;
import org.snakeyaml.engine.v2.nodes.ScalarNode;

/** The keys and values of one level of a file. Keys that nobody asks for are refused when the section has been read. */
final class Section {

    private final Document document;
    private final Node node;
    private final String path;
    private final Map<String, NodeTuple> tuples = new LinkedHashMap<>();
    private final Set<String> asked = new TreeSet<>();

    Section(Document document, MappingNode node, String path) {
        this.document = document;
        this.node = node;
        this.path = path;
        for (NodeTuple tuple : node.getValue()) {
            String key = tuple.getKeyNode() instanceof ScalarNode scalar ? scalar.getValue() : "?";
            if (tuples.putIfAbsent(key, tuple) != null) {
                refuseAt(tuple.getKeyNode(), pathOf(key), "stands twice; a key may stand once");
            }
        }
    }

    /** A key that has to be there. */
    Slot need(String key) {
        Slot slot = may(key);
        if (slot.isEmpty()) {
            refuse(key, "required key is missing");
        }
        return slot;
    }

    /** A key that may be left out. */
    Slot may(String key) {
        asked.add(key);
        NodeTuple tuple = tuples.get(key);
        return new Slot(document, this, pathOf(key), tuple == null ? null : tuple.getValueNode());
    }

    boolean has(String key) {
        return tuples.containsKey(key);
    }

    /** Reports a mistake of the section as a whole, or of a key that is not there. */
    void refuse(String key, String what) {
        NodeTuple tuple = tuples.get(key);
        refuseAt(tuple == null ? node : tuple.getKeyNode(), pathOf(key), what);
    }

    /** Reads the section whole and refuses what is left over. */
    <T> Entry<T> read(Function<Section, T> reader) {
        Entry<T> entry;
        try {
            entry = Entry.of(reader.apply(this));
        } catch (Entry.IncompleteException reported) {
            entry = Entry.broken();
        } catch (IllegalArgumentException refusedByTheValue) {
            refuseAt(node, path, refusedByTheValue.getMessage());
            entry = Entry.broken();
        }
        for (Map.Entry<String, NodeTuple> left : tuples.entrySet()) {
            if (!asked.contains(left.getKey())) {
                refuseAt(
                        left.getValue().getKeyNode(),
                        pathOf(left.getKey()),
                        "unknown key; known keys here: " + String.join(", ", asked));
            }
        }
        return entry;
    }

    void refuseAt(Node place, String at, String what) {
        int line = place.getStartMark().map(Mark::getLine).orElse(0) + 1;
        int column = place.getStartMark().map(Mark::getColumn).orElse(0) + 1;
        document.refuse(line, column, at, what);
    }

    void openAt(Node place, String at, String expected) {
        int line = place.getStartMark().map(Mark::getLine).orElse(0) + 1;
        int column = place.getStartMark().map(Mark::getColumn).orElse(0) + 1;
        document.open(line, column, at, expected);
    }

    private String pathOf(String key) {
        return path.isEmpty() ? key : path + "." + key;
    }
}
