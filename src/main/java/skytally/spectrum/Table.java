package skytally.spectrum;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/** A text table among our resources: comment lines begin with {@code #}, blank lines do not count. */
record Table(String name, List<Row> rows, List<String> remarks) {

    /** One line, and where it stands, counted from 1 as an editor does. */
    record Row(String table, int line, String text) {

        List<String> cells() {
            return List.of(text.split(",", -1));
        }

        IllegalStateException fault(String what) {
            return new IllegalStateException(table + ", line " + line + ": " + what);
        }

        IllegalStateException fault(IllegalArgumentException refusal) {
            return new IllegalStateException(table + ", line " + line + ": " + refusal.getMessage(), refusal);
        }

        double number(String cell) {
            try {
                return Double.parseDouble(cell);
            } catch (NumberFormatException e) {
                throw fault("\"" + cell + "\" is not a number");
            }
        }
    }

    static Table read(String name) {
        InputStream resource = Table.class.getResourceAsStream(name);
        if (resource == null) {
            throw new IllegalStateException(name + " is missing");
        }
        List<Row> rows = new ArrayList<>();
        List<String> remarks = new ArrayList<>();
        try (BufferedReader lines = new BufferedReader(new InputStreamReader(resource, StandardCharsets.UTF_8))) {
            int number = 0;
            for (String line = lines.readLine(); line != null; line = lines.readLine()) {
                number++;
                if (line.startsWith("#")) {
                    remarks.add(line.substring(1).strip());
                } else if (!line.isBlank()) {
                    rows.add(new Row(name, number, line.strip()));
                }
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return new Table(name, List.copyOf(rows), List.copyOf(remarks));
    }

    /** The column headings: the first row that counts. */
    List<String> headings() {
        return rows.get(0).cells();
    }

    List<Row> body() {
        return rows.subList(1, rows.size());
    }
}
