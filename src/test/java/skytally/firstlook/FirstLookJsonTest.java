package skytally.firstlook;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Nested;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.boot.test.web.server.LocalServerPort;
import skytally.web.ServerTest;
import skytally.web.Wire;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** Every number here is worked out again by hand, from the formula, with nothing of the code under test. */
@ServerTest
@DisplayName("The first look as data")
class FirstLookJsonTest {

    private static final JsonMapper JSON = new JsonMapper();

    /** Illuminance of magnitude 0, lx (Allen, Astrophysical Quantities: 2.54e-6 lx). */
    private static final double E0 = 2.54e-6;

    /** Square arcseconds in a steradian. */
    private static final double ARCSEC2 = Math.pow(180 * 3600 / Math.PI, 2);

    /** Everything typed: a bare lamp, the eye level with it, two metres off. */
    private static final String BARE =
            "count=1&lumens=1500&spectralClass=led3000&shape=all-round&tiltDeg=0&mountingHeightM=1.6&eyeHeightM=1.6"
                    + "&distanceM=2&glareAngleDeg=10&air=clear&groundReflectance=0.12";

    @LocalServerPort
    private int port;

    @Nested
    @DisplayName("has the promised members")
    class Members {

        @Test
        void byNameAndKind() throws IOException {
            JsonNode look = look("");

            assertThat(look.propertyNames())
                    .containsExactlyInAnyOrder(
                            "direct", "glare", "sky", "eye", "guesses", "notes", "zeroPoint", "caution");
            assertNumbers(
                    look.get("direct"),
                    "distanceM",
                    "intensityCd",
                    "illuminanceLx",
                    "oneLampIlluminanceLx",
                    "equivalentMagnitude",
                    "equivalentStarMagnitudeOverhead",
                    "oneLampEquivalentMagnitude",
                    "oneLampEquivalentStarMagnitudeOverhead",
                    "windowIlluminanceLx");
            assertNumbers(
                    look.get("glare"),
                    "angleDeg",
                    "veilingLuminanceCdM2",
                    "veilMagArcsec2",
                    "naturalSkies",
                    "haloLuminanceCdM2");
            assertThat(look.get("sky").propertyNames())
                    .containsExactlyInAnyOrder("scatteringOrders", "zenith", "towardSite");
            assertThat(look.get("sky").get("scatteringOrders").asString()).isIn("first", "all");
            for (String direction : new String[] {"zenith", "towardSite"}) {
                assertNumbers(
                        look.get("sky").get(direction),
                        "artificialLuminanceCdM2",
                        "naturalLuminanceCdM2",
                        "totalMagArcsec2",
                        "increasePercent");
            }
            assertNumbers(look.get("eye"), "limitingMagnitudeNatural", "limitingMagnitudeWithLights");
            assertThat(look.get("zeroPoint").asString()).isEqualTo("TRADITIONAL");
            assertThat(look.get("caution").asString())
                    .isEqualTo("An aid to judgement. It does not replace a licensed lighting design, a site"
                            + " measurement or the local code; where they differ, they decide.");
            assertThat(look.get("notes").valueStream()).isNotEmpty().allMatch(JsonNode::isString);
        }

        private void assertNumbers(JsonNode part, String... names) {
            assertThat(part.propertyNames()).containsExactlyInAnyOrder(names);
            for (String name : names) {
                assertThat(part.get(name).isNumber()).as(name).isTrue();
            }
        }

        @Test
        void andGuessesThatAreTheBlanksLeftOut() throws IOException {
            JsonNode guesses = look("lumens=5200&air=hazy&shape=all-round").get("guesses");

            assertThat(guesses.valueStream().map(guess -> guess.get("field").asString()))
                    .containsExactly(
                            "count",
                            "spectralClass",
                            "tiltDeg",
                            "mountingHeightM",
                            "eyeHeightM",
                            "distanceM",
                            "glareAngleDeg",
                            "groundReflectance");
            assertThat(guesses.valueStream()).allSatisfy(guess -> {
                assertThat(guess.propertyNames())
                        .containsExactlyInAnyOrder("field", "value", "unit", "low", "high", "why");
                assertThat(guess.get("why").asString()).isNotBlank();
                if (guess.get("value").isNumber()) {
                    assertThat(guess.get("low").asDouble())
                            .isLessThanOrEqualTo(guess.get("value").asDouble());
                    assertThat(guess.get("value").asDouble())
                            .isLessThanOrEqualTo(guess.get("high").asDouble());
                } else {
                    assertThat(guess.get("field").asString()).isEqualTo("spectralClass");
                }
            });
            JsonNode ground = guesses.get(7);
            assertThat(ground.get("value").decimalValue()).isEqualByComparingTo("0.12");
            assertThat(ground.get("low").decimalValue()).isEqualByComparingTo("0.08");
            assertThat(ground.get("high").decimalValue()).isEqualByComparingTo("0.18");
            assertThat(guesses.get(3).get("unit").asString()).isEqualTo("m");
        }

        @Test
        void andNoGuessesWhenEverythingIsTyped() throws IOException {
            assertThat(look(BARE).get("guesses").isEmpty()).isTrue();
        }
    }

    @Nested
    @DisplayName("gives light straight from the lamps")
    class Direct {

        /** A source of Φ lumens all round has Φ/4π candela; E = I/d²: 29.8 lx at 2 m of 1500 lm (common practice). */
        @Test
        void byTheInverseSquareLaw() throws IOException {
            JsonNode direct = look(BARE).get("direct");

            assertThat(number(direct, "intensityCd")).isCloseTo(1500 / (4 * Math.PI), within(1e-9));
            assertThat(number(direct, "distanceM")).isCloseTo(2, within(1e-5));
            assertThat(number(direct, "illuminanceLx")).isCloseTo(29.8416, withinPercentage(0.1));
            assertThat(number(direct, "oneLampIlluminanceLx")).isEqualTo(number(direct, "illuminanceLx"));
        }

        @Test
        void alongTheSlopeFromLampToEye() throws IOException {
            JsonNode direct =
                    look(with(BARE, "mountingHeightM", "6", "distanceM", "10")).get("direct");
            double squared = 10 * 10 + 4.4 * 4.4;

            assertThat(number(direct, "distanceM")).isCloseTo(Math.sqrt(squared), within(1e-4));
            assertThat(number(direct, "illuminanceLx"))
                    .isCloseTo(1500 / (4 * Math.PI) / squared, withinPercentage(0.15));
            // on an upright plane the cosine of the light's height above it counts, and no air
            assertThat(number(direct, "windowIlluminanceLx"))
                    .isCloseTo(1500 / (4 * Math.PI) / squared * 10 / Math.sqrt(squared), withinPercentage(0.001));
        }

        /** A matt face has Φ/π · cos γ (Lambert); γ from its own axis, which the tilt turns toward the viewer. */
        @ParameterizedTest(name = "tilted {0}°, {1} m away")
        @CsvSource({"0, 20", "15, 100", "15, 800", "45, 20", "90, 100"})
        void byTheCosineOfAMattFaceAsItIsTilted(double tiltDeg, double distance) throws IOException {
            JsonNode direct = look(with(
                            BARE,
                            "lumens",
                            "5200",
                            "shape",
                            "diffuse-down",
                            "tiltDeg",
                            Double.toString(tiltDeg),
                            "mountingHeightM",
                            "6",
                            "distanceM",
                            Double.toString(distance)))
                    .get("direct");
            // over 800 m the ground falls by d²/2R = 0.04 m, with R 7/6 of 6371 km for mean refraction
            double fall = distance * distance / (2 * 6_371_000 * 7 / 6.0);
            double rise = 6 - 1.6 + fall;
            double along = Math.hypot(distance, rise);
            double tilt = Math.toRadians(tiltDeg);
            double cosine = (Math.sin(tilt) * distance + Math.cos(tilt) * rise) / along;

            assertThat(number(direct, "intensityCd")).isCloseTo(5200 / Math.PI * cosine, withinPercentage(0.01));
        }

        @Test
        void manyTimesForManyLampsAndOnceForOne() throws IOException {
            JsonNode one = look(BARE);
            JsonNode many = look(with(BARE, "count", "24"));

            for (String name :
                    List.of("intensityCd", "oneLampIlluminanceLx", "oneLampEquivalentMagnitude", "distanceM")) {
                assertThat(number(many.get("direct"), name)).isEqualTo(number(one.get("direct"), name));
            }
            for (String path : List.of(
                    "direct/illuminanceLx",
                    "direct/windowIlluminanceLx",
                    "glare/veilingLuminanceCdM2",
                    "glare/naturalSkies",
                    "glare/haloLuminanceCdM2",
                    "sky/zenith/artificialLuminanceCdM2",
                    "sky/zenith/increasePercent",
                    "sky/towardSite/artificialLuminanceCdM2")) {
                assertThat(at(many, path)).as(path).isCloseTo(24 * at(one, path), withinPercentage(1e-9));
            }
            // 2.5 log10 24 magnitudes brighter (Pogson)
            assertThat(at(one, "direct/equivalentMagnitude") - at(many, "direct/equivalentMagnitude"))
                    .isCloseTo(2.5 * Math.log10(24), within(1e-9));
        }

        /** m = −2.5 log10(E/E0) with E0 2.54e-6 lx (Pogson; Allen); the star overhead loses 0.20 mag to the air. */
        @ParameterizedTest(name = "at {0} m")
        @ValueSource(strings = {"1", "2", "800", "5000"})
        void asTheStarItEquals(String distance) throws IOException {
            JsonNode direct =
                    look(with(BARE, "count", "7", "distanceM", distance)).get("direct");

            double all = -2.5 * Math.log10(number(direct, "illuminanceLx") / E0);
            double one = -2.5 * Math.log10(number(direct, "oneLampIlluminanceLx") / E0);
            assertThat(number(direct, "equivalentMagnitude")).isCloseTo(all, within(1e-9));
            assertThat(number(direct, "equivalentStarMagnitudeOverhead")).isCloseTo(all - 0.20, within(1e-9));
            assertThat(number(direct, "oneLampEquivalentMagnitude")).isCloseTo(one, within(1e-9));
            assertThat(number(direct, "oneLampEquivalentStarMagnitudeOverhead")).isCloseTo(one - 0.20, within(1e-9));
        }

        /**
         * Clear air near the ground takes 0.0788 per km at 550 nm: molecules 0.0121 (Bodhaine 1999, 8 km) and haze
         * 0.0667 (depth 0.10 over 1.5 km); a white light's mean lies within 1.5 % of that. A window is counted without.
         */
        @Test
        void throughTheAirToAnEyeAndWithoutItToAWindow() throws IOException {
            JsonNode direct = look(with(BARE, "distanceM", "1000")).get("direct");
            double noAir = number(direct, "intensityCd") / Math.pow(number(direct, "distanceM"), 2);

            assertThat(number(direct, "illuminanceLx") / noAir).isCloseTo(Math.exp(-0.0788), withinPercentage(1.5));
            assertThat(number(direct, "windowIlluminanceLx")).isCloseTo(noAir, withinPercentage(1e-4));
        }

        @Test
        void weakerThroughHazierAirExceptOnAWindow() throws IOException {
            List<Double> seen = new ArrayList<>();
            List<Double> window = new ArrayList<>();
            for (String air : List.of("very-clear", "clear", "average", "hazy")) {
                JsonNode direct =
                        look(with(BARE, "distanceM", "3000", "air", air)).get("direct");
                seen.add(-number(direct, "illuminanceLx"));
                window.add(number(direct, "windowIlluminanceLx"));
            }
            assertThat(seen).isSorted().doesNotHaveDuplicates();
            assertThat(window).allMatch(window.get(0)::equals);
        }

        @Test
        void fainterTheFartherItIs() throws IOException {
            double before = Double.POSITIVE_INFINITY;
            for (int distance = 10; distance <= 20_480; distance *= 2) {
                JsonNode look =
                        look(with(BARE, "mountingHeightM", "30", "eyeHeightM", "6", "distanceM", "" + distance));
                double now = at(look, "direct/illuminanceLx");
                assertThat(now).as("at %d m", distance).isPositive().isLessThan(before);
                before = now;
            }
        }

        @Test
        void andNoneFromBelowTheHorizon() throws IOException {
            JsonNode look = look(with(BARE, "mountingHeightM", "6", "distanceM", "30000"));

            assertNoDirectLight(look);
            assertThat(number(look.get("direct"), "intensityCd")).isPositive();
            assertThat(look.get("notes").valueStream().map(JsonNode::asString))
                    .anySatisfy(note -> assertThat(note).contains("below the horizon"));
            assertThat(at(look, "sky/towardSite/artificialLuminanceCdM2")).isPositive();
        }

        @Test
        void andNoneFromAFaceThatLooksUpWhichLightsTheSkyTheMore() throws IOException {
            JsonNode up = look(with(BARE, "mountingHeightM", "6", "distanceM", "800", "shape", "diffuse-up"));
            JsonNode down = look(with(BARE, "mountingHeightM", "6", "distanceM", "800", "shape", "diffuse-down"));

            assertNoDirectLight(up);
            assertThat(number(up.get("direct"), "intensityCd")).isZero();
            for (String direction : List.of("zenith", "towardSite")) {
                String path = "sky/" + direction + "/artificialLuminanceCdM2";
                assertThat(at(up, path)).isGreaterThan(2 * at(down, path));
            }
        }

        @Test
        void andNoneOfNoLumens() throws IOException {
            JsonNode look = look(with(BARE, "lumens", "0"));

            assertNoDirectLight(look);
            for (String path : List.of(
                    "direct/intensityCd",
                    "glare/haloLuminanceCdM2",
                    "sky/zenith/artificialLuminanceCdM2",
                    "sky/zenith/increasePercent",
                    "sky/towardSite/artificialLuminanceCdM2",
                    "sky/towardSite/increasePercent")) {
                assertThat(at(look, path)).as(path).isZero();
            }
            assertThat(at(look, "sky/zenith/totalMagArcsec2")).isEqualTo(22.0);
            assertThat(at(look, "eye/limitingMagnitudeWithLights")).isEqualTo(at(look, "eye/limitingMagnitudeNatural"));
        }

        private void assertNoDirectLight(JsonNode look) {
            for (String path : List.of(
                    "direct/illuminanceLx",
                    "direct/oneLampIlluminanceLx",
                    "direct/windowIlluminanceLx",
                    "glare/veilingLuminanceCdM2",
                    "glare/naturalSkies")) {
                assertThat(at(look, path)).as(path).isZero();
            }
            for (String path : List.of(
                    "/direct/equivalentMagnitude",
                    "/direct/equivalentStarMagnitudeOverhead",
                    "/direct/oneLampEquivalentMagnitude",
                    "/direct/oneLampEquivalentStarMagnitudeOverhead",
                    "/glare/veilMagArcsec2")) {
                assertThat(look.at(path).isNull()).as(path).isTrue();
            }
        }
    }

    @Nested
    @DisplayName("gives the veil")
    class Veil {

        /**
         * CIE 146:2002, General form: f = 10/θ³ + (5/θ² + 0.1 p/θ) (1 + (A/62.5)⁴) + 0.0025 p, here for 35 years and
         * p = 0.5. It falls on the light as it faces the lamp.
         */
        @ParameterizedTest(name = "{0}° beside the lights")
        @CsvSource({"0.1", "1", "10", "30", "60"})
        void byTheGeneralFormula(double angle) throws IOException {
            JsonNode look =
                    look(with(BARE, "count", "24", "distanceM", "300", "glareAngleDeg", Double.toString(angle)));
            double age = 1 + Math.pow(35 / 62.5, 4);
            double perLux = 10 / Math.pow(angle, 3) + (5 / (angle * angle) + 0.1 * 0.5 / angle) * age + 0.0025 * 0.5;
            double veil = at(look, "direct/illuminanceLx") * perLux;
            // the luminance of 0 mag/arcsec² follows from E0 spread over one square arcsecond
            double zero = E0 * ARCSEC2;

            assertThat(at(look, "glare/angleDeg")).isEqualTo(angle);
            assertThat(at(look, "glare/veilingLuminanceCdM2")).isCloseTo(veil, withinPercentage(1e-6));
            assertThat(at(look, "glare/veilMagArcsec2")).isCloseTo(-2.5 * Math.log10(veil / zero), within(1e-7));
            assertThat(at(look, "glare/naturalSkies"))
                    .isCloseTo(veil / (zero * Math.pow(10, -0.4 * 22.0)), withinPercentage(1e-6));
        }
    }

    @Nested
    @DisplayName("gives the sky")
    class Sky {

        /** 22.0 mag/arcsec² overhead (Falchi 2016) is 187 µcd/m² by day vision in the natural sky's own spectrum. */
        @Test
        void naturalAsAFixedYardstick() throws IOException {
            assertThat(at(look(BARE), "sky/zenith/naturalLuminanceCdM2")).isCloseTo(187e-6, withinPercentage(1));
            assertThat(at(look(BARE), "sky/towardSite/naturalLuminanceCdM2"))
                    .isGreaterThan(at(look(BARE), "sky/zenith/naturalLuminanceCdM2"));
        }

        /** A sky brighter by r gains 2.5 log10(1 + r) magnitudes (Pogson). */
        @ParameterizedTest(name = "{0} lm, {1} m away")
        @CsvSource({"100, 800", "5200, 800", "1000000, 300", "10000000, 20000"})
        void inMagnitudesThatFitTheIncrease(String lumens, String distance) throws IOException {
            JsonNode natural = look(with(BARE, "lumens", "0", "distanceM", distance));
            JsonNode lit = look(with(BARE, "count", "24", "lumens", lumens, "distanceM", distance));

            assertThat(at(natural, "sky/zenith/totalMagArcsec2")).isEqualTo(22.0);
            for (String direction : List.of("zenith", "towardSite")) {
                double r = at(lit, "sky/" + direction + "/increasePercent") / 100;
                assertThat(r).isPositive();
                assertThat(at(natural, "sky/" + direction + "/totalMagArcsec2")
                                - at(lit, "sky/" + direction + "/totalMagArcsec2"))
                        .isCloseTo(2.5 * Math.log10(1 + r), within(1e-9));
            }
        }

        @Test
        void brighterAndPoorerInStarsForMoreLight() throws IOException {
            JsonNode some = look(with(BARE, "count", "100", "distanceM", "800"));
            JsonNode twice = look(with(BARE, "count", "100", "distanceM", "800", "lumens", "3000"));

            for (String path : List.of(
                    "direct/illuminanceLx",
                    "sky/zenith/artificialLuminanceCdM2",
                    "sky/towardSite/artificialLuminanceCdM2",
                    "sky/zenith/increasePercent")) {
                assertThat(at(twice, path)).as(path).isCloseTo(2 * at(some, path), withinPercentage(1e-9));
            }
            assertThat(at(some, "eye/limitingMagnitudeWithLights"))
                    .isLessThan(at(some, "eye/limitingMagnitudeNatural"))
                    .isGreaterThan(at(twice, "eye/limitingMagnitudeWithLights"));
        }

        @Test
        void brighterOverBrighterGround() throws IOException {
            double before = -1;
            for (String ground : List.of("0", "0.08", "0.12", "0.18", "0.5", "1")) {
                JsonNode look =
                        look(with(BARE, "shape", "diffuse-down", "distanceM", "800", "groundReflectance", ground));
                assertThat(at(look, "sky/zenith/artificialLuminanceCdM2")).isGreaterThan(before);
                before = at(look, "sky/zenith/artificialLuminanceCdM2");
            }
        }

        @Test
        void brighterTheMoreAFaceIsTiltedUp() throws IOException {
            double seen = 0;
            double sky = 0;
            for (String tilt : List.of("0", "5", "15", "30", "60", "90")) {
                JsonNode look = look(with(
                        BARE, "shape", "diffuse-down", "mountingHeightM", "6", "distanceM", "800", "tiltDeg", tilt));
                assertThat(at(look, "direct/illuminanceLx")).isGreaterThan(seen);
                assertThat(at(look, "sky/towardSite/artificialLuminanceCdM2")).isGreaterThan(sky);
                seen = at(look, "direct/illuminanceLx");
                sky = at(look, "sky/towardSite/artificialLuminanceCdM2");
            }
        }
    }

    @Nested
    @DisplayName("is asked for and refused in the usual ways")
    class Asking {

        @ParameterizedTest(name = "{0} gets {1}")
        @CsvSource({
            "application/json, application/json",
            "application/*, application/json",
            "'text/html;q=0.5, application/json', application/json",
            "*/*, text/html;charset=UTF-8",
            "'text/html,application/xhtml+xml,application/xml;q=0.9,*/*;q=0.8', text/html;charset=UTF-8"
        })
        void byWhatIsAccepted(String accepted, String given) throws IOException {
            Wire.Answer answer =
                    Wire.get(port, "/?count=2").header("Accept", accepted).send();

            assertThat(answer.status()).isEqualTo(200);
            assertThat(answer.header("Content-Type")).isEqualTo(given);
            assertThat(answer.header("Vary")).isEqualTo("Accept");
        }

        @Test
        void withEveryFaultAtOnce() throws IOException {
            Wire.Answer answer = ask("count=&lumens=-5&shape=%3Cb%3E&distanceM=1e308&air=clear&air=hazy");

            assertThat(answer.status()).isEqualTo(400);
            assertThat(answer.header("Content-Type")).isEqualTo("application/problem+json");
            assertThat(answer.header("Vary")).isEqualTo("Accept");
            JsonNode problem = JSON.readTree(answer.body());
            assertThat(problem.get("status").asInt()).isEqualTo(400);
            assertThat(problem.get("title").asString()).isNotBlank();
            assertThat(problem.get("errors")
                            .valueStream()
                            .map(error -> error.get("field").asString()))
                    .containsExactly("count", "lumens", "shape", "distanceM", "air");
            assertThat(problem.get("errors").valueStream()).allSatisfy(error -> {
                assertThat(error.propertyNames()).containsExactlyInAnyOrder("field", "message");
                assertThat(error.get("message").asString()).isNotBlank();
            });
            assertThat(problem.get("errors").get(1).get("message").asString())
                    .isEqualTo("Lumens of each light: “-5” is out of bounds. Enter a number from 0 to"
                            + " 10\u00a0000\u00a0000\u00a0lm, such as 5200.");
        }

        @Test
        void withoutHalfACharacterInWhatIsQuoted() throws IOException {
            Wire.Answer answer = ask("count=" + "x".repeat(39) + "%F0%9F%98%80%F0%9F%98%80");

            assertThat(answer.status()).isEqualTo(400);
            assertThat(answer.body()).doesNotContainPattern("(?i)\\\\ud83d(?!\\\\ude00)");
        }

        @ParameterizedTest(name = "?{0}")
        @ValueSource(
                strings = {
                    "units=us",
                    "units=furlongs",
                    "theme=dark",
                    "utm_source=x",
                    "distanceFt=3",
                    "tiltTo=15",
                    "form=sentence"
                })
        void andTheSameWhateverElseStandsInTheAddress(String other) throws IOException {
            JsonNode plain = look(BARE);
            JsonNode more = look(BARE + "&" + other);
            for (String member : List.of("direct", "glare", "sky", "eye", "guesses", "zeroPoint", "caution")) {
                assertThat(more.get(member)).as(member).isEqualTo(plain.get(member));
            }
            boolean known = other.equals("units=us") || other.equals("theme=dark");
            assertThat(more.get("notes").size() - plain.get("notes").size()).isEqualTo(known ? 0 : 1);
        }

        @Test
        void andTheSameWhereverTheComputerStands() throws IOException {
            Locale before = Locale.getDefault();
            try {
                Locale.setDefault(Locale.GERMANY);
                String german = ask("distanceM=987.5&count=1200").body();
                Locale.setDefault(Locale.ROOT);
                assertThat(ask("distanceM=987.5&count=1200").body()).isEqualTo(german);
                assertThat(german).contains("\"distanceM\":987.5").contains("\"value\":0.12");
            } finally {
                Locale.setDefault(before);
            }
        }

        @Test
        void andNeverANumberThatIsNone() throws IOException {
            for (String query : List.of("", "lumens=0", "shape=diffuse-up", "distanceM=200000", "distanceM=1")) {
                assertThat(ask(query).body()).doesNotContain("NaN", "Infinity");
            }
        }
    }

    private Wire.Answer ask(String query) throws IOException {
        return Wire.get(port, "/?" + query).header("Accept", "application/json").send();
    }

    private JsonNode look(String query) throws IOException {
        Wire.Answer answer = ask(query);
        assertThat(answer.status()).as(query).isEqualTo(200);
        return JSON.readTree(answer.body());
    }

    /** The same query with other values, given as names and values in turn. */
    private static String with(String query, String... namesAndValues) {
        Map<String, String> values = new TreeMap<>();
        for (String pair : query.split("&", -1)) {
            values.put(pair.substring(0, pair.indexOf('=')), pair.substring(pair.indexOf('=') + 1));
        }
        for (int i = 0; i < namesAndValues.length; i += 2) {
            values.put(namesAndValues[i], namesAndValues[i + 1]);
        }
        List<String> pairs = new ArrayList<>();
        values.forEach((name, value) -> pairs.add(name + "=" + value));
        return String.join("&", pairs);
    }

    private static double number(JsonNode part, String name) {
        JsonNode found = part.get(name);
        assertThat(found.isNumber()).as(name).isTrue();
        return found.asDouble();
    }

    private static double at(JsonNode look, String path) {
        JsonNode found = look.at("/" + path);
        assertThat(found.isNumber()).as(path).isTrue();
        return found.asDouble();
    }
}
