package skytally.luminaire;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Objects;
import java.util.Optional;

/**
 * What schedules call a fitting, and the plain shape it is taken for: read once from {@code luminaire/shape-words.csv}.
 * A row fits when each of its words begins some word of the fitting's name; the first row that fits counts.
 */
public final class ShapeWords {

    /** How surely the words mean the shape. */
    public enum Confidence {
        HIGH("high"),
        FAIR("fair"),
        LOW("low");

        private final String word;

        Confidence(String word) {
            this.word = word;
        }

        public String word() {
            return word;
        }
    }

    /**
     * One row of the table.
     *
     * @param words      that the fitting's name has, in any order
     * @param shape      it is taken for
     * @param confidence how surely
     * @param why        as printed
     */
    public record Row(List<String> words, Shape shape, Confidence confidence, String why) {

        private boolean fits(List<String> name) {
            return words.stream().allMatch(word -> name.stream().anyMatch(each -> each.startsWith(word)));
        }
    }

    private static final String HEADINGS = "words,shape,confidence,why";
    private static final List<Row> ROWS = read();

    private ShapeWords() {}

    /** The whole table, in the order in which it is searched. */
    public static List<Row> rows() {
        return ROWS;
    }

    /** The row that a fitting's name answers to, or nothing. */
    public static Optional<Row> find(String name) {
        List<String> words = words(name);
        return ROWS.stream().filter(row -> row.fits(words)).findFirst();
    }

    private static List<String> words(String name) {
        return Arrays.stream(name.toLowerCase(Locale.ROOT).split("[^\\p{L}\\p{N}]+"))
                .filter(word -> !word.isEmpty())
                .toList();
    }

    private static List<Row> read() {
        try (BufferedReader file = new BufferedReader(new InputStreamReader(
                Objects.requireNonNull(ShapeWords.class.getResourceAsStream("/luminaire/shape-words.csv")),
                StandardCharsets.UTF_8))) {
            return file.lines()
                    .filter(line -> !line.isBlank() && !line.startsWith("#") && !line.equals(HEADINGS))
                    .map(ShapeWords::row)
                    .toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static Row row(String line) {
        String[] cells = line.split(",", 4);
        if (cells.length < 4
                || !cells[3].matches("\"[^\"]+\"")
                || words(cells[0]).isEmpty()) {
            throw new IllegalStateException("shape-words.csv: a row is " + HEADINGS + ", not " + line);
        }
        return new Row(
                words(cells[0]),
                Shapes.byId(cells[1])
                        .orElseThrow(() -> new IllegalStateException("shape-words.csv: no shape " + cells[1])),
                Confidence.valueOf(cells[2].toUpperCase(Locale.ROOT)),
                cells[3].substring(1, cells[3].length() - 1));
    }
}
