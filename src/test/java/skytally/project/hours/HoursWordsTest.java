package skytally.project.hours;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

@DisplayName("The words that schedules use for hours")
class HoursWordsTest {

    private static final String TABLE = """
            dusk to 23:00, then 30 %                        | dusk 23:00 100%; 23:00 dawn 30%          | worked out
            dusk to 23:00, then 50 %                        | dusk 23:00 100%; 23:00 dawn 50%          | worked out
            dusk to 22:00 full, then 40 %                   | dusk 22:00 100%; 22:00 dawn 40%          | worked out
            dusk to dawn                                    | dusk dawn 100%                           | worked out
            dusk to dawn, full                              | dusk dawn 100%                           | worked out
            all night                                       | dusk dawn 100%                           | worked out
            dusk to 22:00                                   | dusk 22:00 100%                          | worked out
            dusk to 22:30                                   | dusk 22:30 100%                          | worked out
            dusk to 23:00                                   | dusk 23:00 100%                          | worked out
            dusk to midnight                                | dusk 24:00 100%                          | worked out
            manual switch, 16:00-22:00 Mon-Sat              | 16:00 22:00 100% Mon-Sat                 | worked out
            coin timer to 21:30                             | dusk 21:30 100%                          | worked out
            06:00-23:00                                     | 06:00 23:00 100%                         | worked out
            06:00-24:00                                     | 06:00 24:00 100%                         | worked out
            movement sensor, all night                      | dusk dawn sensed idle 0% active 100%     | assumed
            full only when a vehicle is present, else 25 %  | dusk dawn sensed idle 25% active 100%    | worked out
            all night in peak season                        | dusk dawn 100%                           | assumed
            match nights only                               | -                                        | -
            """;

    @ParameterizedTest(name = "{0} is {1}, {2}")
    @CsvSource(delimiter = '|', textBlock = TABLE)
    void areReadWhereTheyHaveOneReading(String words, String rows, String state) {
        if (rows.equals("-")) {
            assertThat(HoursWords.read(words)).isEmpty();
        } else {
            HoursWords.Read read = HoursWords.read(words).orElseThrow();
            assertThat(read.hours().written().replace("\n", "; ")).isEqualTo(rows);
            assertThat(read.assumed()).isEqualTo(state.equals("assumed"));
            assertThat(read.why()).contains(words);
        }
    }

    /** So that no hours of a sample go untried. */
    @Test
    void ofTheSamplesAreAllInTheTable() throws IOException {
        Set<String> tried =
                TABLE.lines().map(line -> line.split("\\|")[0].strip()).collect(Collectors.toCollection(TreeSet::new));
        Set<String> inSamples = new TreeSet<>();
        try (Stream<Path> tables = Files.list(Path.of("src/test/resources/samples"))) {
            for (Path table :
                    tables.filter(one -> one.toString().contains("_types")).toList()) {
                try (CSVParser rows = CSVParser.parse(
                        Files.readString(table),
                        CSVFormat.DEFAULT
                                .builder()
                                .setHeader()
                                .setSkipHeaderRecord(true)
                                .get())) {
                    rows.forEach(row -> inSamples.add(row.get("control")));
                }
            }
        }
        inSamples.remove("");
        assertThat(inSamples).hasSizeGreaterThan(15);
        assertThat(tried).containsAll(inSamples);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            dusk to 25:00
            ''
            until late
            dusk to 22:00 or 23:00
            dusk to 23:00, then 300 %
            22:00-22:00
            """)
    void areNotGuessedOtherwise(String words) {
        assertThat(HoursWords.read(words)).isEmpty();
    }
}
