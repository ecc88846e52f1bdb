package org.steamwitness.record;

import java.nio.charset.StandardCharsets;
import java.util.Optional;
import tools.jackson.core.JacksonException;
import tools.jackson.core.JsonGenerator;
import tools.jackson.core.StreamWriteFeature;
import tools.jackson.core.json.JsonFactory;
import tools.jackson.core.util.DefaultIndenter;
import tools.jackson.core.util.DefaultPrettyPrinter;
import tools.jackson.databind.MapperFeature;
import tools.jackson.databind.SerializationContext;
import tools.jackson.databind.SerializationFeature;
import tools.jackson.databind.ValueSerializer;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.module.SimpleModule;

/**
 * Writes {@code record.json}: fixed order of keys, line feeds, shortest exact doubles by one algorithm on every Java,
 * no number that is not finite.
 */
public final class RecordJson {

    private RecordJson() {}

    /**
     * Writes a record, indented, with a line feed at its end.
     *
     * @param record the record
     * @return UTF-8
     * @throws IllegalArgumentException if a number is not finite
     */
    public static byte[] write(CycleRecord record) {
        return (mapper().writeValueAsString(record) + "\n").getBytes(StandardCharsets.UTF_8);
    }

    /**
     * Reads from what files an existing record was made.
     *
     * @param json a {@code record.json}
     * @return its provenance; empty if it is no record
     */
    public static Optional<Provenance> provenanceIn(byte[] json) {
        try {
            JsonMapper mapper = mapper();
            return Optional.of(mapper.treeToValue(mapper.readTree(json).required("provenance"), Provenance.class));
        } catch (JacksonException noRecord) {
            return Optional.empty();
        }
    }

    private static JsonMapper mapper() {
        SimpleModule module = new SimpleModule("record")
                .addSerializer(new FiniteDoubles())
                .addSerializer(double.class, new FiniteDoubles())
                .addSerializer(new GivenOrWithheld());
        DefaultIndenter indent = new DefaultIndenter("  ", "\n");
        return JsonMapper.builder(JsonFactory.builder()
                        .enable(StreamWriteFeature.USE_FAST_DOUBLE_WRITER)
                        .build())
                .disable(MapperFeature.SORT_PROPERTIES_ALPHABETICALLY)
                .disable(MapperFeature.SORT_CREATOR_PROPERTIES_FIRST)
                .defaultPrettyPrinter(
                        new DefaultPrettyPrinter().withObjectIndenter(indent).withArrayIndenter(indent))
                .enable(SerializationFeature.INDENT_OUTPUT)
                .addModule(module)
                .build();
    }

    /** Refuses what JSON can't say. */
    private static final class FiniteDoubles extends ValueSerializer<Double> {
        @Override
        public Class<Double> handledType() {
            return Double.class;
        }

        @Override
        public void serialize(Double value, JsonGenerator out, SerializationContext context) throws JacksonException {
            if (!Double.isFinite(value)) {
                throw new IllegalArgumentException("a record holds finite numbers only, not " + value);
            }
            out.writeNumber(value.doubleValue());
        }
    }

    /** The value itself, or an object that says why it is withheld. */
    private static final class GivenOrWithheld extends ValueSerializer<Given<?>> {
        @Override
        public Class<?> handledType() {
            return Given.class;
        }

        @Override
        public void serialize(Given<?> given, JsonGenerator out, SerializationContext context) throws JacksonException {
            if (given.value().isPresent()) {
                context.writeValue(out, given.value().get());
            } else {
                out.writeStartObject();
                out.writeStringProperty("withheld", given.withheld());
                out.writeName("missing");
                out.writeStartArray();
                given.missing().forEach(out::writeString);
                out.writeEndArray();
                out.writeEndObject();
            }
        }
    }
}
