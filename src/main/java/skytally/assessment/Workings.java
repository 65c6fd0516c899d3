package skytally.assessment;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import skytally.atmosphere.AirMass;
import skytally.citation.Bibliography;
import skytally.citation.Citation;
import skytally.eye.PointVisibility;
import skytally.glare.VeilingLuminance;
import skytally.naturalsky.NaturalBackground;
import skytally.notation.QuantityFormat;
import skytally.photometry.SurfaceBrightness;
import skytally.scene.Known;
import skytally.scene.Lamp;
import skytally.scene.OpenScene;
import skytally.scene.Property;
import skytally.spectrum.SpectralClasses;

/**
 * Shows how each number of a place was worked out: the formula, the same with the numbers in it, what went in and how
 * well that is known. Inputs are given to five figures, so that the result can be found again by hand to the digits
 * printed.
 */
final class Workings {

    private static final int FIGURES = 5;
    private static final String FIRST_ORDER =
            "First scattering only: light scattered more than once is not in it, so read it as \"at least\".";

    private final PlaceNumbers numbers;
    private final OpenScene open;
    private final Lamp lamp;
    private final String place;

    Workings(PlaceNumbers numbers, OpenScene open) {
        this.numbers = numbers;
        this.open = open;
        this.lamp = numbers.brightest();
        this.place = numbers.observer().mark();
    }

    /** The working of a number of the place. */
    Working of(Measure measure) {
        return switch (measure) {
            case DISTANCE -> distance();
            case ALTITUDE -> altitude();
            case INTENSITY -> intensity();
            case ONE_ILLUMINANCE -> oneIlluminance();
            case ILLUMINANCE -> illuminance();
            case WINDOW_ILLUMINANCE -> window();
            case ONE_MAGNITUDE -> magnitude("m₁", "E₁", Measure.ONE_ILLUMINANCE, Measure.ONE_MAGNITUDE);
            case MAGNITUDE -> magnitude("m", "E", Measure.ILLUMINANCE, Measure.MAGNITUDE);
            case ONE_STAR -> star("m₁", Measure.ONE_MAGNITUDE, Measure.ONE_STAR);
            case STAR -> star("m", Measure.MAGNITUDE, Measure.STAR);
            case STANDARD_MAGNITUDE -> standardMagnitude();
            case SCOTOPIC_MAGNITUDE -> darkAdapted();
            case ANGULAR_SIZE -> angularSize();
            case NOTICED_TO ->
                seenTo(Measure.NOTICED_TO, PointVisibility.NAVIGATION_PRACTICE.lux(), "navigation-practice");
            case DETECTED_TO ->
                seenTo(
                        Measure.DETECTED_TO,
                        PointVisibility.detection(PlaceNumbers.naturalOnVisualScale())
                                .lux(),
                        "crumey-2014");
            case UPWARD_SHARE -> share("the level", Measure.UPWARD_SHARE);
            case LOW_SHARE -> share("the level and below 10°", Measure.LOW_SHARE);
            default -> throw new IllegalArgumentException(measure + " belongs to a direction");
        };
    }

    /** The working of a number of one direction looked in. */
    Working of(Measure measure, int look) {
        return switch (measure) {
            case GLARE_ANGLE -> glareAngle(look);
            case VEIL -> veil(look);
            case VEIL_BRIGHTNESS -> veilBrightness(look);
            case VEIL_NATURAL_SKIES -> veilInSkies(look);
            case VEIL_REACH -> veilReach(look);
            case HALO -> halo(look);
            case LIMIT_BESIDE -> limitBeside(look);
            case SKY_ARTIFICIAL -> artificial(look);
            case SKY_NATURAL -> naturalLuminance(look);
            case SKY_NATURAL_BRIGHTNESS -> naturalBrightness(look);
            case SKY_BRIGHTNESS -> brightness(look);
            case SKY_INCREASE -> increase(look);
            case LIMIT_NATURAL -> limit(look, Measure.SKY_NATURAL_BRIGHTNESS, Measure.LIMIT_NATURAL);
            case LIMIT -> limit(look, Measure.SKY_BRIGHTNESS, Measure.LIMIT);
            case STARS_NATURAL -> stars(look, Measure.LIMIT_NATURAL, Measure.STARS_NATURAL);
            case STARS -> stars(look, Measure.LIMIT, Measure.STARS);
            default -> throw new IllegalArgumentException(measure + " belongs to the place");
        };
    }

    private Working distance() {
        return new Working(
                "d = √[ (h₁ − h₂)² + 4 (R + h₁)(R + h₂) sin²(D / 2R) ]",
                "d = √[ (" + m(lampHeight()) + " − " + m(eyeHeight()) + ")² + (" + m(groundDistance())
                        + " over the curve)² ] = " + result(Measure.DISTANCE),
                List.of(
                        input("Distance along the ground", "D", m(groundDistance()), Property.DISTANCE, place),
                        input("Height of the light", "h₁", m(lampHeight()), Property.MOUNTING_HEIGHT, lamp.type()),
                        input("Height of the eye", "h₂", m(eyeHeight()), Property.EYE_HEIGHT, place),
                        constant("Earth enlarged for mean refraction", "R", "7/6 × 6 371 km")),
                cite("mean-refraction"),
                List.of("The ground is taken as level but for the curve of the Earth; nothing stands between."));
    }

    private Working altitude() {
        return new Working(
                "sin a = [ (h₁ − h₂) − (R + h₁) · 2 sin²(D / 2R) ] / d",
                "a = " + result(Measure.ALTITUDE) + ", so the eye lies "
                        + written(-StrictMath.toDegrees(numbers.path().altitudeAtLampRad()), "°")
                        + " below the level of the light",
                List.of(
                        input("Height of the light", "h₁", m(lampHeight()), Property.MOUNTING_HEIGHT, lamp.type()),
                        input("Height of the eye", "h₂", m(eyeHeight()), Property.EYE_HEIGHT, place),
                        worked("Distance along the line of sight", "d", result(Measure.DISTANCE), "above")),
                cite("mean-refraction"),
                List.of());
    }

    private Working intensity() {
        double perLumen = numbers.get(Measure.INTENSITY) / Math.max(lamp.flux().lumens(), Double.MIN_NORMAL);
        return new Working(
                "I(γ) = Φ · i(γ),   i(γ) = " + lamp.light().formula(),
                "I = " + written(lamp.flux().lumens(), " lm") + " × " + written(perLumen, " cd/lm") + " = "
                        + result(Measure.INTENSITY),
                List.of(
                        input(
                                "Light of one lamp, initial",
                                "Φ",
                                written(lamp.flux().lumens(), " lm"),
                                Property.LUMENS,
                                lamp.type()),
                        worked(
                                "Angle from the lamp's axis",
                                "γ",
                                written(numbers.offAxisDeg(), "°"),
                                "heights, distance and tilt"),
                        input("Kind of fitting", "i", "plain shape", Property.SHAPE, lamp.type()),
                        input(
                                "Tilt toward you",
                                "t",
                                written(lamp.attitude().tiltDeg(), "°"),
                                Property.TILT,
                                lamp.type())),
                cite("plain-shapes"),
                List.of("A plain shape stands in for the fitting: a photometric file of the fitting replaces it."));
    }

    private Working oneIlluminance() {
        return new Working(
                "E₁ = I(γ) · T / d²",
                "E₁ = " + result(Measure.INTENSITY) + " × " + written(numbers.transmission(), "") + " / ("
                        + result(Measure.DISTANCE) + ")² = " + result(Measure.ONE_ILLUMINANCE),
                List.of(
                        worked(
                                "Strength of one lamp toward you",
                                "I(γ)",
                                result(Measure.INTENSITY),
                                "its shape and angle"),
                        passedByAir(),
                        worked(
                                "Distance along the line of sight",
                                "d",
                                result(Measure.DISTANCE),
                                "heights and distance")),
                cite("inverse-square", "allard", "bodhaine-1999", "aerosol-defaults"),
                atTheEye());
    }

    private Working illuminance() {
        boolean onePoint = numbers.scene().lamps().size() == 1;
        String sum = onePoint
                ? "E = " + lamp.count() + " × " + result(Measure.INTENSITY) + " × "
                        + written(numbers.transmission(), "") + " / (" + result(Measure.DISTANCE) + ")² = "
                        + result(Measure.ILLUMINANCE)
                : "E = sum over " + numbers.scene().lamps().size() + " positions = " + result(Measure.ILLUMINANCE);
        return new Working(
                onePoint ? "E = N · I(γ) · T / d²" : "E = Σ N I(γ) T / d²",
                sum,
                List.of(
                        input("How many lights", "N", Integer.toString(lamp.count()), Property.COUNT, lamp.type()),
                        worked(
                                "Strength of one lamp toward you",
                                "I(γ)",
                                result(Measure.INTENSITY),
                                "its shape and angle"),
                        passedByAir(),
                        worked(
                                "Distance along the line of sight",
                                "d",
                                result(Measure.DISTANCE),
                                "heights and distance")),
                cite("inverse-square", "allard", "bodhaine-1999", "aerosol-defaults"),
                atTheEye());
    }

    private static List<String> atTheEye() {
        return List.of(
                "At the eye, on a plane facing the lamp. Lights add in lux, never in magnitudes.",
                "T is the share the eye sees of this spectrum after the molecules and haze on the path.");
    }

    private Working window() {
        double altitude = numbers.get(Measure.ALTITUDE);
        return new Working(
                "E_v = N · I(γ) · cos a / d²",
                "E_v = " + lamp.count() + " × " + result(Measure.INTENSITY) + " × cos " + written(altitude, "°")
                        + " / (" + result(Measure.DISTANCE) + ")² = " + result(Measure.WINDOW_ILLUMINANCE),
                List.of(
                        input("How many lights", "N", Integer.toString(lamp.count()), Property.COUNT, lamp.type()),
                        worked(
                                "Strength of one lamp toward you",
                                "I(γ)",
                                result(Measure.INTENSITY),
                                "its shape and angle"),
                        worked(
                                "Height of the light above the level of the eye",
                                "a",
                                written(altitude, "°"),
                                "heights and distance"),
                        worked(
                                "Distance along the line of sight",
                                "d",
                                result(Measure.DISTANCE),
                                "heights and distance")),
                cite("inverse-square", "cie-150-planes"),
                List.of(
                        "Outside of the glass, on an upright plane facing the lights.",
                        "Nothing is taken off for the air, because limits on windows count the light without it."));
    }

    private Working magnitude(String name, String light, Measure from, Measure to) {
        return new Working(
                name + " = −2.5 log₁₀(" + light + " / E₀)",
                name + " = −2.5 log₁₀(" + result(from) + " / 2.54 × 10⁻⁶ lx) = " + result(to),
                List.of(
                        worked("Light at the eye", light, result(from), "its own working"),
                        constant("Illuminance of magnitude 0 by convention", "E₀", "2.54 × 10⁻⁶ lx")),
                cite("pogson", "allen-zero-point"),
                List.of(
                        "Zero point TRADITIONAL, above the atmosphere. Other conventions differ by up to 0.06 mag.",
                        "The star as it would be with no air between it and the eye."));
    }

    private Working star(String name, Measure from, Measure to) {
        double own = numbers.air().extinctionMagPerAirMass();
        double without = numbers.get(from);
        String withOwnAir = "This air's own k_V is " + decimals(own, 3) + ": with it the star is "
                + decimals(without - own, 2) + " overhead and "
                + decimals(without - own * AirMass.atAltitude(30), 2) + " at 30° altitude.";
        return new Working(
                "m_cat = " + name + " − k_V X",
                "m_cat = " + result(from) + " − 0.20 × 1 = " + result(to),
                List.of(
                        worked("Magnitude without air", name, result(from), "its own working"),
                        constant("Extinction by the overhead convention", "k_V", "0.20 mag"),
                        constant("Air mass overhead", "X", "1")),
                cite("overhead-star", "kasten-young-1989"),
                List.of(withOwnAir));
    }

    private Working standardMagnitude() {
        return new Working(
                "m_1km = −2.5 log₁₀( I(γ) / (1000 m)² / E₀ )",
                "m_1km = −2.5 log₁₀( " + result(Measure.INTENSITY) + " / 10⁶ m² / 2.54 × 10⁻⁶ lx ) = "
                        + result(Measure.STANDARD_MAGNITUDE),
                List.of(worked(
                        "Strength of one lamp toward you", "I(γ)", result(Measure.INTENSITY), "its shape and angle")),
                cite("pogson", "allen-zero-point", "inverse-square"),
                List.of("A way to compare lamps whatever the distance: as seen from one kilometre, no air."));
    }

    private Working darkAdapted() {
        double ratio = lamp.spectrum().scotopicPhotopicRatio();
        return new Working(
                "m_s = m₁ − 2.5 log₁₀[ (S/P)_lamp / (S/P)_star ]",
                "m_s = " + result(Measure.ONE_MAGNITUDE) + " − 2.5 log₁₀( " + written(ratio, "") + " / 2.35 ) = "
                        + result(Measure.SCOTOPIC_MAGNITUDE),
                List.of(
                        worked(
                                "Magnitude of one lamp by day vision",
                                "m₁",
                                result(Measure.ONE_MAGNITUDE),
                                "its own working"),
                        worked("S/P of the lamp's light", "(S/P)_lamp", written(ratio, ""), "its spectral class")),
                cite("scotopic-star", "cie-1924"),
                List.of("Fainter than about magnitude 4 the eye sees with its rods; then this line holds."));
    }

    private Working angularSize() {
        return new Working(
                "w = 2 arctan[ s / (2 d) ]",
                "w = 2 arctan[ " + m(lamp.luminousSizeM()) + " / (2 × " + result(Measure.DISTANCE) + ") ] = "
                        + result(Measure.ANGULAR_SIZE),
                List.of(
                        new Working.Input(
                                "Largest size of the bright part",
                                "s",
                                m(lamp.luminousSizeM()),
                                Known.assumed("usual for this kind of fitting")),
                        worked(
                                "Distance along the line of sight",
                                "d",
                                result(Measure.DISTANCE),
                                "heights and distance")),
                cite("point-source-sizes"),
                List.of("Under 1 arcminute a lamp is a point, up to 5 a small patch; beyond that no star compares."));
    }

    private Working seenTo(Measure measure, double thresholdLx, String source) {
        double perKm = numbers.air().extinctionPerMetre(550) * 1000;
        return new Working(
                "I(γ) e^(−k d) / d² = E_t",
                "d = " + result(measure) + " where " + result(Measure.INTENSITY) + " × e^(−k d) / d² falls to "
                        + written(thresholdLx, " lx"),
                List.of(
                        worked(
                                "Strength of one lamp toward you",
                                "I(γ)",
                                result(Measure.INTENSITY),
                                "its shape and angle"),
                        input("Extinction along the ground", "k", written(perKm, " per km"), Property.AIR, place),
                        constant("Least light", "E_t", written(thresholdLx, " lx"))),
                cite("allard", source),
                List.of("With this strength in every direction; hills and the curve of the Earth come on top."));
    }

    private Working share(String above, Measure measure) {
        return new Working(
                "share = ∫ i dω above " + above + ", over ∫ i dω",
                "share = " + result(measure),
                List.of(
                        input("Kind of fitting", "i", lamp.light().formula(), Property.SHAPE, lamp.type()),
                        input("Tilt", "t", written(lamp.attitude().tiltDeg(), "°"), Property.TILT, lamp.type())),
                cite("ulr", "plain-shapes"),
                List.of(
                        "As the fitting hangs, of the light that leaves it. A matt face tilted by t gives (1 − cos t) / 2."));
    }

    private Working glareAngle(int look) {
        return new Working(
                "cos θ = v · u",
                "θ = " + result(Measure.GLARE_ANGLE, look),
                List.of(input(
                        "Angle beside the lights", "θ", result(Measure.GLARE_ANGLE, look), Property.LOOK_ANGLE, place)),
                cite("cie-146"),
                List.of("Level beside the lights, as seen from the eye."));
    }

    private Working veil(int look) {
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
                List.of(
                        "CIE General form, 0.1 to 100 degrees, printed to " + (int) VeilingLuminance.WIDEST_PRINTED_DEG
                                + ". Forms differ by 10 to 40 %; at 70 years the veil is about twice as strong.",
                        "It is inside the eye: a hand that shades the lamp removes it, and it is no part of the sky.",
                        "An estimate for what is looked at directly. A lamp in view also lowers the eye's sensitivity for"
                                + " minutes, which is not in it. Nothing is said of telescopes."));
    }

    private Working veilBrightness(int look) {
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

    private Working veilInSkies(int look) {
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

    private Working veilReach(int look) {
        return new Working(
                "E · f(θ₁) = L₀ · 10^(−0.4 · 22.0)",
                numbers.get(Measure.VEIL_REACH, look) > 0
                        ? "θ₁ = " + result(Measure.VEIL_REACH, look)
                        : "no such angle between 0.1° and 100°",
                List.of(
                        worked("Light at the eye", "E", result(Measure.ILLUMINANCE), "its own working"),
                        zeroPointLuminance()),
                cite("cie-146", "falchi-2016"),
                List.of("Nearer to the lights than this, the veil is brighter than a natural sky of 22.0."));
    }

    private Working halo(int look) {
        return new Working(
                "L = N ∫ I(γ') / r² · e^(−τ₁) · [ β_m p_m + ω β_a p_a ] · e^(−τ₂) ds",
                "L = " + result(Measure.HALO, look) + " along the line " + result(Measure.GLARE_ANGLE, look)
                        + " beside the lights",
                skyInputs(),
                cite("single-scattering", "bodhaine-1999", "henyey-greenstein-1941", "aerosol-defaults"),
                List.of(
                        FIRST_ORDER,
                        "This is light of the air itself, for cameras too; it adds to the sky, the veil does not."));
    }

    private Working limitBeside(int look) {
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

    private Working artificial(int look) {
        SkyLight light = numbers.sky(look);
        return new Working(
                "L = ∫ I / r² · e^(−τ₁) · [ β_m p_m + ω β_a p_a ] · e^(−τ₂) ds, for the lamps and for the lit ground",
                "L = " + written(light.lampsCdM2(), "") + " (lamps) + " + written(light.groundCdM2(), "")
                        + " (ground) = " + result(Measure.SKY_ARTIFICIAL, look),
                skyInputs(),
                cite("single-scattering", "bodhaine-1999", "henyey-greenstein-1941", "aerosol-defaults"),
                List.of(
                        FIRST_ORDER,
                        "Six wavelengths, the spectrum of the lamp, weighed by V(λ). No obstruction between: an upper bound for that."));
    }

    private List<Working.Input> skyInputs() {
        List<Working.Input> inputs = new ArrayList<>();
        inputs.add(worked("Light of all lamps", "N Φ", written(lamp.allFlux().lumens(), " lm"), "count and lumens"));
        inputs.add(worked("Share sent above the level", "ULR", result(Measure.UPWARD_SHARE), "its shape and tilt"));
        inputs.add(input(
                "Share the ground sends back",
                "ρ",
                written(numbers.scene().surroundings().groundReflectance(), ""),
                Property.GROUND,
                place));
        inputs.add(input(
                "Aerosol optical depth at 550 nm",
                "τ_a",
                written(numbers.air().aerosol().opticalDepthAt550(), ""),
                Property.AIR,
                place));
        inputs.add(worked(
                "Optical depth of the molecules at 550 nm",
                "τ_m",
                written(numbers.air().molecularOpticalDepth(550), ""),
                "height of the ground"));
        inputs.add(input("Distance along the ground", "D", m(groundDistance()), Property.DISTANCE, place));
        return inputs;
    }

    private Working naturalLuminance(int look) {
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

    private Working naturalBrightness(int look) {
        double angle = numbers.observer().looks().get(look).zenithAngleDeg();
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

    private Working brightness(int look) {
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

    private Working increase(int look) {
        double natural = numbers.natural()
                .johnsonVRadianceAt(
                        Math.min(90, numbers.observer().looks().get(look).zenithAngleDeg()));
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

    private Working limit(int look, Measure from, Measure to) {
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

    private Working stars(int look, Measure from, Measure to) {
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

    private Working.Input passedByAir() {
        return new Working.Input(
                "Passed by the air",
                "T",
                written(numbers.transmission(), ""),
                Known.workedOut(
                        "aerosol depth " + written(numbers.air().aerosol().opticalDepthAt550(), "") + ", "
                                + open.known(Property.AIR, place).state().words()));
    }

    private static Working.Input zeroPointLuminance() {
        return constant(
                "Luminance of 0 mag/arcsec²",
                "L₀",
                written(PlaceNumbers.ZERO_POINT.zeroPointLuminanceCdM2(), " cd/m²") + ", from E₀");
    }

    private Working.Input input(String name, String symbol, String value, Property property, String mark) {
        return new Working.Input(name, symbol, value, open.known(property, mark));
    }

    private static Working.Input worked(String name, String symbol, String value, String from) {
        return new Working.Input(name, symbol, value, Known.workedOut(from));
    }

    private static Working.Input constant(String name, String symbol, String value) {
        return new Working.Input(name, symbol, value, Known.assumed("convention, see the sources"));
    }

    private static List<Citation> cite(String... keys) {
        return Arrays.stream(keys).map(Bibliography::cite).toList();
    }

    private double lampHeight() {
        return lamp.position().heightM();
    }

    private double eyeHeight() {
        return numbers.observer().eye().heightM();
    }

    private double groundDistance() {
        return lamp.position().groundDistanceTo(numbers.observer().eye());
    }

    private static String m(double metres) {
        return written(metres, " m");
    }

    private String result(Measure measure) {
        return withUnit(measure, numbers.get(measure));
    }

    private String result(Measure measure, int look) {
        return withUnit(measure, numbers.get(measure, look));
    }

    /** Magnitudes and angles to a fixed number of decimals, all else to five figures. */
    private static String withUnit(Measure measure, double value) {
        if (Double.isNaN(value)) {
            return "none";
        }
        Unit unit = measure.unit();
        String digits =
                unit.isLinear() ? QuantityFormat.significant(value, FIGURES).plain() : decimals(value, 4);
        String gap = unit == Unit.DEGREE ? "" : "\u00a0";
        return digits + gap + unit.symbol();
    }

    private static String decimals(double value, int decimals) {
        return Double.isNaN(value)
                ? "none"
                : QuantityFormat.decimals(value, decimals).plain();
    }

    private static String written(double value, String unit) {
        return QuantityFormat.atMost(value, FIGURES).plain() + unit.replace(' ', '\u00a0');
    }
}
