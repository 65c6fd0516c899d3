package skytally.assessment;

import java.util.ArrayList;
import java.util.List;
import skytally.glare.VeilReach;
import skytally.glare.VeilingLuminance;
import skytally.photometry.Illuminance;
import skytally.scene.OpenScene;
import skytally.scene.Property;
import skytally.spectrum.SpectralClasses;

/** How the veil in the eye beside the lights was worked out. */
final class GlareWorkings extends Shown {

    GlareWorkings(PlaceNumbers numbers, OpenScene open) {
        super(numbers, open);
    }

    Working glareAngle(int look) {
        return new Working(
                "cos θ = v · u",
                "θ = " + result(Measure.GLARE_ANGLE, look),
                List.of(input(
                        "Angle beside the lights", "θ", result(Measure.GLARE_ANGLE, look), Property.LOOK_ANGLE, place)),
                cite("cie-146"),
                List.of("Level beside the lights, as seen from the eye."));
    }

    Working veil(int look) {
        return isOnePoint() ? veilOfOnePoint(look) : veilOfMany(look);
    }

    private Working veilOfOnePoint(int look) {
        double angle = numbers.get(Measure.GLARE_ANGLE, look);
        double perLux = numbers.get(Measure.VEIL, look) / Math.max(numbers.get(Measure.ILLUMINANCE), Double.MIN_NORMAL);
        return new Working(
                "L_v = E · f(θ),   f(θ) = 10/θ³ + (5/θ² + 0.1 p/θ) [1 + (A/62.5)⁴] + 0.0025 p",
                "L_v = " + result(Measure.ILLUMINANCE) + " × " + written(perLux, " cd/m² per lx") + " = "
                        + result(Measure.VEIL, look),
                List.of(
                        worked(
                                "Light at the eye, facing the lamps",
                                "E",
                                result(Measure.ILLUMINANCE),
                                "its own working"),
                        input("Angle beside the lights", "θ", written(angle, "°"), Property.LOOK_ANGLE, place),
                        constant("Age of the observer", "A", "35 years"),
                        constant("Pigment of the eye", "p", "0.5 (brown)")),
                List.of(PlaceNumbers.VEIL.citation()),
                veilNotes());
    }

    private Working veilOfMany(int look) {
        List<Working.Input> inputs = new ArrayList<>(byType("L_v", " cd/m²", Contribution::veilCdM2));
        inputs.add(worked(
                "Angle beside the brightest lamp",
                "θ₁",
                result(Measure.GLARE_ANGLE, look),
                "level, on the side of it where the veil is the weaker"));
        inputs.add(constant("Age of the observer", "A", "35 years"));
        inputs.add(constant("Pigment of the eye", "p", "0.5 (brown)"));
        return new Working(
                "L_v = Σ E · f(θ),   f(θ) = 10/θ³ + (5/θ² + 0.1 p/θ) [1 + (A/62.5)⁴] + 0.0025 p",
                "L_v = " + result(Measure.VEIL, look) + " over "
                        + numbers.scene().lamps().size() + " positions, each with its own angle θ",
                inputs,
                List.of(PlaceNumbers.VEIL.citation()),
                veilNotes());
    }

    private static List<String> veilNotes() {
        return List.of(
                "CIE General form, 0.1 to 100 degrees, printed to " + (int) VeilingLuminance.WIDEST_PRINTED_DEG
                        + ". Forms differ by 10 to 40 %; at 70 years the veil is about twice as strong.",
                "It is inside the eye: a hand that shades the lamp removes it, and it is no part of the sky.",
                "An estimate for what is looked at directly. A lamp in view also lowers the eye's sensitivity for"
                        + " minutes, which is not in it. Nothing is said of telescopes.");
    }

    Working roadVeil(int look) {
        return new Working(
                "L_v = Σ 10 E cos θ / θ²   for 1.5° ≤ θ ≤ 60°",
                "L_v = " + result(Measure.ROAD_VEIL, look) + " over "
                        + numbers.scene().lamps().size() + (isOnePoint() ? " position" : " positions"),
                List.of(worked(
                        "Direction looked in", "θ", "1° below the level, along the road", "the direction of travel")),
                List.of(PlaceNumbers.ROAD_VEIL.citation()),
                List.of(
                        "Initial output, nothing taken by the air, no roof of a car in the way: as limits for areas count it.",
                        "Lamps nearer to the line of sight than 1.5° or farther than 60° are outside the formula and add nothing."));
    }

    Working thresholdIncrement(int look) {
        double adapted = numbers.observer().roadLuminanceCdM2().orElse(Double.NaN);
        return new Working(
                adapted > 5 ? "TI = 95 L_v / L^1.05" : "TI = 65 L_v / L^0.8",
                Double.isNaN(adapted)
                        ? "none: what the eye is adapted to is not known"
                        : "TI = " + result(Measure.THRESHOLD_INCREMENT, look),
                List.of(
                        worked("Veil in a driver's eye", "L_v", result(Measure.ROAD_VEIL, look), "its own working"),
                        worked(
                                "What the eye is adapted to",
                                "L",
                                Double.isNaN(adapted) ? "none" : written(adapted, " cd/m²"),
                                "the road's class or luminance")),
                cite("threshold-increment"),
                List.of("From the place and in the direction entered, and from no other point of the road."));
    }

    Working veilBrightness(int look) {
        return new Working(
                "μ = −2.5 log₁₀(L_v / L₀)",
                "μ = −2.5 log₁₀(" + result(Measure.VEIL, look) + " / "
                        + written(PlaceNumbers.ZERO_POINT.zeroPointLuminanceCdM2(), " cd/m²") + ") = "
                        + result(Measure.VEIL_BRIGHTNESS, look),
                List.of(
                        worked("Veil in the eye", "L_v", result(Measure.VEIL, look), "its own working"),
                        zeroPointLuminance()),
                cite("pogson", "allen-zero-point"),
                List.of("By the visual scale: photopic light, traditional zero point."));
    }

    Working veilInSkies(int look) {
        return new Working(
                "n = L_v / ( L₀ · 10^(−0.4 · 22.0) )",
                "n = " + result(Measure.VEIL, look) + " / "
                        + written(PlaceNumbers.naturalOnVisualScale().candelaPerSquareMetre(), " cd/m²") + " = "
                        + result(Measure.VEIL_NATURAL_SKIES, look),
                List.of(
                        worked("Veil in the eye", "L_v", result(Measure.VEIL, look), "its own working"),
                        zeroPointLuminance()),
                cite("falchi-2016", "allen-zero-point"),
                List.of(
                        "In natural skies of 22.0 mag/arcsec². Near the horizon the natural sky is 1.6 to 1.8 times as bright.",
                        "By day vision. The dark-adapted eye weighs by V′(λ): to it the veil is "
                                + written(darkAdaptedSkies(look), "") + " natural skies, by the S/P of the lamp, "
                                + written(lamp.spectrum().scotopicPhotopicRatio(), "")
                                + ", over that of the natural sky, "
                                + written(naturalScotopicRatio(), "") + "."));
    }

    private double darkAdaptedSkies(int look) {
        return numbers.get(Measure.VEIL_NATURAL_SKIES, look)
                * lamp.spectrum().scotopicPhotopicRatio()
                / naturalScotopicRatio();
    }

    private static double naturalScotopicRatio() {
        return SpectralClasses.naturalSky().spectrum().scotopicPhotopicRatio();
    }

    Working veilReach(int look) {
        return new Working(
                "E · f(θ₁) = L₀ · 10^(−0.4 · 22.0)",
                numbers.get(Measure.VEIL_REACH, look) > 0 ? "θ₁ = " + result(Measure.VEIL_REACH, look) : noReach(),
                List.of(
                        worked("Light at the eye", "E", result(Measure.ILLUMINANCE), "its own working"),
                        zeroPointLuminance()),
                cite("cie-146", "falchi-2016"),
                List.of("Nearer to the lights than this, the veil is brighter than a natural sky of 22.0."));
    }

    private String noReach() {
        VeilReach reach = PlaceNumbers.VEIL.angleWhereVeilEquals(
                new Illuminance(numbers.get(Measure.ILLUMINANCE)), PlaceNumbers.naturalOnVisualScale());
        return "no such angle between 0.1° and 100°: there the veil is "
                + (reach instanceof VeilReach.Throughout ? "the brighter" : "the darker") + " at every one";
    }

    Working halo(int look) {
        return new Working(
                "L = N ∫ I(γ') / r² · e^(−τ₁) · [ β_m p_m + ω β_a p_a ] · e^(−τ₂) ds",
                "L = " + result(Measure.HALO, look) + " along the line " + result(Measure.GLARE_ANGLE, look)
                        + " beside the lights",
                airInputs(),
                cite("single-scattering", "bodhaine-1999", "henyey-greenstein-1941", "aerosol-defaults"),
                List.of(
                        FIRST_ORDER,
                        "Of the lamps alone. What the air scatters of the lit ground is in the sky, not here.",
                        "This is light of the air itself, for cameras too; it adds to the sky, the veil does not."));
    }

    Working limitBeside(int look) {
        return new Working(
                "B = L₀ · 10^(−0.4 · 22.0) + L_v + L,   E_t and m as for the sky alone",
                "B = " + written(PlaceNumbers.naturalOnVisualScale().candelaPerSquareMetre(), " cd/m²") + " + "
                        + result(Measure.VEIL, look) + " + " + result(Measure.HALO, look) + " gives m = "
                        + result(Measure.LIMIT_BESIDE, look),
                List.of(
                        worked("Veil in the eye", "L_v", result(Measure.VEIL, look), "its own working"),
                        worked("Light the air scatters there", "L", result(Measure.HALO, look), "its own working"),
                        constant("Field factor", "F", "2 (1.4 to 2.4 between people)")),
                cite("crumey-2014", "cie-146", "falchi-2016"),
                List.of(
                        "A natural sky of 22.0 with the veil over it and the lit air in it. An estimate and a best case: a"
                                + " lamp in view also lowers the eye's sensitivity."));
    }
}
