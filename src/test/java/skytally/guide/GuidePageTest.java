package skytally.guide;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Objects;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.springframework.boot.test.context.SpringBootTest;
import org.springframework.boot.test.web.server.LocalServerPort;
import skytally.citation.Bibliography;
import skytally.firstlook.StandIns;
import skytally.luminaire.ShapeWords;
import skytally.luminaire.Shapes;
import skytally.project.Fields;
import skytally.project.Pages;
import skytally.spectrum.SpectralClasses;

/** Walks every table the guide lays open: each row must be on the page, as the table has it. */
@DisplayName("The guide")
@SpringBootTest(webEnvironment = SpringBootTest.WebEnvironment.RANDOM_PORT)
class GuidePageTest {

    @LocalServerPort
    private int port;

    private Pages.Page guide;
    private String words;

    @BeforeEach
    void open() throws Exception {
        guide = new Pages(port).get("/guide");
        words = guide.words()
                .replace("&quot;", "\"")
                .replace("&amp;", "&")
                .replace("&lt;", "<")
                .replace("&gt;", ">");
    }

    private void says(String... parts) {
        for (String part : parts) {
            assertThat(words).contains(part.replaceAll("[\\s\u00a0]+", " "));
        }
    }

    @Test
    void opensFromTheHeadOfEveryPage() throws Exception {
        assertThat(guide.status()).isEqualTo(200);
        assertThat(guide.body())
                .containsPattern("aria-current=\"page\"[^>]*>Guide<")
                .doesNotContain(" style=", "<script", "??", "th:");
        assertThat(guide.body().split("<h1", -1)).hasSize(2);
        assertThat(new Pages(port).get("/projects").body()).contains("href=\"/guide\"");
        says("An aid to judgement.");
    }

    @Test
    void hasEveryWordThatIsTakenForAShape() {
        assertThat(ShapeWords.rows())
                .isNotEmpty()
                .allSatisfy(row -> says(
                        String.join(" … ", row.words()),
                        row.shape().words(),
                        row.confidence().word(),
                        row.why()));
    }

    @Test
    void hasEveryShapeWithItsFormulaAndADrawing() {
        assertThat(Shapes.all()).allSatisfy(shape -> {
            says(shape.words(), "i(γ) = " + shape.distribution().formula());
            assertThat(guide.body()).contains("aria-labelledby=\"shape-" + shape.id() + "-title");
        });
        says("Hung at 90°, it sends 50.0 % of its light above the level.");
    }

    @Test
    void hasEverythingThatStandsIn() {
        assertThat(Fields.all().stream().filter(field -> field.standIn().isPresent()))
                .isNotEmpty()
                .allSatisfy(field ->
                        says(field.label(), field.standIn().orElseThrow().why()));
        assertThat(StandIns.all())
                .isNotEmpty()
                .allSatisfy(row -> says(row.label(), row.likely(), row.low(), row.high(), row.why()));
        says("Lumens per watt type 110 lm/W 70 lm/W 160 lm/W", "Lumens of each light 5 200 lm 3 500 lm 8 000 lm");
    }

    @Test
    void hasEveryLightSourceWithItsRatioAndOrigin() {
        assertThat(SpectralClasses.all()).allSatisfy(kind -> {
            String origin = SpectralClasses.origin(kind.id());
            assertThat(origin).as(kind.id()).isNotBlank().doesNotContain("power =");
            says(kind.label(), origin);
            assertThat(words)
                    .contains(String.format(
                            java.util.Locale.ROOT,
                            "%s %.2f",
                            kind.label(),
                            kind.spectrum().scotopicPhotopicRatio()));
        });
    }

    @Test
    void saysWhatIsNotAssessed() throws IOException {
        List<String> rows;
        try (InputStreamReader file = new InputStreamReader(
                Objects.requireNonNull(GuidePageTest.class.getResourceAsStream("/guide/not-assessed.csv")),
                StandardCharsets.UTF_8)) {
            rows = new java.io.BufferedReader(file)
                    .lines()
                    .filter(line -> line.startsWith("scope,") || line.startsWith("model,"))
                    .toList();
        }
        assertThat(rows).hasSizeGreaterThan(15).allSatisfy(row -> {
            String[] cells = row.split(",", 3);
            says(cells[1], cells[2].replace("\"", ""));
        });
        assertThat(Arrays.stream(NotAssessed.Kind.values())
                        .mapToInt(kind -> NotAssessed.all(kind).size())
                        .sum())
                .isEqualTo(rows.size());
    }

    @Test
    void namesEverySourceWithItsStanding() {
        assertThat(Bibliography.all())
                .isNotEmpty()
                .allSatisfy(source ->
                        says(source.reference() + " " + source.standing().words()));
    }
}
