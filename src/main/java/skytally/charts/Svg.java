package skytally.charts;

import java.math.BigDecimal;
import java.math.RoundingMode;

/** Writes SVG element by element. Text and attribute values are escaped here, so nothing else need think of it. */
final class Svg {

    private final StringBuilder markup = new StringBuilder();

    /** Opens an element; attributes are names and values by turns. */
    Svg open(String element, Object... attributes) {
        return start(element, attributes).raw(">");
    }

    Svg close(String element) {
        markup.append("</").append(element).append('>');
        return this;
    }

    /** An element with nothing inside. */
    Svg add(String element, Object... attributes) {
        return start(element, attributes).raw("/>");
    }

    /** An element with text inside. */
    Svg text(String element, String text, Object... attributes) {
        return open(element, attributes).words(text).close(element);
    }

    Svg words(String text) {
        markup.append(escaped(text));
        return this;
    }

    private Svg start(String element, Object... attributes) {
        markup.append('<').append(element);
        for (int i = 0; i < attributes.length; i += 2) {
            markup.append(' ')
                    .append(attributes[i])
                    .append("=\"")
                    .append(value(attributes[i + 1]))
                    .append('"');
        }
        return this;
    }

    private Svg raw(String text) {
        markup.append(text);
        return this;
    }

    private static String value(Object value) {
        return value instanceof Double number ? length(number) : escaped(value.toString());
    }

    /** A length to a tenth of a unit, without a locale and without trailing noughts. */
    static String length(double value) {
        BigDecimal rounded =
                BigDecimal.valueOf(value).setScale(1, RoundingMode.HALF_UP).stripTrailingZeros();
        return rounded.signum() == 0 ? "0" : rounded.toPlainString();
    }

    /** The same to a hundredth, for what is measured by its area. */
    static String fine(double value) {
        return BigDecimal.valueOf(value)
                .setScale(2, RoundingMode.HALF_UP)
                .stripTrailingZeros()
                .toPlainString();
    }

    private static String escaped(String text) {
        return text.replace("&", "&amp;")
                .replace("<", "&lt;")
                .replace(">", "&gt;")
                .replace("\"", "&quot;")
                .replace("'", "&#39;");
    }

    @Override
    public String toString() {
        return markup.toString();
    }
}
