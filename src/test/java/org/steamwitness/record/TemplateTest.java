package org.steamwitness.record;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import com.github.mustachejava.MustacheException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class TemplateTest {

    private static final Map<String, Object> PAGE =
            Map.of("run", Map.of("name", "R<2>"), "rows", List.of("a", "b"), "none", List.of());

    @Test
    void fillsInMapsListsAndStringsAndEscapesThem() {
        assertThat(filled("{{run.name}}:{{#rows}}{{.}};{{/rows}}{{^none}}empty{{/none}}"))
                .isEqualTo("R&lt;2&gt;:a;b;empty");
    }

    /** No name reaches a method, a class, a file or another template. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "{{run.nam}}",
                "{{nothing}}",
                "{{run.name.length}}",
                "{{run.class}}",
                "{{class.name}}",
                "{{rows.size}}",
                "{{#rows}}{{toString}}{{/rows}}",
                "{{> other.xhtml}}",
                "{{> /etc/passwd}}",
                "{{> ../record.css}}",
                "{{#run}}open"
            })
    void refusesWhatThePageDoesNotHave(String template) {
        assertThatThrownBy(() -> filled(template)).isInstanceOf(MustacheException.class);
    }

    private static String filled(String template) {
        return Template.of("test.xhtml", template.getBytes(StandardCharsets.UTF_8))
                .filled(PAGE);
    }
}
