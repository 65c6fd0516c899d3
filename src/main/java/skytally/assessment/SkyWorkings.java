package skytally.assessment;

import java.util.ArrayList;
import java.util.List;
import skytally.naturalsky.NaturalBackground;
import skytally.photometry.SurfaceBrightness;
import skytally.scene.OpenScene;

/** How the sky in a direction was worked out. */
final class SkyWorkings extends Shown {

    private static final String OTHER_LIGHT =
            "A reading overhead tells of one direction. Other light is taken as the same share of the natural sky"
                    + " everywhere; low down there is more of it, so the increase over the present sky is overstated there.";

    SkyWorkings(PlaceNumbers numbers, OpenScene open) {
        super(numbers, open);
    }

    Working artificial(int look) {
        SkyLight light = numbers.sky(look);
        return new Working(
                "L = ∫ I / r² · e^(−τ₁) · [ β_m p_m + ω β_a p_a ] · e^(−τ₂) ds, for the lamps and for the lit ground",
                "L = " + written(light.lampsCdM2(), "") + " (lamps) + " + written(light.groundCdM2(), "")
                        + " (ground) = " + result(Measure.SKY_ARTIFICIAL, look),
                artificialInputs(look),
                cite("single-scattering", "bodhaine-1999", "henyey-greenstein-1941", "aerosol-defaults"),
                List.of(
                        FIRST_ORDER,
                        "Six wavelengths, the spectrum of the lamp, weighed by V(λ). No obstruction between: an upper bound for that."));
    }

    private List<Working.Input> artificialInputs(int look) {
        List<Working.Input> inputs = new ArrayList<>(skyInputs());
        if (!isOnePoint()) {
            String direction = numbers.looks().get(look).id();
            inputs.addAll(byType("L", " cd/m²", type -> type.skyCdM2().getOrDefault(direction, 0.0)));
        }
        return inputs;
    }

    Working naturalLuminance(int look) {
        return new Working(
                "L = L₀,nat · 10^(−0.4 μ)",
                "L = " + written(NaturalBackground.byItsSpectrum().zeroPointLuminanceCdM2(), " cd/m²")
                        + " × 10^(−0.4 × " + result(Measure.SKY_NATURAL_BRIGHTNESS, look) + ") = "
                        + result(Measure.SKY_NATURAL, look),
                List.of(worked("Natural sky", "μ", result(Measure.SKY_NATURAL_BRIGHTNESS, look), "its own working")),
                cite("natural-sky-spectrum", "v-zero-flux"),
                List.of(
                        "Photopic, by the spectrum of the natural sky itself; the traditional label of 22.0 is 171 µcd/m²."));
    }

    Working naturalBrightness(int look) {
        double angle = numbers.looks().get(look).zenithAngleDeg();
        NaturalBackground natural = numbers.natural();
        return new Working(
                "b(Z) = b₀ [ (1 − f) + f X ] 10^(−0.4 k_V (X − 1)),   X = (1 − 0.96 sin² Z)^(−½)",
                "μ = 22.0 − 2.5 log₁₀ " + written(natural.relativeBrightness(angle), "") + " = "
                        + result(Measure.SKY_NATURAL_BRIGHTNESS, look),
                List.of(
                        constant("Natural sky overhead", "b₀", "22.0 mag/arcsec²"),
                        constant("Share of airglow", "f", "0.6"),
                        worked("Angle from overhead", "Z", written(angle, "°"), "direction looked in"),
                        worked("Extinction", "k_V", written(natural.kV(), " mag"), "the air")),
                List.of(NaturalBackground.zenithCitation(), NaturalBackground.shapeCitation()),
                List.of(
                        "A fixed yardstick, not tonight: at solar maximum the natural sky is up to 0.4 mag brighter, and the same light a smaller share of it."));
    }

    Working brightness(int look) {
        return isPresentKnown() ? brightnessOverPresent(look) : brightnessOverNatural(look);
    }

    private boolean isPresentKnown() {
        return numbers.scene().present().isPresent();
    }

    private Working brightnessOverNatural(int look) {
        return new Working(
                "μ = μ_nat − 2.5 log₁₀(1 + r)",
                "μ = " + result(Measure.SKY_NATURAL_BRIGHTNESS, look) + " − 2.5 log₁₀(1 + "
                        + written(numbers.get(Measure.SKY_INCREASE, look) / 100, "") + ") = "
                        + result(Measure.SKY_BRIGHTNESS, look),
                List.of(
                        worked("Natural sky", "μ_nat", result(Measure.SKY_NATURAL_BRIGHTNESS, look), "its own working"),
                        worked("Increase", "r", result(Measure.SKY_INCREASE, look), "its own working")),
                cite("pogson", "falchi-2016"),
                List.of(FIRST_ORDER));
    }

    private Working brightnessOverPresent(int look) {
        return new Working(
                "μ = μ_nat − 2.5 log₁₀(1 + q + r)",
                "μ = " + result(Measure.SKY_NATURAL_BRIGHTNESS, look) + " − 2.5 log₁₀(1 + "
                        + written(numbers.otherLight(), "") + " + "
                        + written(numbers.get(Measure.SKY_INCREASE, look) / 100, "") + ") = "
                        + result(Measure.SKY_BRIGHTNESS, look),
                List.of(
                        worked("Natural sky", "μ_nat", result(Measure.SKY_NATURAL_BRIGHTNESS, look), "its own working"),
                        otherLight(),
                        worked(
                                "Glow of the lights that will shine",
                                "r",
                                result(Measure.SKY_INCREASE, look),
                                "its own working")),
                cite("pogson", "falchi-2016"),
                List.of(FIRST_ORDER, OTHER_LIGHT));
    }

    private Working.Input otherLight() {
        return numbers.scene().present().orElseThrow().zenithMagArcsec2().isPresent()
                ? worked(
                        "Other light of the present sky, in natural skies",
                        "q",
                        written(numbers.otherLight(), ""),
                        "the reading overhead, less nature and the lamps entered as there now")
                : worked(
                        "Other light of the present sky, in natural skies",
                        "q",
                        "0",
                        "no reading of the sky is entered");
    }

    Working presentBrightness(int look) {
        return new Working(
                "μ₀ = μ_nat − 2.5 log₁₀(1 + q + r₀)",
                "μ₀ = " + result(Measure.SKY_NATURAL_BRIGHTNESS, look) + " − 2.5 log₁₀(1 + "
                        + written(numbers.otherLight(), "") + " + " + written(nowInSkies(look), "") + ") = "
                        + result(Measure.SKY_PRESENT_BRIGHTNESS, look),
                List.of(
                        worked("Natural sky", "μ_nat", result(Measure.SKY_NATURAL_BRIGHTNESS, look), "its own working"),
                        otherLight(),
                        worked(
                                "Glow of the lamps that are there, in natural skies",
                                "r₀",
                                written(nowInSkies(look), ""),
                                "scattering of each lamp's spectrum")),
                cite("pogson", "falchi-2016", "single-scattering"),
                List.of(FIRST_ORDER, OTHER_LIGHT));
    }

    private double nowInSkies(int look) {
        return numbers.skyNow(look).johnsonV() / naturalV(look);
    }

    private double naturalV(int look) {
        return numbers.natural()
                .johnsonVRadianceAt(Math.min(90, numbers.looks().get(look).zenithAngleDeg()));
    }

    Working presentLuminance(int look) {
        return new Working(
                "L₀ = L_nat (1 + q) + L_now",
                "L₀ = " + result(Measure.SKY_NATURAL, look) + " × (1 + " + written(numbers.otherLight(), "") + ") + "
                        + written(numbers.skyNow(look).artificialCdM2(), " cd/m²") + " = "
                        + result(Measure.SKY_PRESENT, look),
                List.of(
                        worked("Natural sky", "L_nat", result(Measure.SKY_NATURAL, look), "its own working"),
                        otherLight(),
                        worked(
                                "Glow of the lamps that are there",
                                "L_now",
                                written(numbers.skyNow(look).artificialCdM2(), " cd/m²"),
                                "scattering of each lamp's spectrum")),
                cite("single-scattering", "natural-sky-spectrum"),
                List.of(FIRST_ORDER, OTHER_LIGHT));
    }

    Working luminance(int look) {
        return new Working(
                "L = L_nat (1 + q) + L_lights",
                "L = " + result(Measure.SKY_NATURAL, look) + " × (1 + " + written(numbers.otherLight(), "") + ") + "
                        + result(Measure.SKY_ARTIFICIAL, look) + " = " + result(Measure.SKY_LUMINANCE, look),
                List.of(
                        worked("Natural sky", "L_nat", result(Measure.SKY_NATURAL, look), "its own working"),
                        otherLight(),
                        worked(
                                "Glow of the lights that will shine",
                                "L_lights",
                                result(Measure.SKY_ARTIFICIAL, look),
                                "its own working")),
                cite("single-scattering", "natural-sky-spectrum"),
                List.of(FIRST_ORDER, OTHER_LIGHT));
    }

    Working increaseOverPresent(int look) {
        double now = nowInSkies(look);
        return new Working(
                "p = (r − r₀) / (1 + q + r₀)",
                "p = (" + written(numbers.get(Measure.SKY_INCREASE, look) / 100, "") + " − " + written(now, "")
                        + ") / (1 + " + written(numbers.otherLight(), "") + " + " + written(now, "") + ") = "
                        + result(Measure.SKY_INCREASE_OVER_PRESENT, look),
                List.of(
                        worked(
                                "Glow of the lights that will shine, in natural skies",
                                "r",
                                result(Measure.SKY_INCREASE, look),
                                "its own working"),
                        worked(
                                "Glow of the lamps that are there, in natural skies",
                                "r₀",
                                written(now, ""),
                                "scattering of each lamp's spectrum"),
                        otherLight()),
                cite("falchi-2016", "single-scattering"),
                List.of(
                        "Over the sky as it is; less than nothing where lamps are taken away.",
                        FIRST_ORDER,
                        OTHER_LIGHT));
    }

    Working increase(int look) {
        double natural = naturalV(look);
        return new Working(
                "r = F_V(lights) / F_V(natural)",
                "r = " + written(numbers.sky(look).johnsonV(), "") + " / " + written(natural, "") + " = "
                        + result(Measure.SKY_INCREASE, look),
                List.of(
                        worked(
                                "Sky glow, mean over the V band",
                                "F_V(lights)",
                                written(numbers.sky(look).johnsonV(), " W m⁻² sr⁻¹ nm⁻¹"),
                                "scattering of the lamp's spectrum"),
                        worked(
                                "Natural sky, mean over the V band",
                                "F_V(natural)",
                                written(natural, " W m⁻² sr⁻¹ nm⁻¹"),
                                "22.0 overhead and its shape")),
                cite("bessell-1990", "v-zero-flux", "single-scattering"),
                List.of("Both parts in the Johnson V band, each by its own spectrum.", FIRST_ORDER));
    }

    Working limit(int look, Measure from, Measure to) {
        double background = PlaceNumbers.ZERO_POINT
                .luminance(new SurfaceBrightness(numbers.get(from, look)))
                .candelaPerSquareMetre();
        double toAir = numbers.get(to, look) - numbers.air().extinctionMagPerAirMass();
        return new Working(
                "E_t = F [ √(a₁B^½ + a₂B^¾ + a₃B) + a₄B^¼ + a₅B^½ ]²,   m = −2.5 log₁₀(E_t / E₀)",
                "B = " + written(background, " cd/m²") + " gives m = " + result(to, look),
                List.of(
                        worked("Sky in that direction", "μ", result(from, look), "its own working"),
                        constant("Field factor", "F", "2 (1.4 to 2.4 between people)")),
                cite("crumey-2014", "allen-zero-point"),
                List.of(
                        "At the eye, the sky alone, no lamp in view. Keen eyes see 0.39 mag more, ordinary ones 0.20 mag less.",
                        "In a star catalogue the limit overhead is "
                                + decimals(toAir, 2) + ", since the air takes "
                                + decimals(numbers.air().extinctionMagPerAirMass(), 2)
                                + "."));
    }

    Working stars(int look, Measure from, Measure to) {
        return new Working(
                "n = 0.66 · N(m − k_V) / 2,   log₁₀ N = 0.59293 + 0.56138 m − 0.0072122 m²",
                "n = " + result(to, look),
                List.of(
                        worked("Faintest star at the eye", "m", result(from, look), "its own working"),
                        worked(
                                "Extinction",
                                "k_V",
                                written(numbers.air().extinctionMagPerAirMass(), " mag"),
                                "the air")),
                cite("star-counts", "stars-above-horizon"),
                List.of("A rule of thumb, within 20 %; the brightness overhead is taken for the whole sky."));
    }
}
