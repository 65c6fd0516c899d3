package skytally.assessment;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.EnumSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
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
import skytally.geometry.Position;
import skytally.glare.ThresholdIncrement;
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
    static final VeilingLuminance ROAD_VEIL = VeilingLuminance.StilesHolladay.IN_STANDARDS;
    /** S/P of sunlight above the air (photometric tables computed for this project). */
    static final double SUN_SCOTOPIC_PHOTOPIC_RATIO = 2.35;

    /** Wider than this a bright part is no point and no star is compared with it. */
    static final double WIDEST_STAR_ARCMIN = 5;

    /** Points of a window from edge to edge, both ways. */
    private static final int PANE_POINTS = 5;

    private static final Set<Measure> OF_PLANES =
            EnumSet.of(Measure.WORST_PLANE, Measure.WORST_PLANE_FACING, Measure.WINDOW_WORST);

    private final SceneLights lights;
    private final Scene scene;
    private final Observer observer;
    private final Lamp brightest;
    private final DirectPath path;
    private final double offAxisDeg;
    private final double transmission;
    private final double vacuumLx;
    private final List<Look> looks;
    private final SceneLights.Sky over;
    private final double[] ofPlace = new double[Measure.values().length];
    private final @Nullable Looked[] looked;
    private final Map<String, double[]> byType = new LinkedHashMap<>(); // at the eye, on the window, veil
    private final int hidden;
    private @Nullable Double otherLight;
    private @Nullable Position worstOfPane;
    private @Nullable Map<String, Double> overheadShares;

    /** What one direction gave. */
    private record Looked(double[] numbers, SkyLight sky, SkyLight skyNow) {}

    PlaceNumbers(SceneLights lights, Observer observer) {
        this.lights = lights;
        this.scene = lights.scene();
        this.observer = observer;
        DirectLight direct = lights.direct();
        DirectLight.Sum sum = new DirectLight.Sum();
        direct.at(observer, Direction.UP, DirectLight.Veil.NONE, sum);
        hidden = sum.hidden();
        brightest = brightest(sum);
        path = DirectPath.between(
                brightest.position().heightM(),
                observer.eye().heightM(),
                brightest.position().groundDistanceTo(observer.eye()));
        Direction toEye = Direction.toward(brightest.position().bearingTo(observer.eye()), path.altitudeAtLampRad());
        Direction own = brightest.attitude().rotation().turnBack(toEye);
        offAxisDeg = StrictMath.toDegrees(own.angleTo(Direction.DOWN));
        double intensity = brightest.flux().lumens() * brightest.light().perLumen(own.x(), own.y(), own.z());
        boolean inView = sum.brightest() >= 0
                && path.clearsTheHorizon()
                && !observer.ground().hides(brightest.position(), observer.eye());
        vacuumLx = inView ? intensity / (path.lengthM() * path.lengthM()) : 0;
        transmission = new LuminousTransmission(brightest.spectrum(), air()).along(path, air());

        Arrays.fill(ofPlace, Double.NaN);
        set(Measure.DISTANCE, path.lengthM());
        set(Measure.ALTITUDE, StrictMath.toDegrees(path.altitudeAtEyeRad()));
        set(Measure.INTENSITY, intensity);
        set(Measure.ONE_ILLUMINANCE, sum.brightestLx());
        set(Measure.ILLUMINANCE, sum.seenLx());
        set(Measure.WINDOW_ILLUMINANCE, sum.windowLx());
        set(Measure.LEVEL_ILLUMINANCE, sum.levelLx());
        setMagnitudes(sum, new LuminousIntensity(intensity));
        set(Measure.ANGULAR_SIZE, arcminutes(brightest.luminousSizeM(), path.lengthM()));
        set(Measure.UPWARD_SHARE, 100 * FluxShare.upward(brightest.light(), brightest.attitude()));
        set(Measure.LOW_SHARE, 100 * FluxShare.low(brightest.light(), brightest.attitude()));
        lights.types().forEach(type -> byType.put(type, new double[] {0, 0, Double.NaN}));
        for (int i = 0; i < direct.types().size(); i++) {
            byType.put(direct.types().get(i), new double[] {sum.seenLx(i), sum.windowLx(i), Double.NaN});
        }
        over = lights.over(observer.eye());
        looks = aimed(observer.looks(), direct);
        looked = new Looked[looks.size()];
    }

    /** What is worked out only when asked for, because it takes long. */
    private Looked looked(int i) {
        Looked done = looked[i];
        if (done == null) {
            done = look(looks.get(i));
            looked[i] = done;
        }
        return done;
    }

    private Looked look(Look look) {
        double[] numbers = new double[Measure.values().length];
        Arrays.fill(numbers, Double.NaN);
        DirectLight.Sum sum = new DirectLight.Sum();
        switch (look.purpose()) {
            case GLARE -> {
                SkyLight halo = over.along(look);
                lights.direct().at(observer, look.direction(), PlaceNumbers::veilPerLux, sum);
                glare(numbers, look, sum, halo);
                return new Looked(numbers, halo, SkyLight.NONE);
            }
            case ROAD -> {
                lights.direct().at(observer, look.direction(), PlaceNumbers::roadVeilPerLux, sum);
                road(numbers, sum);
                return new Looked(numbers, SkyLight.NONE, SkyLight.NONE);
            }
            case SKY -> {
                SkyLight sky = over.along(look);
                SkyLight now = over.atPresent(look);
                sky(numbers, look, sky);
                if (scene.present().isPresent()) {
                    present(numbers, look, sky, now);
                }
                return new Looked(numbers, sky, now);
            }
        }
        throw new IllegalStateException("Nothing is asked of " + look);
    }

    /** The lamp that gives the eye most; the nearest where none gives anything. */
    private Lamp brightest(DirectLight.Sum sum) {
        if (sum.brightest() >= 0) {
            return scene.lamps().get(sum.brightest());
        }
        return scene.allLamps().stream()
                .min(Comparator.comparingDouble(lamp -> lamp.position().groundDistanceTo(observer.eye())))
                .orElseThrow(() -> new IllegalArgumentException("A scene without lamps gives no place anything"));
    }

    /**
     * The direction beside the lights is level and 10° beside the brightest lamp, on the side where the veil is the
     * weaker: among many lamps the other side may run straight into one.
     */
    private List<Look> aimed(List<Look> asked, DirectLight direct) {
        List<Look> aimed = new ArrayList<>();
        for (Look look : asked) {
            boolean beside = look.id().equals(Look.BESIDE);
            Direction direction = beside && scene.lamps().size() > 1 ? beside(direct) : look.direction();
            aimed.add(new Look(look.id(), look.purpose(), direction));
            if (beside) {
                keepVeils(direct, veil(direct, direction));
            }
        }
        return List.copyOf(aimed);
    }

    private Direction beside(DirectLight direct) {
        double toLamp = observer.eye().bearingTo(brightest.position());
        Direction right = Direction.toward(toLamp + Look.BESIDE_RAD, 0);
        Direction left = Direction.toward(toLamp - Look.BESIDE_RAD, 0);
        return veil(direct, left).veilCdM2() < veil(direct, right).veilCdM2() ? left : right;
    }

    private DirectLight.Sum veil(DirectLight direct, Direction look) {
        DirectLight.Sum sum = new DirectLight.Sum();
        direct.at(observer, look, PlaceNumbers::veilPerLux, sum);
        return sum;
    }

    private void keepVeils(DirectLight direct, DirectLight.Sum sum) {
        for (int type = 0; type < direct.types().size(); type++) {
            byTypeOf(direct.types().get(type))[2] = sum.veilCdM2(type);
        }
    }

    private void setPlanes() {
        DirectLight direct = lights.direct();
        worstOfPane = observer.eye();
        UprightPlane plane = direct.brightestPlane(observer);
        set(Measure.WORST_PLANE, plane.illuminanceLx());
        if (plane.illuminanceLx() > 0) {
            set(Measure.WORST_PLANE_FACING, plane.facingDeg());
        }
        observer.pane().ifPresent(pane -> {
            DirectLight.Sum sum = new DirectLight.Sum();
            double most = -1;
            for (Position point : Panes.points(observer, pane, PANE_POINTS)) {
                direct.at(observer.at(point), Direction.UP, DirectLight.Veil.NONE, sum);
                if (sum.windowLx() > most) {
                    most = sum.windowLx();
                    worstOfPane = point;
                }
            }
            set(Measure.WINDOW_WORST, most);
        });
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

    private void road(double[] numbers, DirectLight.Sum sum) {
        numbers[Measure.ROAD_VEIL.ordinal()] = sum.veilInVacuumCdM2();
        observer.roadLuminanceCdM2()
                .ifPresent(adapted -> numbers[Measure.THRESHOLD_INCREMENT.ordinal()] =
                        ThresholdIncrement.percent(new Luminance(sum.veilInVacuumCdM2()), new Luminance(adapted)));
    }

    private void sky(double[] numbers, Look look, SkyLight light) {
        NaturalBackground natural = natural();
        double zenithAngle = zenithAngleDeg(look);
        double ratio = light.johnsonV() / natural.johnsonVRadianceAt(zenithAngle);
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

    /**
     * The sky as it is, and the sky with the lights over it. A reading overhead tells how much light there is beside
     * nature and the lamps that were entered; the same share of the natural sky is taken everywhere.
     */
    private void present(double[] numbers, Look look, SkyLight after, SkyLight now) {
        NaturalBackground natural = natural();
        double zenithAngle = zenithAngleDeg(look);
        double naturalV = natural.johnsonVRadianceAt(zenithAngle);
        double other = otherLight();
        double presentRatio = other + now.johnsonV() / naturalV;
        double afterRatio = other + after.johnsonV() / naturalV;
        double naturalMag = numbers[Measure.SKY_NATURAL_BRIGHTNESS.ordinal()];
        double naturalCdM2 = numbers[Measure.SKY_NATURAL.ordinal()];
        double present = naturalMag - NaturalBackground.brighteningMag(presentRatio);
        double with = naturalMag - NaturalBackground.brighteningMag(afterRatio);
        numbers[Measure.SKY_PRESENT.ordinal()] = naturalCdM2 * (1 + other) + now.artificialCdM2();
        numbers[Measure.SKY_LUMINANCE.ordinal()] = naturalCdM2 * (1 + other) + after.artificialCdM2();
        numbers[Measure.SKY_PRESENT_BRIGHTNESS.ordinal()] = present;
        numbers[Measure.SKY_BRIGHTNESS.ordinal()] = with;
        numbers[Measure.SKY_INCREASE_OVER_PRESENT.ordinal()] = 100 * (afterRatio - presentRatio) / (1 + presentRatio);
        numbers[Measure.LIMIT_PRESENT.ordinal()] = faintestStar(present);
        numbers[Measure.LIMIT.ordinal()] = faintestStar(with);
        numbers[Measure.STARS_PRESENT.ordinal()] = starsAbove(faintestStar(present));
        numbers[Measure.STARS.ordinal()] = starsAbove(faintestStar(with));
    }

    /** Light of towns and the like in natural skies, as a reading overhead leaves it; 0 where there is no reading. */
    double otherLight() {
        Double known = otherLight;
        if (known == null) {
            known = readOtherLight();
            otherLight = known;
        }
        return known;
    }

    private double readOtherLight() {
        return scene.present().stream()
                .flatMapToDouble(present -> present.zenithMagArcsec2().stream())
                .map(reading -> {
                    NaturalBackground natural = natural();
                    double all = StrictMath.pow(10, 0.4 * (natural.zenith().magArcsec2() - reading)) - 1;
                    Look zenith = new Look(Look.ZENITH, Look.Purpose.SKY, Direction.UP);
                    return Math.max(0, all - over.atPresent(zenith).johnsonV() / natural.johnsonVRadianceAt(0));
                })
                .findFirst()
                .orElse(0);
    }

    private static double zenithAngleDeg(Look look) {
        return Math.min(90, look.zenithAngleDeg());
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

    /** The veil of one lux facing the lamp, in the plane of a driver's eye; none outside the angles standards use. */
    private static double roadVeilPerLux(double angleDeg) {
        return ROAD_VEIL.validity().contains(angleDeg)
                ? ROAD_VEIL.perLux(angleDeg) * StrictMath.cos(StrictMath.toRadians(angleDeg))
                : 0;
    }

    private void set(Measure measure, double value) {
        ofPlace[measure.ordinal()] = value;
    }

    double get(Measure measure) {
        if (worstOfPane == null && OF_PLANES.contains(measure)) {
            setPlanes();
        }
        return ofPlace[measure.ordinal()];
    }

    double get(Measure measure, int look) {
        return looked(look).numbers()[measure.ordinal()];
    }

    private double[] byTypeOf(String type) {
        double[] found = byType.get(type);
        if (found == null) {
            throw new IllegalArgumentException("No lamp is of type " + type);
        }
        return found;
    }

    /** What each type adds, in the order of the lamps. */
    List<Contribution> contributions() {
        Map<String, Map<String, Double>> sky = new LinkedHashMap<>();
        for (int i = 0; i < looks.size(); i++) {
            if (looks.get(i).purpose() == Look.Purpose.SKY) {
                sky.put(looks.get(i).id(), sky(i).byTypeCdM2());
            }
        }
        return contributions(sky);
    }

    /** The same for a place that is not looked at itself: of the sky at most what is overhead, and within 1 %. */
    List<Contribution> shares(boolean overhead) {
        if (overhead && overheadShares == null) {
            overheadShares = over.sharesAlong(new Look(Look.ZENITH, Look.Purpose.SKY, Direction.UP))
                    .byTypeCdM2();
        }
        return contributions(overheadShares == null ? Map.of() : Map.of(Look.ZENITH, overheadShares));
    }

    private List<Contribution> contributions(Map<String, Map<String, Double>> skyByLook) {
        List<Contribution> contributions = new ArrayList<>();
        byType.forEach((type, sums) -> {
            Map<String, Double> bySky = new LinkedHashMap<>();
            skyByLook.forEach((look, sky) -> bySky.put(look, sky.getOrDefault(type, 0.0)));
            contributions.add(new Contribution(observer.mark(), type, sums[0], sums[1], sums[2], bySky));
        });
        return contributions;
    }

    SkyLight sky(int look) {
        return looked(look).sky();
    }

    SkyLight skyNow(int look) {
        return looked(look).skyNow();
    }

    /** The directions looked in, as they were aimed. */
    List<Look> looks() {
        return looks;
    }

    /** Positions of lamps that the entered ground hides. */
    int hidden() {
        return hidden;
    }

    /** The point of the window that gets most. */
    Position worstOfPane() {
        if (worstOfPane == null) {
            setPlanes();
        }
        return Objects.requireNonNull(worstOfPane);
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
