package skytally.firstlook;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Collections;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;

/** The table of guesses, read once from {@code firstlook/guesses.csv}. */
final class Guesses {

    private static final Map<Blank, Guess> TABLE = read();

    private Guesses() {}

    static Guess of(Blank blank) {
        return Objects.requireNonNull(TABLE.get(blank), () -> "No guess for " + blank.field());
    }

    private static Map<Blank, Guess> read() {
        Map<Blank, Guess> table = new EnumMap<>(Blank.class);
        for (String line : lines()) {
            if (line.startsWith("#") || line.startsWith("field,") || line.isBlank()) {
                continue;
            }
            String[] cells = line.split(",", 5);
            Blank blank = Blank.byField(cells[0])
                    .orElseThrow(() -> new IllegalStateException("guesses.csv: no blank is called " + cells[0]));
            String why = cells[4].substring(1, cells[4].length() - 1);
            table.put(blank, new Guess(blank, cells[1], cells[2], cells[3], why));
        }
        return Collections.unmodifiableMap(table);
    }

    private static List<String> lines() {
        InputStream file = Objects.requireNonNull(Guesses.class.getResourceAsStream("/firstlook/guesses.csv"));
        try (BufferedReader reader = new BufferedReader(new InputStreamReader(file, StandardCharsets.UTF_8))) {
            return reader.lines().toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
