package org.steamwitness.record;

import com.github.mustachejava.DefaultMustacheFactory;
import com.github.mustachejava.Mustache;
import com.github.mustachejava.MustacheException;
import com.github.mustachejava.reflect.ReflectionObjectHandler;
import com.github.mustachejava.util.Wrapper;
import java.io.IOException;
import java.io.InputStream;
import java.io.Reader;
import java.io.StringReader;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;

/**
 * A template of the printed record: XHTML with Mustache names, strict. It sees maps, lists and strings only; a name
 * that the record does not have, or a partial, is an error that says where it stands.
 */
public final class Template {

    private static final int REPLACEMENT = 0xFFFD;
    private static final String STANDARD = "cycle-record.xhtml";

    private final String name;
    private final byte[] bytes;

    private Template(String name, byte[] bytes) {
        this.name = name;
        this.bytes = bytes;
    }

    /**
     * The template that ships with the program.
     *
     * @return the standard template
     * @throws UncheckedIOException if the program is not whole
     */
    public static Template standard() {
        try (InputStream file = Template.class.getResourceAsStream("templates/" + STANDARD)) {
            if (file == null) {
                throw new IOException("the program's standard template is missing");
            }
            return new Template(STANDARD, file.readAllBytes());
        } catch (IOException damaged) {
            throw new UncheckedIOException(damaged);
        }
    }

    /**
     * A template from text.
     *
     * @param name its base name
     * @param bytes its bytes, UTF-8
     * @return the template
     */
    static Template of(String name, byte[] bytes) {
        return new Template(name, bytes.clone());
    }

    /**
     * What the template is known by.
     *
     * @return name, length and SHA-256
     */
    public FileIdentity identity() {
        return FileIdentity.of(name, bytes);
    }

    byte[] bytes() {
        return bytes.clone();
    }

    String name() {
        return name;
    }

    /** Fills the template in; the result is XHTML. */
    String filled(Map<String, Object> page) {
        StrictFactory factory = new StrictFactory();
        Mustache mustache = factory.compile(new StringReader(new String(bytes, StandardCharsets.UTF_8)), name);
        StringWriter out = new StringWriter();
        mustache.execute(out, page);
        return out.toString();
    }

    private static final class StrictFactory extends DefaultMustacheFactory {

        StrictFactory() {
            setObjectHandler(new MapsOnly());
        }

        /** Escapes for XML, and shows what XML can't hold as the replacement character. */
        @Override
        public void encode(String value, Writer writer) {
            super.encode(
                    value.codePoints()
                            .map(c -> printable(c) ? c : REPLACEMENT)
                            .collect(StringBuilder::new, StringBuilder::appendCodePoint, StringBuilder::append)
                            .toString(),
                    writer);
        }

        private static boolean printable(int c) {
            return (c >= 0x20 && c <= 0x7E)
                    || (c >= 0xA0 && c <= 0xD7FF)
                    || (c >= 0xE000 && c <= 0xFFFD)
                    || c >= 0x10000;
        }

        @Override
        public Reader getReader(String resource) {
            throw new MustacheException("a template may not draw in \"" + resource + "\"");
        }
    }

    /** Looks names up in maps, from the innermost outwards, and nowhere else. */
    private static final class MapsOnly extends ReflectionObjectHandler {

        @Override
        public Wrapper find(String name, List<Object> scopes) {
            return present -> lookUp(name, present);
        }

        private static Object lookUp(String name, List<Object> scopes) {
            if (name.equals(".")) {
                return scopes.get(scopes.size() - 1);
            }
            String[] steps = name.split("\\.", -1);
            for (int i = scopes.size() - 1; i >= 0; i--) {
                if (scopes.get(i) instanceof Map<?, ?> map && map.containsKey(steps[0])) {
                    return follow(map, steps, name);
                }
            }
            throw new MustacheException("unknown name \"" + name + "\"");
        }

        private static Object follow(Map<?, ?> start, String[] steps, String name) {
            Object value = start;
            for (String step : steps) {
                if (!(value instanceof Map<?, ?> map) || !map.containsKey(step)) {
                    throw new MustacheException("unknown name \"" + name + "\"");
                }
                value = map.get(step);
            }
            return value;
        }
    }
}
