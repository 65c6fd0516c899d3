package skytally;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;

/**
 * Rows of a table in {@code src/test/resources/reference} with the columns id, quantity, inputs, expected, tolerance and
 * source. Several expected values, and their tolerances, are parted by semicolons. A tolerance is relative where it says
 * {@code rel} or {@code %}, else in the row's unit, and never tighter than half of the last digit of a rounded number.
 */
public final class Checks {

    /** A number with fewer digits is taken as exact, such as 100 or −2.5. */
    private static final int ROUNDED_FROM_DIGITS = 5;

    private static final Pattern NUMBER = Pattern.compile("[-+]?\\d+(\\.\\d+)?([eE][-+]?\\d+)?");

    /** One row. Its text is what a test report shows. */
    public record Row(
            String id, String quantity, String inputs, List<String> expected, List<String> tolerances, String source) {

        /** The number in the inputs that follows this name, as in {@code theta 5 deg} or {@code mu=22.0}. */
        public double input(String name) {
            Matcher found = Pattern.compile("(?<![A-Za-z])" + Pattern.quote(name) + "[ =]*(" + NUMBER.pattern() + ")")
                    .matcher(inputs);
            assertThat(found.find()).as("%s in the inputs of %s", name, id).isTrue();
            return Double.parseDouble(found.group(1));
        }

        public double expectedValue() {
            return Double.parseDouble(expected.get(0));
        }

        /** Each actual value beside the one expected in its place. */
        public void isMatchedBy(double... actual) {
            assertThat(actual).as("values of %s", id).hasSameSizeAs(expected);
            for (int i = 0; i < actual.length; i++) {
                double value = Double.parseDouble(expected.get(i));
                assertThat(actual[i])
                        .as("%s: %s, %s (%s)", id, quantity, inputs, source)
                        .isCloseTo(value, within(tolerance(i, value)));
            }
        }

        private double tolerance(int i, double value) {
            String text = tolerances.get(Math.min(i, tolerances.size() - 1));
            double widest = halfOfLastDigit(expected.get(i));
            for (String alternative : text.split(" or ")) {
                Matcher found = NUMBER.matcher(alternative);
                assertThat(found.find())
                        .as("a tolerance in \"%s\" of %s", text, id)
                        .isTrue();
                double size = Double.parseDouble(found.group());
                if (alternative.contains("%")) {
                    size *= Math.abs(value) / 100;
                } else if (alternative.contains("rel")) {
                    size *= Math.abs(value);
                }
                widest = Math.max(widest, size);
            }
            return widest;
        }

        private static double halfOfLastDigit(String printed) {
            BigDecimal value = new BigDecimal(printed.strip());
            return value.precision() < ROUNDED_FROM_DIGITS
                    ? 0
                    : 0.5 * value.ulp().doubleValue() * (1 + 1e-9);
        }

        @Override
        public String toString() {
            return id + ": " + quantity + ", " + inputs;
        }
    }

    private Checks() {}

    /** The rows of a table whose id begins with one of the given beginnings; it is a fault if there are none. */
    public static Stream<Row> of(String table, String... beginnings) {
        List<Row> rows = read(table).stream()
                .filter(row -> Stream.of(beginnings).anyMatch(row.id()::startsWith))
                .toList();
        assertThat(rows)
                .as("rows of %s that begin with %s", table, List.of(beginnings))
                .isNotEmpty();
        return rows.stream();
    }

    public static Row row(String table, String id) {
        return read(table).stream()
                .filter(row -> row.id().equals(id))
                .findFirst()
                .orElseThrow(() -> new AssertionError("No row " + id + " in " + table));
    }

    private static List<Row> read(String table) {
        List<Row> rows = new ArrayList<>();
        List<List<String>> lines = lines(table);
        for (List<String> cells : lines.subList(1, lines.size())) {
            rows.add(new Row(
                    cells.get(0),
                    cells.get(1),
                    cells.get(2),
                    List.of(cells.get(3).split(";")),
                    List.of(cells.get(4).split(";")),
                    cells.get(5)));
        }
        return rows;
    }

    /** All lines of a table but its comments, cut into cells, headings first. */
    public static List<List<String>> lines(String table) {
        try (BufferedReader file = new BufferedReader(new InputStreamReader(
                Objects.requireNonNull(Checks.class.getResourceAsStream("/reference/" + table), table),
                StandardCharsets.UTF_8))) {
            return file.lines()
                    .filter(line -> !line.startsWith("#") && !line.isBlank())
                    .map(Checks::cells)
                    .toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static List<String> cells(String line) {
        List<String> cells = new ArrayList<>();
        StringBuilder cell = new StringBuilder();
        boolean quoted = false;
        for (char c : line.toCharArray()) {
            if (c == '"') {
                quoted = !quoted;
            } else if (c == ',' && !quoted) {
                cells.add(cell.toString());
                cell.setLength(0);
            } else {
                cell.append(c);
            }
        }
        cells.add(cell.toString());
        return cells;
    }
}
