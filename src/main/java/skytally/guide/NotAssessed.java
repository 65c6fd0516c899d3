package skytally.guide;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import java.util.Objects;

/**
 * Something the tool does not answer, or that its reckoning leaves out: read once from {@code guide/not-assessed.csv}.
 *
 * @param kind    which of the two
 * @param subject in a few words
 * @param what    in a sentence
 */
record NotAssessed(Kind kind, String subject, String what) {

    /** Whether it is outside what is asked, or inside and simplified. */
    enum Kind {
        SCOPE,
        MODEL
    }

    private static final String HEADINGS = "kind,subject,what";
    private static final List<NotAssessed> ALL = read();

    static List<NotAssessed> all(Kind kind) {
        return ALL.stream().filter(one -> one.kind == kind).toList();
    }

    private static List<NotAssessed> read() {
        try (BufferedReader file = new BufferedReader(new InputStreamReader(
                Objects.requireNonNull(NotAssessed.class.getResourceAsStream("/guide/not-assessed.csv")),
                StandardCharsets.UTF_8))) {
            return file.lines()
                    .filter(line -> !line.isBlank() && !line.startsWith("#") && !line.equals(HEADINGS))
                    .map(NotAssessed::row)
                    .toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static NotAssessed row(String line) {
        String[] cells = line.split(",", 3);
        if (cells.length < 3 || !cells[2].matches("\"[^\"]+\"")) {
            throw new IllegalStateException("not-assessed.csv: a row is " + HEADINGS + ", not " + line);
        }
        return new NotAssessed(
                Kind.valueOf(cells[0].toUpperCase(Locale.ROOT)),
                cells[1],
                cells[2].substring(1, cells[2].length() - 1));
    }
}
