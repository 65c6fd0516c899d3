package skytally.citation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Walks every source, and everything that cites one. */
@DisplayName("Bibliography")
class BibliographyTest {

    private static final Path MAIN = Path.of("src/main");
    private static final Pattern CITED = Pattern.compile("cite\\(([^()]*)\\)");
    private static final Pattern LITERAL = Pattern.compile("\"([a-z0-9-]+)\"");

    /** Behind values and forms that no working prints yet; one leaves this list when a number first rests on it. */
    private static final Set<String> WAITING = Set.of(
            "cie-112", "cie-km", "footcandle", "observer-age-range", "planck-law", "spectral-models", "visual-range");

    @ParameterizedTest
    @MethodSource("skytally.citation.Bibliography#all")
    void aSourceCanBeCitedAndSaysHowWellItStands(Citation citation) {
        assertThat(citation.key()).matches("[a-z0-9-]+");
        assertThat(citation.reference()).hasSizeGreaterThan(10);
        assertThat(citation.standing().words()).isNotBlank();
        assertThat(Bibliography.cite(citation.key())).isEqualTo(citation);
    }

    @Test
    void refusesANumberWithoutASource() {
        assertThatThrownBy(() -> Bibliography.cite("hearsay")).hasMessageContaining("hearsay");
    }

    @Test
    void everyLineIsReadAndNoKeyStandsTwice() throws IOException {
        List<String> keys = Files.readAllLines(MAIN.resolve("resources/bibliography.properties")).stream()
                .filter(line -> !line.isBlank() && !line.startsWith("#"))
                .map(line -> line.substring(0, line.indexOf('=')).strip())
                .toList();
        assertThat(keys)
                .doesNotHaveDuplicates()
                .containsExactlyInAnyOrderElementsOf(
                        Bibliography.all().stream().map(Citation::key).toList());
    }

    @Test
    void everySourceCitedInTheCodeExists() {
        Set<String> cited = new TreeSet<>();
        for (String text : sources("java/skytally", ".java")) {
            Matcher call = CITED.matcher(text);
            while (call.find()) {
                Matcher key = LITERAL.matcher(call.group(1));
                while (key.find()) {
                    cited.add(key.group(1));
                }
            }
        }
        assertThat(cited).hasSizeGreaterThan(20).isSubsetOf(keys());
    }

    /** Used is what stands as a text of its own in the code, or as a cell or the end of a line in a table. */
    @Test
    void noSourceLiesAboutUnused() {
        String code = String.join("\n", sources("java/skytally", ".java"));
        String tables = String.join("\n", sources("resources", ".csv"));
        Set<String> unused = new TreeSet<>();
        for (String key : keys()) {
            boolean inTable = Pattern.compile("[,#] ?" + Pattern.quote(key) + "(?![a-z0-9-])")
                    .matcher(tables)
                    .find();
            if (!code.contains("\"" + key + "\"") && !inTable) {
                unused.add(key);
            }
        }
        assertThat(unused).isEqualTo(new TreeSet<>(WAITING));
    }

    private static Set<String> keys() {
        return Bibliography.all().stream().map(Citation::key).collect(Collectors.toSet());
    }

    private static List<String> sources(String folder, String ending) {
        try (Stream<Path> files = Files.walk(MAIN.resolve(folder))) {
            return files.filter(file -> file.toString().endsWith(ending))
                    .map(BibliographyTest::text)
                    .toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static String text(Path file) {
        try {
            return Files.readString(file);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
