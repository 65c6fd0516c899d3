package skytally.project.samples;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import skytally.luminaire.FittedShape;
import skytally.notation.NumberReader;
import skytally.project.Claim;
import skytally.project.Field;
import skytally.project.Fields;
import skytally.project.LuminaireType;
import skytally.project.Party;
import skytally.project.Project;
import skytally.project.SceneDrawing;
import skytally.project.Scheme;
import skytally.project.Stated;
import skytally.project.TypeLight;
import skytally.project.Units;
import skytally.project.Values;
import skytally.project.transfer.ProjectFile;
import skytally.scene.State;

@DisplayName("The sample projects")
class SampleProjectsTest {

    private static final Map<String, Project> SAMPLES = SampleProjects.all();

    static Stream<String> names() {
        return SAMPLES.keySet().stream();
    }

    private static Project sample(String name) {
        return SAMPLES.get(name);
    }

    @ParameterizedTest
    @MethodSource("names")
    void areKeptAsTheirTablesMakeThemAndOpenToTheSameBytes(String name) throws Exception {
        byte[] kept = Files.readAllBytes(SampleProjects.file(name));

        assertThat(new String(kept, "UTF-8")).isEqualTo(new String(ProjectFile.write(sample(name)), "UTF-8"));
        assertThat(ProjectFile.write(ProjectFile.read(kept))).isEqualTo(kept);
    }

    @ParameterizedTest
    @MethodSource("names")
    void sayNothingTheCatalogueDoesNotKnowOrBound(String name) {
        Project project = sample(name);
        check(Field.Subject.SITE, project.site());
        project.places().forEach(place -> check(Field.Subject.PLACE, place.values()));
        for (Scheme scheme : project.schemes()) {
            scheme.types().forEach(type -> check(Field.Subject.TYPE, type.values()));
            scheme.placements().forEach(light -> check(Field.Subject.LIGHT, light.values()));
        }
    }

    private static void check(Field.Subject subject, Values values) {
        values.byField().forEach((name, stated) -> {
            Field field = Fields.find(subject, name).orElseThrow(() -> new AssertionError(subject + " has no " + name));
            stated.claims().forEach(claim -> check(field, claim));
        });
    }

    private static void check(Field field, Claim claim) {
        if (claim.state() == State.NOT_KNOWN) {
            return;
        }
        assertThat(claim.source().isNone())
                .as("%s without a source", field.name())
                .isFalse();
        if (field.units().isEmpty()) {
            assertThat(claim.unit()).as(field.name()).isEmpty();
        } else {
            assertThat(field.units()).as(field.name()).contains(claim.unit());
        }
        if (field.kind() == Field.Kind.CHOICE) {
            assertThat(field.choices()).as(field.name()).contains(claim.value());
        } else if (field.kind().isNumber()) {
            NumberReader.Reading read = NumberReader.read(claim.value(), field.kind() == Field.Kind.WHOLE);
            assertThat(read).as("%s: %s", field.name(), claim.value()).isInstanceOf(NumberReader.Number.class);
            BigDecimal number = Units.inFirst(((NumberReader.Number) read).value(), claim.unit());
            assertThat(number).as(field.name()).isBetween(field.least(), field.most());
        }
    }

    @ParameterizedTest
    @MethodSource("names")
    void canBeDrawnInEverySchemeWithNothingLeftOutOrUnplaced(String name) {
        Project project = sample(name);
        for (Scheme scheme : project.schemes()) {
            SceneDrawing.Drawn drawn = SceneDrawing.of(project, scheme, SceneDrawing.Period.EARLY);
            assertThat(drawn.leftOut()).isEmpty();
            assertThat(drawn.unplaced()).isEmpty();
        }
    }

    /** The plans aim all but these, which lean and whose aim is not in the tables. */
    @Test
    void leaveSomeTiltedLightsWithoutABearing() {
        assertThat(unaimed("ferrin-lane", "proposed")).containsExactly("A8");
        assertThat(unaimed("ferrin-lane", "mended")).isEmpty();
        assertThat(unaimed("sillow-gateway", "proposed")).containsExactly("B11");
        assertThat(unaimed("ostrel-valley", "existing")).containsExactly("C2", "C6");
    }

    private static List<String> unaimed(String name, String mark) {
        return SceneDrawing.of(sample(name), scheme(name, mark), SceneDrawing.Period.EARLY)
                .unaimed();
    }

    /**
     * Every type sends up what its schedule states, or the disagreement is told: of these shapes none can. A beam straight
     * up cannot spill 5 %, a bare globe sends half up and not 52 %, a cap lets nothing out above it, and so on.
     */
    @Test
    void sendUpWhatIsStatedOrAreToldToDiffer() {
        Set<String> told = new TreeSet<>();
        for (Project project : SAMPLES.values()) {
            for (Scheme scheme : project.schemes()) {
                for (LuminaireType type : scheme.types()) {
                    TypeLight light = TypeLight.of(type.values());
                    double stated = Double.parseDouble(type.values().text("upwardShare")) / 100;
                    double off = light.upwardShare() - stated;
                    String name = scheme.mark() + " " + type.mark();
                    if (light.shape().differs()) {
                        told.add(name);
                        assertThat(Math.abs(light.shape().shapeShare() - stated))
                                .as(name)
                                .isGreaterThan(FittedShape.TOLERANCE);
                    } else if (light.shape().shape().hasWidth()) {
                        assertThat(off).as(name).isCloseTo(0, within(FittedShape.EXACT));
                    } else {
                        assertThat(off).as(name).isCloseTo(0, within(FittedShape.TOLERANCE));
                    }
                }
            }
        }
        assertThat(told)
                .containsExactly(
                        "existing C1",
                        "existing C2",
                        "existing C4",
                        "existing C6",
                        "mended A6",
                        "mended A8",
                        "mended B4",
                        "mended B8",
                        "proposed A4",
                        "proposed A6",
                        "proposed A8",
                        "proposed B11",
                        "proposed B4",
                        "proposed B8",
                        "proposed B9");
    }

    @Test
    void sayWhichWordsAShapeIsTakenFromAndNoShareThatTheToolWorksOut() {
        Claim shape = used(scheme("ferrin-lane", "proposed"), "A1", "shape");
        assertThat(shape.state()).isEqualTo(State.ASSUMED);
        assertThat(shape.source().reason()).startsWith("“round-beam floodlight, no visor” taken as: ");
        for (Project project : SAMPLES.values()) {
            assertThat(new String(ProjectFile.write(project), StandardCharsets.UTF_8))
                    .doesNotContain("as it hangs it sends");
        }
    }

    /** 68, 134 and 98 fittings of 9, 12 and 6 types; 1 675 900 lm in all at the shops: counted by hand in the tables. */
    @Test
    void addUp() {
        assertThat(scheme("ferrin-lane", "proposed").placements()).hasSize(68);
        assertThat(scheme("ferrin-lane", "proposed").types()).hasSize(9);
        assertThat(scheme("ferrin-lane", "mended").placements()).hasSize(66);
        assertThat(scheme("sillow-gateway", "proposed").placements()).hasSize(134);
        assertThat(scheme("sillow-gateway", "proposed").types()).hasSize(12);
        assertThat(scheme("ostrel-valley", "existing").placements()).hasSize(98);
        assertThat(sample("ostrel-valley").schemes())
                .extracting(Scheme::mark)
                .containsExactly("existing", "proposed", "option-2");
        assertThat(lumens("sillow-gateway", "proposed")).isEqualTo(1_675_900);
        assertThat(lumens("sillow-gateway", "mended")).isEqualTo(1_361_700);
        assertThat(lumens("ostrel-valley", "option-2")).isEqualTo(1_001_600);
    }

    @Test
    void keepTheUnknownsGuessesAndDisagreementsThatWerePlanted() {
        Scheme pitch = scheme("ferrin-lane", "proposed");
        assertThat(used(pitch, "A1", "lumens").state()).isEqualTo(State.GIVEN);
        assertThat(used(pitch, "A7", "lumens").state()).isEqualTo(State.ASSUMED);
        assertThat(used(pitch, "A7", "watts").state()).isEqualTo(State.GIVEN);
        assertThat(used(pitch, "A3", "tilt").state()).isEqualTo(State.ASSUMED);
        assertThat(used(pitch, "A8", "lumens").state()).isEqualTo(State.ASSUMED);
        assertThat(used(pitch, "A8", "count").source().document()).isEqualTo("D9");
        assertThat(used(pitch, "A9", "lumens").state()).isEqualTo(State.WORKED_OUT);
        assertThat(stated(pitch, "A6", "lateOutput").isDisputed()).isTrue();
        assertThat(stated(pitch, "A4", "lateOutput").isDisputed()).isFalse();
        assertThat(sample("ferrin-lane").site().get("groundReflectance").inUse().state())
                .isEqualTo(State.NOT_KNOWN);
        assertThat(sample("ferrin-lane").site().get("zone").claims())
                .extracting(Claim::party)
                .containsExactly(Party.OURS, Party.OBJECTOR);
        assertThat(sample("ferrin-lane").place("VA8").orElseThrow().horizon()).hasSize(9);

        Scheme shops = scheme("sillow-gateway", "proposed");
        assertThat(stated(shops, "B3", "shield").isDisputed()).isTrue();
        assertThat(used(shops, "B3", "shield").value()).isEqualTo("none stated");
        assertThat(used(shops, "B12", "cct").state()).isEqualTo(State.ASSUMED);
        assertThat(used(shops, "B10", "lumens").state()).isEqualTo(State.ASSUMED);

        Scheme road = scheme("ostrel-valley", "existing");
        assertThat(used(road, "C1", "lumens").state()).isEqualTo(State.WORKED_OUT);
        assertThat(stated(road, "C4", "count").isDisputed()).isTrue();
        assertThat(used(road, "C1", "fate").value()).isEqualTo("removed");
        assertThat(used(scheme("ostrel-valley", "option-2"), "C1", "spectralClass")
                        .state())
                .isEqualTo(State.ASSUMED);
        assertThat(used(scheme("ostrel-valley", "proposed"), "C6", "lumens").value())
                .isEqualTo("0");
    }

    private static Scheme scheme(String name, String mark) {
        return sample(name).scheme(mark).orElseThrow();
    }

    private static Stated stated(Scheme scheme, String type, String field) {
        return scheme.type(type).orElseThrow().values().get(field);
    }

    private static Claim used(Scheme scheme, String type, String field) {
        return stated(scheme, type, field).inUse();
    }

    private static long lumens(String name, String mark) {
        return scheme(name, mark).types().stream()
                .mapToLong(type -> Long.parseLong(type.values().text("lumens"))
                        * Long.parseLong(type.values().text("count")))
                .sum();
    }
}
