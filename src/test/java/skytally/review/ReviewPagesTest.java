package skytally.review;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.UUID;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.context.SpringBootTest;
import org.springframework.boot.test.web.server.LocalServerPort;
import skytally.assessment.Assessment;
import skytally.assessment.Assessor;
import skytally.assessment.Circumstance;
import skytally.figures.Quantity;
import skytally.project.LuminaireType;
import skytally.project.Pages;
import skytally.project.Place;
import skytally.project.Project;
import skytally.project.Projects;
import skytally.project.Saving;
import skytally.project.SceneDrawing;
import skytally.project.Scheme;
import skytally.project.Values;

@DisplayName("The pages that show results place by place")
@SpringBootTest(webEnvironment = SpringBootTest.WebEnvironment.RANDOM_PORT)
class ReviewPagesTest {

    /** What a program's insides look like when they show. */
    private static final Pattern INSIDES =
            Pattern.compile("NaN|Infinity|∞|null|@[0-9a-f]{5,}|Optional|\\{\\d\\}|\\?\\?");

    private static final Pattern DOOR = Pattern.compile("class=\"app-door\" href=\"([^\"]*)#([^\"]+)\"");

    @LocalServerPort
    private int port;

    @Autowired
    private Projects projects;

    private Pages pages;

    @BeforeEach
    void anybody() {
        pages = new Pages(port);
    }

    private Pages.Page get(Project project, String path) throws Exception {
        return pages.get("/projects/" + project.id() + "/" + path);
    }

    static Stream<String> samples() {
        return Stream.of("ferrin-lane", "sillow-gateway", "ostrel-valley");
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("samples")
    void showEveryPlaceInEveryHourAndSchemeAndLeadOnlyToWorkingsThatAreThere(String name) throws Exception {
        Project project = Reviewed.sample(projects, name);
        List<String> views = new ArrayList<>();
        for (Place place : project.places()) {
            for (String hour : List.of("early", "late")) {
                views.add("seen/" + place.mark() + "?hour=" + hour);
                views.add("sky/" + place.mark() + "?hour=" + hour);
            }
        }
        for (Scheme scheme : project.schemes()) {
            views.add("seen?scheme=" + scheme.mark() + "&harm=surface");
            views.add("sky?scheme=" + scheme.mark() + "&air=hazy&units=us");
        }
        views.addAll(List.of("seen?harm=glare&units=us", "seen?harm=glow"));
        for (String view : views) {
            Pages.Page page = get(project, view);

            assertThat(page.status()).as(view).isEqualTo(200);
            assertThat(page.words()).as(view).doesNotContainPattern(INSIDES).contains("An aid to judgement");
            Set<String> ids = ids(page.body());
            Matcher door = DOOR.matcher(page.body());
            while (door.find()) {
                if (door.group(1).isEmpty()) {
                    assertThat(ids).as(view).contains(door.group(2));
                }
            }
        }
    }

    /** Every id of a page; none may stand twice. */
    private static Set<String> ids(String body) {
        Set<String> ids = new HashSet<>();
        Matcher id = Pattern.compile(" id=\"([^\"]*)\"").matcher(body);
        while (id.find()) {
            assertThat(ids.add(id.group(1))).as("id " + id.group(1)).isTrue();
            assertThat(id.group(1)).doesNotContain(" ");
        }
        return ids;
    }

    @Test
    void printTheNumbersOfTheAssessment() throws Exception {
        Project project = Reviewed.sample(projects, "ferrin-lane");
        Assessment found = new Assessor(Circumstance.EARLY_CLEAR)
                .assess(SceneDrawing.of(project, project.scheme("proposed").orElseThrow(), SceneDrawing.Period.EARLY)
                        .scene());
        String seen = get(project, "seen/VA8").words();

        for (String measure :
                List.of("direct/one-lamp-illuminance", "direct/illuminance", "direct/window-illuminance")) {
            assertThat(seen)
                    .contains(Quantity.lux(found.figure("VA8", measure).likely(), 2)
                            .number()
                            .digits());
        }
        assertThat(seen)
                .contains(Quantity.increase(
                                found.figure("VA8", "zenith/sky/increase").likely())
                        .number()
                        .digits())
                .contains("A1-", "Observatory", "before 22:00", "times Venus at its brightest");
        assertThat(get(project, "sky/VA8").words())
                .contains(Quantity.skyBrightness(
                                found.figure("VA8", "toward-site/sky/brightness")
                                        .likely(),
                                2)
                        .number()
                        .digits());
    }

    /** 49 m from floodlights the bright part is wider than 5 arcminutes, and a lamp outshines the full Moon. */
    @Test
    void compareNoStarWithALampThatIsNone() throws Exception {
        Project project = Reviewed.sample(projects, "ferrin-lane");

        assertThat(get(project, "seen/VA1").words())
                .contains("times the full Moon", "no star is compared, as noted below")
                .doesNotContain("times Venus");
        assertThat(get(project, "seen/VA8").words()).doesNotContain("no star is compared");
    }

    @Test
    void giveTheOtherHourAndLeadToItsWorking() throws Exception {
        Project project = Reviewed.sample(projects, "ferrin-lane");
        String body = get(project, "seen/VA8?units=us").body();
        Matcher late = Pattern.compile("href=\"([^\"]*hour=late[^\"#]*)#(w-VA8-direct-illuminance-late-clear)\"")
                .matcher(body);

        assertThat(late.find()).isTrue();
        Pages.Page there = pages.get(late.group(1).replace("&amp;", "&"));
        assertThat(there.words()).contains("after 22:00: 3 of 9 types are lit");
        assertThat(ids(there.body())).contains(late.group(2));
    }

    @Test
    void shareEveryHarmToAHundred() throws Exception {
        Project project = Reviewed.sample(projects, "ferrin-lane");
        for (String harm : List.of("direct", "surface", "glare", "glow")) {
            String body = get(project, "seen/VA8?harm=" + harm).body();
            Matcher row = Pattern.compile("(?s)<tr role=\"row\" aria-current=\"true\">(.*?)</tr>")
                    .matcher(body);
            assertThat(row.find()).isTrue();
            Matcher share = Pattern.compile("app-grid__number[^>]*>([0-9.]+)<").matcher(row.group(1));
            double sum = 0;
            while (share.find()) {
                sum += Double.parseDouble(share.group(1));
            }
            // nine whole or tenth percents, each rounded by at most half a percent
            assertThat(sum).as(harm).isCloseTo(100, within(1.5));
            assertThat(row.group(1)).contains("app-grid__cell--most");
        }
    }

    @Test
    void keepEverySwitchOnTheWayToAnotherPlace() throws Exception {
        Project project = Reviewed.sample(projects, "ostrel-valley");
        String body = get(project, "seen/VC1?hour=late&scheme=option-2&air=hazy&units=us")
                .body();

        assertThat(body)
                .contains("/seen/VC3?hour=late&amp;scheme=option-2&amp;air=hazy&amp;units=us\"")
                .contains("/sky/VC1?hour=late&amp;scheme=option-2&amp;air=hazy&amp;units=us\"")
                .contains("late, hazy air, no cloud, ground 0.18")
                .contains("The air is switched to hazy for this page");
    }

    @Test
    void giveWildlifeLightAndNoJudgement() throws Exception {
        Project project = Reviewed.sample(projects, "ostrel-valley");

        assertThat(get(project, "seen/VC6").words())
                .contains("What it does to animals is not judged", "lx at the eye")
                .doesNotContain("times Venus at its brightest.", "For scale", "laid over the sky already there");
    }

    @Test
    void workNothingOutForAPlaceNobodyCanFind() throws Exception {
        Project project = Reviewed.kept(
                projects, Reviewed.withUnplaced(Reviewed.read("ferrin-lane"), "VA9", "Somewhere <b>near</b>"));
        for (String room : List.of("seen", "sky")) {
            Pages.Page page = get(project, room + "/VA9");

            assertThat(page.status()).isEqualTo(200);
            assertThat(page.body())
                    .contains("Somewhere &lt;b&gt;near&lt;/b&gt;")
                    .doesNotContain("<b>near");
            assertThat(page.words())
                    .contains("Where this place lies is not known")
                    .doesNotContain("lx at the eye", "There is nothing to work out yet");
            assertThat(page.body()).contains("/places/VA9\"");
        }
    }

    @Test
    void sayWhatIsMissingWhereNothingIsThereYet() throws Exception {
        Project empty = projects.add(Project.named(UUID.randomUUID(), "Empty"), Saving.by("", ""))
                .project();
        Project dark = Reviewed.sample(projects, "ferrin-lane");
        for (String room : List.of("seen", "sky")) {
            assertThat(get(empty, room).words()).contains("No place yet", "Add a place");
            assertThat(get(dark, room + "/VA8?scheme=existing").words())
                    .contains("There is nothing to work out yet")
                    .doesNotContain("lx at the eye");
            assertThat(get(dark, room + "/NOWHERE").status()).isEqualTo(404);
        }
    }

    @Test
    void sayAtLeastWhereATypeIsLeftOut() throws Exception {
        Project sample = Reviewed.read("ferrin-lane");
        Scheme proposed = sample.scheme("proposed").orElseThrow();
        List<LuminaireType> types = new ArrayList<>(proposed.types());
        types.add(new LuminaireType("B12", new Values(Map.of("use", Reviewed.said("Unknown sign")))));
        Project project = Reviewed.kept(projects, sample.withScheme(proposed.with(types, proposed.placements())));

        assertThat(get(project, "seen/VA8").words())
                .contains("at least, without B12", "Without B12: neither lumens nor watts are known");
    }

    @Test
    void sayHowManyLightsHaveNoPosition() throws Exception {
        Project sample = Reviewed.read("ferrin-lane");
        Scheme proposed = sample.scheme("proposed").orElseThrow();
        Project project = Reviewed.kept(
                projects,
                sample.withScheme(proposed.with(
                        proposed.types(),
                        proposed.placements().stream()
                                .filter(light ->
                                        !List.of("A1-01", "A1-02", "A1-03").contains(light.mark()))
                                .toList())));

        assertThat(get(project, "seen/VA8").words()).contains("3 of the 24 lights of A1 have no position");
    }

    /** More than twelve types: eleven columns and one for the rest. */
    @Test
    void gatherTheSmallestOfManyTypes() throws Exception {
        Project sample = Reviewed.read("ferrin-lane");
        Scheme proposed = sample.scheme("proposed").orElseThrow();
        List<LuminaireType> types = new ArrayList<>(proposed.types());
        for (int i = 1; i <= 8; i++) {
            types.add(new LuminaireType("X" + i, proposed.types().get(3).values()));
        }
        Project project = Reviewed.kept(projects, sample.withScheme(proposed.with(types, proposed.placements())));
        String body = get(project, "seen/VA8").body();

        assertThat(body.split("app-grid__ref", -1)).hasSize(1 + 12);
        assertThat(body).contains(">others<", ">6 more types<");
    }

    @ParameterizedTest(name = "{0}")
    @ValueSource(strings = {"seen/VA8?hour=noon", "sky/VA8?air=thick&scheme=none", "seen?harm=all"})
    void passOverAWordThatIsNoChoice(String view) throws Exception {
        Project project = Reviewed.sample(projects, "ferrin-lane");

        assertThat(get(project, view).words()).contains("early, clear air, no cloud");
    }
}
