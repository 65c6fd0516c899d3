package skytally.project;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.UUID;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import skytally.scene.Known;
import skytally.scene.Lamp;
import skytally.scene.Property;
import skytally.scene.State;

@DisplayName("What the values of a type come to")
class TypeLightTest {

    private static Values values(String... namesValuesAndUnits) {
        Map<String, Stated> values = new TreeMap<>();
        for (int i = 0; i < namesValuesAndUnits.length; i += 2) {
            values.put(namesValuesAndUnits[i], given(namesValuesAndUnits[i + 1]));
        }
        return new Values(values);
    }

    private static Stated given(String value) {
        return Stated.of(Claim.given(value, "", Source.document("D1", "row A1"), Party.APPLICANT));
    }

    private static TypeLight.Amount lumens(String... values) {
        return TypeLight.of(values(values)).lumens().orElseThrow();
    }

    @Test
    void lumensStandAsTheyAreStated() {
        assertThat(lumens("lumens", "96 000").value()).isEqualTo(96_000);
        assertThat(lumens("lumens", "96 000").known()).isEqualTo(Known.given("D1, row A1"));
        assertThat(lumens("lumens", "96000", "watts", "750", "efficacy", "100").value())
                .isEqualTo(96_000);
        assertThat(lumens("lumens", "20200", "lightOutputRatio", "0.72").value())
                .as("lumens of the luminaire are past its ratio")
                .isEqualTo(20_200);
    }

    /** 28 000 lm of the lamp times 0.72 leave: 20 160 lm, as a data sheet works it. */
    @Test
    void lumensOfTheLampCountTimesTheLightOutputRatio() {
        TypeLight.Amount leaving =
                lumens("lumens", "28 000", "lumensBasis", "lamp-initial", "lightOutputRatio", "0.72");
        assertThat(leaving.value()).isCloseTo(20_160, within(1e-9));
        assertThat(leaving.known().state()).isEqualTo(State.WORKED_OUT);
        assertThat(leaving.known().from()).isEqualTo("the lamp's 28\u00a0000 lm times 0.72");

        TypeLight.Amount all = lumens("lumens", "28000", "lumensBasis", "lamp-initial");
        assertThat(all.value()).isEqualTo(28_000);
        assertThat(all.known().state()).isEqualTo(State.ASSUMED);
    }

    @Test
    void lumensWhenAgedAreAssumedForTheFirstNight() {
        TypeLight.Amount aged = lumens("lumens", "5000", "lumensBasis", "luminaire-maintained");
        assertThat(aged.value()).isEqualTo(5_000);
        assertThat(aged.known().state()).isEqualTo(State.ASSUMED);
        assertThat(aged.known().from()).contains("brighter");
    }

    @Test
    void wattsGiveLumensByAnEfficacyAndSaySo() {
        assertThat(lumens("watts", "150", "efficacy", "120").value()).isEqualTo(18_000);
        TypeLight.Amount usual = lumens("watts", "150");
        assertThat(usual.value()).isEqualTo(150 * 110);
        assertThat(usual.known()).isEqualTo(Known.assumed("150 W times 110 lm/W: low confidence"));
        assertThat(TypeLight.of(Values.NONE).lumens()).isEmpty();
    }

    @Test
    void aBeamIsFittedToTheStatedShareAndSaysHow() {
        TypeLight light = TypeLight.of(values("shape", "beam-60", "tilt", "64", "upwardShare", "4.0"));
        assertThat(light.upwardShare()).isCloseTo(0.04, within(1e-6));
        assertThat(light.shapeKnown().state()).isEqualTo(State.WORKED_OUT);
        assertThat(light.shapeKnown().from())
                .isEqualTo("D1, row A1; a beam of 35.96°, so that 4.0 % go above the level");
        assertThat(TypeLight.of(values("shapeWords", "floodlight", "tilt", "64", "upwardShare", "4"))
                        .shapeKnown()
                        .state())
                .as("a shape that is assumed is not made worked out by a width that is")
                .isEqualTo(State.ASSUMED);
    }

    @Test
    void twoClaimsThatCannotBothBeTrueAreToldAndTheBrighterCounts() {
        TypeLight light = TypeLight.of(values("shape", "all-round-capped", "upwardShare", "6.4"));
        assertThat(light.shape().differs()).isTrue();
        assertThat(light.upwardShare()).isCloseTo(0.064, within(1e-9));
        assertThat(light.shapeKnown().from())
                .isEqualTo("D1, row A1; it sends 0 % above the level and 6.4 % are stated: the brighter counts in"
                        + " each direction");
    }

    @Test
    void aShapeIsReadFromTheWordsOnlyWhereNobodySpokeOfIt() {
        Values words = values("shapeWords", "clear globe on post");
        assertThat(TypeLight.of(words).shape().shape().id()).isEqualTo("all-round");
        assertThat(TypeLight.of(words).shapeKnown().state()).isEqualTo(State.ASSUMED);
        assertThat(TypeLight.of(words).shapeKnown().from()).startsWith("“clear globe on post” taken as: bare globe");

        assertThat(TypeLight.of(words.with("shape", given("flat-area")))
                        .shape()
                        .shape()
                        .id())
                .isEqualTo("flat-area");
        Claim withdrawn = new Claim(
                "", "", State.NOT_KNOWN, "", "", Source.reason("we do not know"), Party.OURS, "2026-12-01", "");
        TypeLight open = TypeLight.of(words.with("shape", given("flat-road").claimed(withdrawn)));
        assertThat(open.shape().shape().id()).as("the stand-in").isEqualTo("flat-area");
        assertThat(open.shapeKnown().state()).isEqualTo(State.NOT_KNOWN);
        assertThat(TypeLight.of(values("shapeWords", "as agreed")).shapeKnown().state())
                .isEqualTo(State.NOT_KNOWN);
    }

    @Test
    void theShapeOfNewWordsIsAddedAndThatOfOldWordsReplacedButNobodysChoiceIs() {
        Values words = values("shapeWords", "louvred bollard");
        Values added = ShapeFromWords.added(Values.NONE, words, "2026-12-01");
        Claim claim = added.get("shape").inUse();
        assertThat(claim.value()).isEqualTo("all-round-capped");
        assertThat(claim.state()).isEqualTo(State.ASSUMED);
        assertThat(claim.party()).isEqualTo(Party.OURS);
        assertThat(claim.date()).isEqualTo("2026-12-01");
        assertThat(claim.source().reason()).startsWith("“louvred bollard” taken as: globe under a solid cap");

        assertThat(ShapeFromWords.added(added, added, "2026-12-02")).isEqualTo(added);
        Values other = ShapeFromWords.added(added, added.with("shapeWords", given("floodlight")), "2026-12-02");
        assertThat(other.get("shape").claims()).extracting(Claim::value).containsExactly("all-round-capped", "beam-60");
        assertThat(other.get("shape").inUse().value()).isEqualTo("beam-60");

        Values chosen = added.with(
                "shape", added.get("shape").claimed(given("flat-area").inUse()));
        Values reworded = chosen.with("shapeWords", given("floodlight"));
        assertThat(ShapeFromWords.added(chosen, reworded, "2026-12-02")).isEqualTo(reworded);
        Values unknown = values("shapeWords", "as agreed");
        assertThat(ShapeFromWords.added(Values.NONE, unknown, "2026-12-02")).isEqualTo(unknown);
    }

    @Test
    void aTiltedLightWithoutABearingFacesNorthAndIsNotKnown() {
        Values type = values("lumens", "5000", "shape", "beam-30", "tilt", "60");
        SceneDrawing.Drawn drawn = drawn(type, Values.NONE, values("bearing", "123"));
        assertThat(drawn.unaimed()).containsExactly("A1");
        assertThat(drawn.scene().known(Property.BEARING, "A1").state()).isEqualTo(State.NOT_KNOWN);
        assertThat(drawn.scene().known(Property.BEARING, "A1").from()).contains("true north");
        assertThat(drawn.scene().drawn(Map.of()).lamps())
                .extracting(lamp -> lamp.attitude().bearingDeg())
                .containsExactly(0.0, 123.0);

        SceneDrawing.Drawn aimed = drawn(type.with("bearing", given("45")), Values.NONE);
        assertThat(aimed.unaimed()).isEmpty();
        assertThat(aimed.scene().known(Property.BEARING, "A1")).isEqualTo(Known.given("D1, row A1"));
        assertThat(drawn(type.with("tilt", given("0")), Values.NONE).unaimed())
                .as("a round beam straight down needs none")
                .isEmpty();
        assertThat(drawn(values("lumens", "5000", "shape", "flat-road"), Values.NONE)
                        .unaimed())
                .containsExactly("A1");
        assertThat(drawn(type.with("tilt", given("0")), values("tilt", "20")).unaimed())
                .as("one that leans by itself needs one")
                .containsExactly("A1");
    }

    @Test
    void theLampOfTheSceneHasTheFittedLightAndTheLumensThatLeaveIt() {
        Values type = values(
                "lumens",
                "10000",
                "lumensBasis",
                "lamp-initial",
                "lightOutputRatio",
                "0.8",
                "shape",
                "beam-60",
                "tilt",
                "64",
                "upwardShare",
                "4",
                "luminousSize",
                "0.2");
        Lamp lamp = drawn(type, Values.NONE).scene().drawn(Map.of()).lamps().get(0);
        assertThat(lamp.flux().lumens()).isCloseTo(8_000, within(1e-9));
        assertThat(lamp.light()).isEqualTo(TypeLight.of(type).shape().light());
        assertThat(lamp.nearestM()).as("five times the stated size").isCloseTo(1, within(1e-12));
    }

    private static SceneDrawing.Drawn drawn(Values type, Values... lights) {
        List<Placement> placements = new java.util.ArrayList<>();
        for (int i = 0; i < lights.length; i++) {
            placements.add(new Placement("A1-0" + (i + 1), "A1", lights[i]));
        }
        Scheme scheme = new Scheme(
                "proposed", Scheme.Kind.PROPOSED, "Proposed", List.of(new LuminaireType("A1", type)), placements);
        Project project = new Project(UUID.randomUUID(), "Ground", List.of(), Values.NONE, List.of(scheme), List.of());
        return SceneDrawing.of(project, scheme, SceneDrawing.Period.EARLY);
    }
}
