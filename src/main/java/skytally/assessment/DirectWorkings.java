package skytally.assessment;

import java.util.List;
import java.util.function.ToDoubleFunction;
import skytally.atmosphere.AirMass;
import skytally.geometry.Direction;
import skytally.geometry.Position;
import skytally.scene.Known;
import skytally.scene.OpenScene;
import skytally.scene.Property;

/** How the light that reaches a place in a straight line was worked out. */
final class DirectWorkings extends Shown {

    private static final String WITHOUT_AIR =
            "Nothing is taken off for the air, because limits on windows count the light without it.";

    DirectWorkings(PlaceNumbers numbers, OpenScene open) {
        super(numbers, open);
    }

    Working distance() {
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
                List.of(
                        numbers.observer().ground().points().isEmpty()
                                ? "The ground is taken as level but for the curve of the Earth; nothing stands between."
                                : "The ground between is as entered; nothing else stands between."));
    }

    Working altitude() {
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

    Working intensity() {
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
                                isOnePoint() ? "Tilt toward you" : "Tilt from straight down",
                                "t",
                                written(lamp.attitude().tiltDeg(), "°"),
                                Property.TILT,
                                lamp.type()),
                        input(
                                "Bearing the fitting faces",
                                "β",
                                written(lamp.attitude().bearingDeg(), "°"),
                                Property.BEARING,
                                lamp.type())),
                cite("plain-shapes"),
                List.of("A plain shape stands in for the fitting: a photometric file of the fitting replaces it."));
    }

    Working oneIlluminance() {
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

    Working illuminance() {
        return isOnePoint() ? illuminanceOfOnePoint() : illuminanceOfMany();
    }

    private Working illuminanceOfOnePoint() {
        return new Working(
                "E = N · I(γ) · T / d²",
                "E = " + lamp.count() + " × " + result(Measure.INTENSITY) + " × " + written(numbers.transmission(), "")
                        + " / (" + result(Measure.DISTANCE) + ")² = " + result(Measure.ILLUMINANCE),
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

    private Working illuminanceOfMany() {
        return new Working(
                "E = Σ N · I(γ) · T / d²  over " + numbers.scene().lamps().size() + " positions",
                sum("E", "E", Contribution::illuminanceLx, Measure.ILLUMINANCE),
                byType("E", " lx", Contribution::illuminanceLx),
                cite("inverse-square", "allard", "bodhaine-1999", "aerosol-defaults"),
                atTheEye());
    }

    /** The sum as a line: the parts are in the list of inputs. */
    private String sum(String name, String part, ToDoubleFunction<Contribution> of, Measure measure) {
        long types = numbers.contributions().stream()
                .filter(type -> of.applyAsDouble(type) > 0)
                .count();
        return name + " = "
                + (types == 0 ? "" : part + " of " + types + (types == 1 ? " type" : " types") + ", added = ")
                + result(measure);
    }

    private static List<String> atTheEye() {
        return List.of(
                "At the eye, on a plane facing the lamp. Lights add in lux, never in magnitudes.",
                "T is the share the eye sees of this spectrum after the molecules and haze on the path.");
    }

    Working window() {
        return isOnePoint() ? windowOfOnePoint() : windowOfMany();
    }

    private Working windowOfOnePoint() {
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
                List.of("Outside of the glass, on an upright plane facing the lights.", WITHOUT_AIR));
    }

    private Working windowOfMany() {
        return new Working(
                "E_v = Σ N · I(γ) · max(0, cos ε) / d²,   ε between the lamp and the outward normal",
                sum("E_v", "E_v", Contribution::windowLx, Measure.WINDOW_ILLUMINANCE),
                byType("E_v", " lx", Contribution::windowLx),
                cite("inverse-square", "cie-150-planes"),
                List.of(
                        "Outside of the glass, on an upright plane that faces " + facing()
                                + ". Lamps behind it add nothing.",
                        WITHOUT_AIR));
    }

    private String facing() {
        Direction normal = numbers.observer().facing();
        double bearing = StrictMath.toDegrees(StrictMath.atan2(normal.x(), normal.y()));
        return written(bearing < 0 ? bearing + 360 : bearing, "°");
    }

    Working worstPlane() {
        return new Working(
                "E_v(β) = Σ N · I(γ) · cos a · max(0, cos(β − β_lamp)) / d²,   the greatest of 360 bearings β",
                "E_v(" + result(Measure.WORST_PLANE_FACING) + ") = " + result(Measure.WORST_PLANE),
                List.of(
                        worked(
                                "Bearing of the plane",
                                "β",
                                result(Measure.WORST_PLANE_FACING),
                                "a search by whole degrees"),
                        worked("Light at the eye", "E", result(Measure.ILLUMINANCE), "its own working")),
                cite("inverse-square", "cie-150-planes"),
                List.of(
                        "An upright plane turned to whichever bearing makes the sum over all lamps greatest.",
                        WITHOUT_AIR));
    }

    Working worstPlaneFacing() {
        return new Working(
                "β = the bearing where E_v(β) is greatest",
                "β = " + result(Measure.WORST_PLANE_FACING),
                List.of(worked("Light on that plane", "E_v", result(Measure.WORST_PLANE), "its own working")),
                cite("cie-150-planes"),
                List.of("Clockwise from true north, by whole degrees."));
    }

    Working level() {
        return new Working(
                "E_h = Σ N · I(γ) · max(0, sin a) / d²,   a the lamp's height above the level",
                "E_h = " + result(Measure.LEVEL_ILLUMINANCE) + " over "
                        + numbers.scene().lamps().size() + (isOnePoint() ? " position" : " positions"),
                List.of(worked("Height of the eye", "h₂", m(eyeHeight()), "the place's height")),
                cite("inverse-square", "cie-150-planes"),
                List.of("On a level plane at the height of the eye, facing up.", WITHOUT_AIR));
    }

    Working worstOfWindow() {
        Position worst = numbers.worstOfPane();
        return new Working(
                "E_v = the greatest Σ N · I(γ) · max(0, cos ε) / d² of a grid of 5 by 5 points of the glass",
                "E_v = " + result(Measure.WINDOW_WORST) + " at " + m(worst.heightM()) + " of height, "
                        + m(worst.groundDistanceTo(numbers.observer().eye())) + " beside the middle",
                List.of(
                        worked("In the middle", "E_v", result(Measure.WINDOW_ILLUMINANCE), "its own working"),
                        worked(
                                "Size of the window",
                                "w × h",
                                numbers.observer()
                                        .pane()
                                        .map(pane -> m(pane.widthM()) + " × " + m(pane.heightM()))
                                        .orElse("none"),
                                "the place's values")),
                cite("inverse-square", "cie-150-planes"),
                List.of("Edge to edge, in the plane of the glass; its outside.", WITHOUT_AIR));
    }

    Working magnitude(String name, String light, Measure from, Measure to) {
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

    Working star(String name, Measure from, Measure to) {
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

    Working standardMagnitude() {
        return new Working(
                "m_1km = −2.5 log₁₀( I(γ) / (1000 m)² / E₀ )",
                "m_1km = −2.5 log₁₀( " + result(Measure.INTENSITY) + " / 10⁶ m² / 2.54 × 10⁻⁶ lx ) = "
                        + result(Measure.STANDARD_MAGNITUDE),
                List.of(worked(
                        "Strength of one lamp toward you", "I(γ)", result(Measure.INTENSITY), "its shape and angle")),
                cite("pogson", "allen-zero-point", "inverse-square"),
                List.of("A way to compare lamps whatever the distance: as seen from one kilometre, no air."));
    }

    Working darkAdapted() {
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

    Working angularSize() {
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

    Working seenTo(Measure measure, double thresholdLx, String source) {
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

    Working share(String above, Measure measure) {
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
}
