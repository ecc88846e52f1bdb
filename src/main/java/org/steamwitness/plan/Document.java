package org.steamwitness.plan;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import org.snakeyaml.engine.v2.api.LoadSettings;
import org.snakeyaml.engine.v2.api.lowlevel.Compose;
import org.snakeyaml.engine.v2.exceptions.MarkedYamlEngineException;
import org.snakeyaml.engine.v2.exceptions.YamlEngineException;
import org.snakeyaml.engine.v2.nodes.MappingNode;
import org.snakeyaml.engine.v2.nodes.Node;
import org.steamwitness.finding.Finding;
import org.steamwitness.finding.FindingKind;
import org.steamwitness.finding.Position;

/** One YAML file that people write: read strictly, with every mistake reported at its line, column and key path. */
final class Document {

    private static final Comparator<Finding> IN_ORDER_OF_THE_FILE = Comparator.comparingInt(
                    (Finding f) -> f.position().line())
            .thenComparingInt(f -> f.position().column());

    private final String file;
    private final List<Finding> problems = new ArrayList<>();

    private Document(String file) {
        this.file = file;
    }

    /** Reads a file whose top level is a section. */
    static <T> AsWritten<T> read(String file, byte[] bytes, Function<Section, T> reader) {
        Document document = new Document(file);
        Optional<T> value = document.compose(bytes).flatMap(root -> document.value(root, reader));
        document.problems.sort(IN_ORDER_OF_THE_FILE);
        return new AsWritten<>(document.problems.isEmpty() ? value : Optional.empty(), document.problems);
    }

    void refuse(int line, int column, String path, String what) {
        problems.add(
                new Finding(FindingKind.ENTRY_WRONG, new Position(file, line, column, path), Map.of("what", what)));
    }

    private <T> Optional<T> value(Node root, Function<Section, T> reader) {
        if (!(root instanceof MappingNode mapping)) {
            refuse(1, 1, "", "expected keys and values such as \"id: R2\"");
            return Optional.empty();
        }
        return new Section(this, mapping, "").read(reader).kept();
    }

    /** Reports a place that nobody has filled in yet. */
    void open(int line, int column, String path, String expected) {
        problems.add(new Finding(
                FindingKind.OPEN_PLACE, new Position(file, line, column, path), Map.of("expected", expected)));
    }

    private Optional<Node> compose(byte[] bytes) {
        String text;
        try {
            text = StandardCharsets.UTF_8
                    .newDecoder()
                    .decode(ByteBuffer.wrap(bytes))
                    .toString();
        } catch (CharacterCodingException notText) {
            refuse(1, 1, "", "the file is not text in UTF-8; save it as UTF-8");
            return Optional.empty();
        }
        try {
            LoadSettings settings = LoadSettings.builder().setLabel(file).build();
            Optional<Node> root = new Compose(settings)
                    .composeString(OpenPlace.readable(text.startsWith("\uFEFF") ? text.substring(1) : text));
            if (root.isEmpty()) {
                refuse(1, 1, "", "the file is empty");
            }
            return root;
        } catch (MarkedYamlEngineException wrong) {
            int line = wrong.getProblemMark().map(m -> m.getLine() + 1).orElse(1);
            int column = wrong.getProblemMark().map(m -> m.getColumn() + 1).orElse(1);
            refuse(line, column, "", "not valid YAML: " + wrong.getProblem());
        } catch (YamlEngineException wrong) {
            refuse(1, 1, "", "not valid YAML: " + firstLine(wrong.getMessage()));
        }
        return Optional.empty();
    }

    private static String firstLine(String message) {
        return message.lines().findFirst().orElse("");
    }
}
