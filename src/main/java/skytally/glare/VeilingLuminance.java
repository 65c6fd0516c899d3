package skytally.glare;

import skytally.citation.Bibliography;
import skytally.citation.Citation;
import skytally.photometry.Illuminance;
import skytally.photometry.Luminance;

/**
 * Equivalent veiling luminance: the even veil that hides as much as the light scattered in the eye does.
 * <pre>
 *   L_v = Σ E_i f(θ_i)        E_i at the eye, lx;  θ_i between line of sight and lamp, degrees
 * </pre>
 * Veils add, and a veil adds to the background it lies over, but it is inside one person's eye: never part of the sky.
 *
 * <p>Forms of f differ by 10-40 %, and people by more: print two figures and the form. The forms are those of the fovea.
 */
public sealed interface VeilingLuminance {

    /** Beyond this, brow and cheek and the pigment of the eye decide; no veil is printed. Degrees. */
    double WIDEST_PRINTED_DEG = 60;

    /** f(θ) without looking at the range; θ in degrees, result in cd/m² per lx. */
    double unchecked(double angleDeg);

    /** The angles this form holds for. */
    AngleRange validity();

    /** As printed beside a result. */
    String label();

    Citation citation();

    /**
     * f(θ), cd/m² per lx.
     *
     * @param angleDeg within {@link #validity()}
     * @throws IllegalArgumentException outside it; the message names the range
     */
    default double perLux(double angleDeg) {
        if (!validity().contains(angleDeg)) {
            throw new IllegalArgumentException(
                    label() + " holds from " + validity() + " between line of sight and lamp, not at " + angleDeg);
        }
        return unchecked(angleDeg);
    }

    /**
     * The veil of one lamp.
     *
     * @param atEye    facing the lamp for the naked-eye veil; in the plane of the eye (times cos θ) for TI and GR
     * @param angleDeg between the line of sight and the lamp, within {@link #validity()}
     */
    default Luminance from(Illuminance atEye, double angleDeg) {
        return new Luminance(atEye.lux() * perLux(angleDeg));
    }

    /**
     * How near to the lamp one must look for its veil to exceed a luminance, such as that of the natural sky. Every form
     * falls with angle, so there is one such angle at most.
     *
     * @param atEye   of the lamp, no cosine applied
     * @param compare more than 0
     */
    default VeilReach angleWhereVeilEquals(Illuminance atEye, Luminance compare) {
        if (!(compare.candelaPerSquareMetre() > 0)) {
            throw new IllegalArgumentException("A veil is compared with some light, not with none");
        }
        AngleRange range = validity();
        if (from(atEye, range.fromDeg()).compareTo(compare) <= 0) {
            return new VeilReach.Nowhere(range);
        }
        if (from(atEye, range.toDeg()).compareTo(compare) > 0) {
            return new VeilReach.Throughout(range);
        }
        return new VeilReach.Within(angleWhere(compare.candelaPerSquareMetre() / atEye.lux()));
    }

    /** The angle in degrees where f has this value; the caller has made sure it lies in the range. */
    private double angleWhere(double perLux) {
        double brighterDeg = validity().fromDeg();
        double darkerDeg = validity().toDeg();
        for (double middleDeg = (brighterDeg + darkerDeg) / 2;
                middleDeg > brighterDeg && middleDeg < darkerDeg;
                middleDeg = (brighterDeg + darkerDeg) / 2) {
            if (unchecked(middleDeg) > perLux) {
                brighterDeg = middleDeg;
            } else {
                darkerDeg = middleDeg;
            }
        }
        return darkerDeg;
    }

    /** Stiles and Holladay's {@code 10 / θ²}: the classic, and what lighting standards use. */
    enum StilesHolladay implements VeilingLuminance {
        /** In the range of the measurements, 1-30 degrees. */
        CLASSIC(new AngleRange(1, 30)),
        /** In the range road and area standards use it, 1.5-60 degrees. */
        IN_STANDARDS(new AngleRange(1.5, 60));

        private final AngleRange validity;

        StilesHolladay(AngleRange validity) {
            this.validity = validity;
        }

        @Override
        public double unchecked(double angleDeg) {
            return 10 / (angleDeg * angleDeg);
        }

        @Override
        public AngleRange validity() {
            return validity;
        }

        @Override
        public String label() {
            return "Stiles-Holladay";
        }

        @Override
        public Citation citation() {
            return Bibliography.cite("stiles-holladay");
        }

        /** θ = √(10 E / L), closed. */
        public double unboundedAngleDeg(Illuminance atEye, Luminance compare) {
            return Math.sqrt(10 * atEye.lux() / compare.candelaPerSquareMetre());
        }
    }

    /**
     * {@code 10 [1 + (A / 70)⁴] / θ²}, 1-30 degrees.
     *
     * @param ageYears A, 20 to 80
     */
    record AgeAdjustedStilesHolladay(double ageYears) implements VeilingLuminance {

        private static final AngleRange VALIDITY = new AngleRange(1, 30);

        public AgeAdjustedStilesHolladay {
            Eyes.requireAge(ageYears);
        }

        @Override
        public double unchecked(double angleDeg) {
            return 10 * (1 + Eyes.fourthPower(ageYears / 70)) / (angleDeg * angleDeg);
        }

        @Override
        public AngleRange validity() {
            return VALIDITY;
        }

        @Override
        public String label() {
            return "Age-adjusted Stiles-Holladay";
        }

        @Override
        public Citation citation() {
            return Bibliography.cite("vos-2003");
        }
    }

    /**
     * {@code 10 / θ³ + (5 / θ²) [1 + (A / 62.5)⁴]}, 0.1-30 degrees: below the angles where the colour of the eye matters.
     *
     * @param ageYears A, 20 to 80
     */
    record CieSmallAngle(double ageYears) implements VeilingLuminance {

        private static final AngleRange VALIDITY = new AngleRange(0.1, 30);

        public CieSmallAngle {
            Eyes.requireAge(ageYears);
        }

        @Override
        public double unchecked(double angleDeg) {
            double squared = angleDeg * angleDeg;
            return 10 / (squared * angleDeg) + 5 / squared * Eyes.cieAgeFactor(ageYears);
        }

        @Override
        public AngleRange validity() {
            return VALIDITY;
        }

        @Override
        public String label() {
            return "CIE Small Angle";
        }

        @Override
        public Citation citation() {
            return Bibliography.cite("cie-146");
        }
    }

    /**
     * {@code 10 / θ³ + [5 / θ² + 0.1 p / θ] [1 + (A / 62.5)⁴] + 0.0025 p}, 0.1-100 degrees.
     *
     * @param ageYears A, 20 to 80
     * @param pigment  p: 0 very dark, 0.5 brown, 1.0 blue, 1.2 very light eyes; matters above 30 degrees
     */
    record CieGeneral(double ageYears, double pigment) implements VeilingLuminance {

        /** What the tool prints: an observer of 35 with brown eyes. */
        public static final CieGeneral DEFAULT = new CieGeneral(35, 0.5);

        private static final AngleRange VALIDITY = new AngleRange(0.1, 100);

        public CieGeneral {
            Eyes.requireAge(ageYears);
            if (!(pigment >= 0 && pigment <= 1.2)) {
                throw new IllegalArgumentException(
                        "The pigment factor is 0 (very dark eyes) to 1.2 (very light), not " + pigment);
            }
        }

        @Override
        public double unchecked(double angleDeg) {
            double inverse = 1 / angleDeg;
            return inverse * inverse * inverse * 10
                    + inverse * (5 * inverse + 0.1 * pigment) * Eyes.cieAgeFactor(ageYears)
                    + 0.0025 * pigment;
        }

        @Override
        public AngleRange validity() {
            return VALIDITY;
        }

        @Override
        public String label() {
            return "CIE General";
        }

        @Override
        public Citation citation() {
            return Bibliography.cite("cie-146");
        }
    }
}
