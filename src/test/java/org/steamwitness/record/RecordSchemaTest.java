package org.steamwitness.record;

import static org.assertj.core.api.Assertions.assertThat;

import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.lang.reflect.RecordComponent;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.UnaryOperator;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.ObjectNode;

class RecordSchemaTest {

    private static final JsonMapper JSON = new JsonMapper();

    private static JsonNode schemaText;
    private static Schema schema;

    @BeforeAll
    static void load() {
        schemaText = JSON.readTree(RecordSchemaTest.class.getResourceAsStream("schema/record-1.schema.json"));
        schema = SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
                .getSchema(schemaText);
    }

    /** Together these records hold every part of the shape, given and withheld. */
    static Stream<JsonNode> records() throws IOException {
        UnaryOperator<String> same = text -> text;
        CycleRecord clean = Samples.saturatedSteam().record();
        CycleRecord pocket =
                Samples.changed(Samples::pocketAtTheDrain, same, same).record();
        CycleRecord sparse = Samples.changed(
                        same,
                        plan -> plan.replace("rule: guarded, conformance: 95 %", "rule: simple")
                                .replace(", certificate: \"26-0421\", due: 2027-01-15", "")
                                .replaceFirst("coverage: 2}\\}\n", "coverage: 2}}\n")
                                .replace("uncertainty: {calibration: 0.2 K, coverage: 2}}", "contact: sealed}")
                                .replace(
                                        "contact: sealed, unit: degC,\n     contact: sealed",
                                        "contact: sealed, unit: degC"),
                        sheet -> sheet.replaceFirst("(?m)^(zone|atmosphere|product|initial|marks).*\n", "")
                                .replaceAll("(?m)^(atmosphere|product|initial-temperature|marks):.*\n", ""))
                .record();
        CycleRecord neverHeld = Samples.changed(
                        log -> String.join("\n", log.lines().limit(100).toList()) + "\n", same, same)
                .record();
        return Stream.of(clean, pocket, sparse, neverHeld)
                .map(record -> JSON.readTree(new String(RecordJson.write(record), StandardCharsets.UTF_8)));
    }

    @ParameterizedTest
    @MethodSource("records")
    void aRealRecordKeepsTheShape(JsonNode record) {
        assertThat(schema.validate(record)).isEmpty();
    }

    @ParameterizedTest
    @MethodSource("records")
    void everyKeyIsNeededUnderItsOwnName(JsonNode record) {
        List<ObjectNode> objects = objectsIn(record);
        assertThat(objects).hasSizeGreaterThan(50);
        for (ObjectNode object : objects) {
            for (String key : List.copyOf(object.propertyNames())) {
                JsonNode value = object.remove(key);
                assertThat(schema.validate(record)).as("without " + key).isNotEmpty();
                object.set(key + "2", value);
                assertThat(schema.validate(record)).as("renamed " + key).isNotEmpty();
                object.remove(key + "2");
                object.set(key, value);
                object.putNull(key);
                assertThat(schema.validate(record)).as("null in " + key).isNotEmpty();
                object.set(key, value);
            }
        }
        assertThat(schema.validate(record)).isEmpty();
    }

    @Test
    void everyObjectOfTheShapeIsClosedAndWhole() {
        List<ObjectNode> open = objectsIn(schemaText).stream()
                .filter(o -> o.has("type")
                        && o.get("type").isString()
                        && o.get("type").asString().equals("object"))
                .filter(o -> !o.get("additionalProperties")
                                .equals(JSON.getNodeFactory().booleanNode(false))
                        || !namesIn((ArrayNode) o.get("required"))
                                .equals(new LinkedHashSet<>(o.get("properties").propertyNames())))
                .toList();
        assertThat(open).isEmpty();
    }

    @Test
    void everyKeySaysWhatItHolds() {
        objectsIn(schemaText).stream()
                .filter(o -> o.has("properties") && o.get("properties").isObject())
                .forEach(o -> o.get("properties")
                        .properties()
                        .forEach(p -> assertThat(p.getValue().has("description"))
                                .as(p.getKey())
                                .isTrue()));
    }

    @Test
    void theShapeNamesWhatTheRecordHoldsAndNothingElse() {
        Set<String> named = new TreeSet<>();
        objectsIn(schemaText).stream()
                .filter(o -> o.has("properties") && o.get("properties").isObject())
                .forEach(o -> named.addAll(o.get("properties").propertyNames()));
        Set<String> held = new TreeSet<>(Set.of("withheld", "missing"));
        collect(CycleRecord.class, held, new TreeSet<>());
        assertThat(named).isEqualTo(held);
    }

    private static void collect(Class<?> type, Set<String> names, Set<String> seen) {
        if (!type.isRecord() || type == Given.class || !seen.add(type.getName())) {
            return;
        }
        for (RecordComponent component : type.getRecordComponents()) {
            names.add(component.getName());
            for (Class<?> mentioned : mentionedIn(component)) {
                collect(mentioned, names, seen);
            }
        }
    }

    private static List<Class<?>> mentionedIn(RecordComponent component) {
        List<Class<?>> classes = new ArrayList<>();
        for (String name : component.getGenericType().getTypeName().split("[<>, ]+", -1)) {
            if (name.startsWith("org.steamwitness.record.")) {
                try {
                    classes.add(Class.forName(name));
                } catch (ClassNotFoundException notThere) {
                    throw new AssertionError(notThere);
                }
            }
        }
        return classes;
    }

    private static List<ObjectNode> objectsIn(JsonNode node) {
        List<ObjectNode> objects = new ArrayList<>();
        if (node instanceof ObjectNode object) {
            objects.add(object);
        }
        node.values().forEach(child -> objects.addAll(objectsIn(child)));
        return objects;
    }

    private static Set<String> namesIn(ArrayNode names) {
        Set<String> all = new LinkedHashSet<>();
        names.forEach(name -> all.add(name.asString()));
        return all;
    }
}
