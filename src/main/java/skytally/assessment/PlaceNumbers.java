package skytally.assessment;

import java.util.Arrays;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.DirectPath;
import skytally.eye.Comparison;
import skytally.eye.EquivalentStar;
import skytally.eye.LimitingMagnitude;
import skytally.eye.NaturalAnchor;
import skytally.eye.NaturalAnchors;
import skytally.eye.PointVisibility;
import skytally.eye.StarCount;
import skytally.geometry.Direction;
import skytally.glare.VeilReach;
import skytally.glare.VeilingLuminance;
import skytally.luminaire.FluxShare;
import skytally.naturalsky.NaturalBackground;
import skytally.photometry.Illuminance;
import skytally.photometry.Luminance;
import skytally.photometry.LuminousIntensity;
import skytally.photometry.Magnitude;
import skytally.photometry.SurfaceBrightness;
import skytally.photometry.ZeroPoint;
import skytally.scene.Lamp;
import skytally.scene.Look;
import skytally.scene.Observer;
import skytally.scene.Scene;

/**
 * Everything one place gets from one scene, as plain numbers, and what the workings need to show how.
 *
 * <p>A number that does not exist, such as the magnitude of no light, is NaN here and nowhere outside this room.
 */
final class PlaceNumbers {

    static final ZeroPoint ZERO_POINT = ZeroPoint.TRADITIONAL;
    static final VeilingLuminance VEIL = VeilingLuminance.CieGeneral.DEFAULT;
    /** S/P of sunlight above the air (photometric tables computed for this project). */
    static final double SUN_SCOTOPIC_PHOTOPIC_RATIO = 2.35;

    /** Wider than this a bright part is no point and no star is compared with it. */
    static final double WIDEST_STAR_ARCMIN = 5;

    private final Scene scene;
    private final Observer observer;
    private final Lamp brightest;
    private final DirectPath path;
    private final double offAxisDeg;
    private final double transmission;
    private final double vacuumLx;
    private final double[] ofPlace = new double[Measure.values().length];
    private final double[][] ofLooks;
    private final @Nullable SkyLight[] sky;

    PlaceNumbers(Scene scene, Observer observer) {
        this.scene = scene;
        this.observer = observer;
        Atmosphere air = air();
        DirectLight.Sum sum = new DirectLight.Sum();
        DirectLight direct = new DirectLight(scene.lamps(), air);
        direct.at(observer.eye(), observer.facing(), Direction.UP, DirectLight.Veil.NONE, sum);
        brightest = scene.lamps().get(Math.max(0, sum.brightest()));
        path = DirectPath.between(
                brightest.position().heightM(),
                observer.eye().heightM(),
                brightest.position().groundDistanceTo(observer.eye()));
        Direction toEye = Direction.toward(brightest.position().bearingTo(observer.eye()), path.altitudeAtLampRad());
        Direction own = brightest.attitude().rotation().turnBack(toEye);
        offAxisDeg = StrictMath.toDegrees(own.angleTo(Direction.DOWN));
        double intensity = brightest.flux().lumens() * brightest.light().perLumen(own.x(), own.y(), own.z());
        vacuumLx = path.clearsTheHorizon() ? intensity / (path.lengthM() * path.lengthM()) : 0;
        transmission = new LuminousTransmission(brightest.spectrum(), air).along(path, air);

        Arrays.fill(ofPlace, Double.NaN);
        set(Measure.DISTANCE, path.lengthM());
        set(Measure.ALTITUDE, StrictMath.toDegrees(path.altitudeAtEyeRad()));
        set(Measure.INTENSITY, intensity);
        set(Measure.ONE_ILLUMINANCE, sum.brightestLx());
        set(Measure.ILLUMINANCE, sum.seenLx());
        set(Measure.WINDOW_ILLUMINANCE, sum.windowLx());
        setMagnitudes(sum, new LuminousIntensity(intensity));
        set(Measure.ANGULAR_SIZE, arcminutes(brightest.luminousSizeM(), path.lengthM()));
        set(Measure.UPWARD_SHARE, 100 * FluxShare.upward(brightest.light(), brightest.attitude()));
        set(Measure.LOW_SHARE, 100 * FluxShare.low(brightest.light(), brightest.attitude()));

        List<Look> looks = observer.looks();
        ofLooks = new double[looks.size()][];
        sky = new SkyLight[looks.size()];
        for (int i = 0; i < looks.size(); i++) {
            Look look = looks.get(i);
            double[] numbers = new double[Measure.values().length];
            Arrays.fill(numbers, Double.NaN);
            sky[i] = SkyLight.along(look, observer.eye(), scene);
            if (look.purpose() == Look.Purpose.GLARE) {
                direct.at(observer.eye(), observer.facing(), look.direction(), PlaceNumbers::veilPerLux, sum);
                glare(numbers, look, sum, sky[i]);
            } else {
                sky(numbers, look, sky[i]);
            }
            ofLooks[i] = numbers;
        }
    }

    private void setMagnitudes(DirectLight.Sum sum, LuminousIntensity intensity) {
        if (sum.seenLx() > 0) {
            Illuminance all = new Illuminance(sum.seenLx());
            set(Measure.MAGNITUDE, ZERO_POINT.magnitude(all).value());
            set(Measure.STAR, EquivalentStar.overhead(all, ZERO_POINT).value());
        }
        if (sum.brightestLx() > 0) {
            Illuminance one = new Illuminance(sum.brightestLx());
            Magnitude photopic = ZERO_POINT.magnitude(one);
            set(Measure.ONE_MAGNITUDE, photopic.value());
            set(Measure.ONE_STAR, EquivalentStar.overhead(one, ZERO_POINT).value());
            double lampRatio = brightest.spectrum().scotopicPhotopicRatio();
            set(
                    Measure.SCOTOPIC_MAGNITUDE,
                    EquivalentStar.inScotopicLight(photopic, lampRatio, SUN_SCOTOPIC_PHOTOPIC_RATIO)
                            .value());
        }
        if (intensity.candela() > 0) {
            set(
                    Measure.STANDARD_MAGNITUDE,
                    EquivalentStar.standardMagnitude(intensity, ZERO_POINT).value());
            double extinction = air().extinctionPerMetre(550);
            set(
                    Measure.NOTICED_TO,
                    PointVisibility.distanceWhereItDisappearsM(
                            intensity, PointVisibility.NAVIGATION_PRACTICE, extinction));
            set(
                    Measure.DETECTED_TO,
                    PointVisibility.distanceWhereItDisappearsM(
                            intensity, PointVisibility.detection(naturalOnVisualScale()), extinction));
        }
    }

    private void glare(double[] numbers, Look look, DirectLight.Sum sum, SkyLight light) {
        Direction toLamp = Direction.toward(observer.eye().bearingTo(brightest.position()), path.altitudeAtEyeRad());
        numbers[Measure.GLARE_ANGLE.ordinal()] =
                StrictMath.toDegrees(look.direction().angleTo(toLamp));
        double veil = sum.veilCdM2();
        numbers[Measure.VEIL.ordinal()] = veil;
        numbers[Measure.HALO.ordinal()] = light.lampsCdM2();
        Luminance natural = naturalOnVisualScale();
        numbers[Measure.VEIL_NATURAL_SKIES.ordinal()] = veil / natural.candelaPerSquareMetre();
        double background = natural.candelaPerSquareMetre() + veil + light.lampsCdM2();
        numbers[Measure.LIMIT_BESIDE.ordinal()] = faintestStar(
                ZERO_POINT.surfaceBrightness(new Luminance(background)).magArcsec2());
        if (veil > 0) {
            numbers[Measure.VEIL_BRIGHTNESS.ordinal()] =
                    ZERO_POINT.surfaceBrightness(new Luminance(veil)).magArcsec2();
            VeilReach reach = VEIL.angleWhereVeilEquals(new Illuminance(sum.seenLx()), natural);
            numbers[Measure.VEIL_REACH.ordinal()] = reach.angleDeg().orElse(Double.NaN);
        }
    }

    private void sky(double[] numbers, Look look, SkyLight light) {
        NaturalBackground natural = natural();
        double zenithAngle = Math.min(90, look.zenithAngleDeg());
        double naturalV = natural.johnsonVRadianceAt(zenithAngle);
        double ratio = light.johnsonV() / naturalV;
        double before = natural.brightnessAt(zenithAngle).magArcsec2();
        double after = before - NaturalBackground.brighteningMag(ratio);
        numbers[Measure.SKY_ARTIFICIAL.ordinal()] = light.artificialCdM2();
        numbers[Measure.SKY_NATURAL.ordinal()] =
                natural.photopicLuminanceAt(zenithAngle).candelaPerSquareMetre();
        numbers[Measure.SKY_NATURAL_BRIGHTNESS.ordinal()] = before;
        numbers[Measure.SKY_BRIGHTNESS.ordinal()] = after;
        numbers[Measure.SKY_INCREASE.ordinal()] = 100 * ratio;
        numbers[Measure.LIMIT_NATURAL.ordinal()] = faintestStar(before);
        numbers[Measure.LIMIT.ordinal()] = faintestStar(after);
        numbers[Measure.STARS_NATURAL.ordinal()] = starsAbove(faintestStar(before));
        numbers[Measure.STARS.ordinal()] = starsAbove(faintestStar(after));
    }

    /** The faintest star at the eye on a sky of this brightness, no lamp in view, to the typical observer. */
    private static double faintestStar(double magArcsec2) {
        Luminance background = ZERO_POINT.luminance(new SurfaceBrightness(magArcsec2));
        return LimitingMagnitude.on(background, LimitingMagnitude.CRUMEY_FIELD_FACTOR_TYPICAL, ZERO_POINT)
                .value();
    }

    /** Stars above the horizon when the faintest seen overhead is this at the eye; NaN outside the counts. */
    private double starsAbove(double faintestAtEye) {
        double inCatalogue = faintestAtEye - air().extinctionMagPerAirMass();
        return inCatalogue >= -1 && inCatalogue <= 8
                ? StarCount.aboveHorizonByRuleOfThumb(new Magnitude(inCatalogue))
                : Double.NaN;
    }

    /**
     * The veil of one lux: none beyond the angles the form is printed for, and nearer than it holds, straight at a
     * lamp, at least what it is at its nearest.
     */
    private static double veilPerLux(double angleDeg) {
        double inside = Math.max(VEIL.validity().fromDeg(), angleDeg);
        return inside > VeilingLuminance.WIDEST_PRINTED_DEG + 1e-9 ? 0 : VEIL.perLux(inside);
    }

    private void set(Measure measure, double value) {
        ofPlace[measure.ordinal()] = value;
    }

    double get(Measure measure) {
        return ofPlace[measure.ordinal()];
    }

    double get(Measure measure, int look) {
        return ofLooks[look][measure.ordinal()];
    }

    /** A number of the direction with this id; NaN where the place has none of it. */
    double inLook(String id, Measure measure) {
        List<Look> looks = observer.looks();
        for (int i = 0; i < looks.size(); i++) {
            if (looks.get(i).id().equals(id)) {
                return get(measure, i);
            }
        }
        return Double.NaN;
    }

    SkyLight sky(int look) {
        return Objects.requireNonNull(sky[look]);
    }

    /** The natural sky of 22.0 on the visual scale, with which a veil in the eye is compared. */
    static Luminance naturalOnVisualScale() {
        return ZERO_POINT.luminance(NaturalBackground.FALCHI_2016_ZENITH);
    }

    NaturalBackground natural() {
        return NaturalBackground.reference(air().extinctionMagPerAirMass());
    }

    Atmosphere air() {
        return scene.surroundings().air();
    }

    Scene scene() {
        return scene;
    }

    Observer observer() {
        return observer;
    }

    Lamp brightest() {
        return brightest;
    }

    DirectPath path() {
        return path;
    }

    /** Angle between the lamp's nadir axis and the eye, in degrees. */
    double offAxisDeg() {
        return offAxisDeg;
    }

    double transmission() {
        return transmission;
    }

    /** Light of the brightest single lamp with nothing taken by the air, in lux. */
    double oneInVacuumLx() {
        return vacuumLx;
    }

    /**
     * Whether one lamp may be compared with a star: its bright part under 5 arcminutes, its light less than the full
     * Moon's.
     */
    boolean isLikeAStar() {
        return get(Measure.ANGULAR_SIZE) < WIDEST_STAR_ARCMIN && get(Measure.ONE_ILLUMINANCE) < fullMoonLx();
    }

    /** What a light at the eye is like; nothing for one too faint to be seen. */
    Optional<Likeness> likeness(double lux) {
        if (!(lux > 0)) {
            return Optional.empty();
        }
        if (!isLikeAStar()) {
            return Optional.of(new Likeness(fullMoon().said(), lux / fullMoonLx(), true));
        }
        return Comparison.of(new Illuminance(lux), ZERO_POINT)
                .map(found -> new Likeness(found.anchor().said(), found.times(), false));
    }

    private static NaturalAnchor fullMoon() {
        return NaturalAnchors.byId("full-moon").orElseThrow();
    }

    static double fullMoonLx() {
        return fullMoon().illuminance(ZERO_POINT).lux();
    }

    private static double arcminutes(double sizeM, double distanceM) {
        return 60 * StrictMath.toDegrees(2 * StrictMath.atan(sizeM / 2 / distanceM));
    }
}
