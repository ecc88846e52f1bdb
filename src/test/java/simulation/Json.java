package simulation;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import java.util.Map;

/** Writes maps, lists, texts and numbers; numbers with nine significant digits, what is not a number as null. */
final class Json {

    private final StringBuilder out = new StringBuilder();

    private Json() {}

    static String of(Map<String, ?> map) {
        Json json = new Json();
        json.write(map, 0);
        return json.out.append('\n').toString();
    }

    private void write(Object value, int depth) {
        if (value instanceof Map<?, ?> map) {
            writeMap(map, depth);
        } else if (value instanceof List<?> list) {
            writeList(list, depth);
        } else if (value instanceof Double number) {
            out.append(number(number));
        } else if (value instanceof Number || value instanceof Boolean) {
            out.append(value);
        } else {
            out.append(quoted(value.toString()));
        }
    }

    private void writeMap(Map<?, ?> map, int depth) {
        boolean flat = depth > 1 && map.values().stream().noneMatch(v -> v instanceof Map || v instanceof List);
        String separator = flat ? ", " : "\n" + "  ".repeat(depth + 1);
        out.append('{');
        boolean first = true;
        for (Map.Entry<?, ?> entry : map.entrySet()) {
            if (!first) {
                out.append(flat ? "" : ",");
            }
            out.append(first && flat ? "" : flat ? ", " : separator);
            out.append(quoted(entry.getKey().toString())).append(": ");
            write(entry.getValue(), depth + 1);
            first = false;
        }
        out.append(flat || map.isEmpty() ? "}" : "\n" + "  ".repeat(depth) + "}");
    }

    private void writeList(List<?> list, int depth) {
        out.append('[');
        boolean flat = list.stream().noneMatch(v -> v instanceof Map || v instanceof List);
        for (int i = 0; i < list.size(); i++) {
            if (i > 0) {
                out.append(flat ? ", " : ",");
            }
            if (!flat) {
                out.append('\n').append("  ".repeat(depth + 1));
            }
            write(list.get(i), depth + 1);
        }
        out.append(flat ? "]" : "\n" + "  ".repeat(depth) + "]");
    }

    private static String number(double value) {
        if (Double.isNaN(value) || Double.isInfinite(value)) {
            return "null";
        }
        if (Math.abs(value) < 1e-12) {
            return "0";
        }
        return new BigDecimal(value)
                .round(new MathContext(9))
                .stripTrailingZeros()
                .toPlainString();
    }

    private static String quoted(String text) {
        return '"' + text.replace("\\", "\\\\").replace("\"", "\\\"") + '"';
    }
}
