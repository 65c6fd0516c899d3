package skytally.project.samples;

import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Objects;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;

/** The tables the samples are made from. */
final class Table {

    private static final CSVFormat FORM =
            CSVFormat.DEFAULT.builder().setHeader().setSkipHeaderRecord(true).get();

    private Table() {}

    static List<CSVRecord> read(String name) {
        String file = "/samples/" + name + ".csv";
        try (InputStreamReader reader = new InputStreamReader(
                        Objects.requireNonNull(Table.class.getResourceAsStream(file), file), StandardCharsets.UTF_8);
                var rows = FORM.parse(reader)) {
            return rows.getRecords();
        } catch (IOException cannot) {
            throw new UncheckedIOException(cannot);
        }
    }
}
