package skytally.skyglow;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.stream.Stream;

/** The rows of a reference table by the names of its columns; lines that begin with # tell where it is from. */
final class ReferenceRows {

    private ReferenceRows() {}

    /** One row. */
    record Row(Map<String, String> cells) {

        String text(String column) {
            return Objects.requireNonNull(cells.get(column), column);
        }

        double number(String column) {
            return Double.parseDouble(text(column));
        }
    }

    static Stream<Row> of(String resource) {
        try (InputStream in = Objects.requireNonNull(ReferenceRows.class.getResourceAsStream(resource), resource)) {
            List<String> lines = new String(in.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .filter(line -> !line.startsWith("#"))
                    .toList();
            List<String> names = List.of(lines.get(0).split(",", -1));
            return lines.stream().skip(1).map(line -> row(names, line.split(",", -1)));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static Row row(List<String> names, String[] cells) {
        if (cells.length != names.size()) {
            throw new IllegalStateException(cells.length + " cells under " + names.size() + " names");
        }
        Map<String, String> row = new HashMap<>();
        for (int i = 0; i < cells.length; i++) {
            row.put(names.get(i), cells[i]);
        }
        return new Row(row);
    }
}
