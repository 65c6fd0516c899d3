package skytally.web;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.Map;
import java.util.Objects;
import java.util.regex.Pattern;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Contrast by the Web Content Accessibility Guidelines 2.2 ("contrast ratio" and "relative luminance"), recomputed from
 * the style sheet: 4.5 to 1 for text (success criterion 1.4.3), 3 to 1 for strokes and marks that carry
 * meaning (1.4.11).
 */
@DisplayName("The colours of the themes")
class ThemesTest {

    private static final double TEXT = 4.5;
    private static final double MARK = 3.0;

    @ParameterizedTest(name = "{0}")
    @CsvSource({"day", "dark", "telescope"})
    void letTextAndMarksBeSeen(String theme) throws IOException {
        Map<String, Double> luminances = luminances(theme);

        for (String ground : new String[] {"paper", "field"}) {
            for (String text : new String[] {"ink", "ink-soft", "emphasis", "met", "not-met", "open"}) {
                contrast(luminances, text, ground, TEXT);
            }
            contrast(luminances, "line-strong", ground, MARK);
            contrast(luminances, "focus", ground, MARK);
        }
        contrast(luminances, "paper", "ink", TEXT);
        contrast(luminances, "emphasis", "emphasis-wash", TEXT);
        contrast(luminances, "pane-text", "pane", TEXT);
        contrast(luminances, "pane-line", "pane", MARK);
        contrast(luminances, "pane-point", "pane", MARK);
        contrast(luminances, "star", "plate-clear", MARK);
        contrast(luminances, "star", "plate-full", MARK);
    }

    private static void contrast(Map<String, Double> luminances, String one, String other, double least) {
        double first = Objects.requireNonNull(luminances.get(one), one);
        double second = Objects.requireNonNull(luminances.get(other), other);
        assertThat((Math.max(first, second) + 0.05) / (Math.min(first, second) + 0.05))
                .as("%s on %s", one, other)
                .isGreaterThanOrEqualTo(least);
    }

    /** The relative luminance of each role of a theme, 0 for black to 1 for white. */
    private static Map<String, Double> luminances(String theme) throws IOException {
        String block = Pattern.compile("\\[data-theme=\"" + theme + "\"] \\{([^}]*)}")
                .matcher(tokens())
                .results()
                .map(found -> found.group(1))
                .findFirst()
                .orElseThrow();
        Map<String, Double> luminances = new HashMap<>();
        Pattern.compile("--([a-z-]+): #([0-9a-f]{6});")
                .matcher(block)
                .results()
                .forEach(role -> luminances.put(role.group(1), luminance(Integer.parseInt(role.group(2), 16))));
        return luminances;
    }

    private static String tokens() throws IOException {
        try (InputStream css = Objects.requireNonNull(ThemesTest.class.getResourceAsStream("/static/css/tokens.css"))) {
            return new String(css.readAllBytes(), StandardCharsets.UTF_8);
        }
    }

    private static double luminance(int colour) {
        return 0.2126 * linear(colour >> 16 & 0xff)
                + 0.7152 * linear(colour >> 8 & 0xff)
                + 0.0722 * linear(colour & 0xff);
    }

    private static double linear(int eightBits) {
        double share = eightBits / 255.0;
        return share <= 0.04045 ? share / 12.92 : Math.pow((share + 0.055) / 1.055, 2.4);
    }
}
