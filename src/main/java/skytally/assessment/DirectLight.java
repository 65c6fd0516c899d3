package skytally.assessment;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.DirectPath;
import skytally.atmosphere.ExponentialLayer;
import skytally.atmosphere.Molecules;
import skytally.geometry.Direction;
import skytally.geometry.Position;
import skytally.geometry.Rotation;
import skytally.luminaire.IntensityDistribution;
import skytally.scene.Lamp;
import skytally.spectrum.Spectrum;

/**
 * Direct light of many lamps at one place after another: {@code E = Σ n I T / d²}. Lamps are held as a structure of
 * arrays, and nothing is made anew in the loop.
 *
 * <p>Lines of sight run over the Earth enlarged for mean refraction; a lamp behind the horizon adds nothing.
 */
public final class DirectLight {

    private static final double EARTH = DirectPath.EFFECTIVE_EARTH_RADIUS_M;

    private final int lamps;
    private final double[] east;
    private final double[] north;
    private final double[] height;
    private final double[] horizon;
    private final double[] turn; // nine for each lamp: from the world's frame to its own, row by row
    private final double[] lumens;
    private final double[] count;
    private final IntensityDistribution[] light;
    private final LuminousTransmission[] passed;
    private final double aerosolHeight;

    /**
     * @param scene the lamps
     * @param air   what their light comes through on its way to an eye
     */
    public DirectLight(List<Lamp> scene, Atmosphere air) {
        lamps = scene.size();
        east = new double[lamps];
        north = new double[lamps];
        height = new double[lamps];
        horizon = new double[lamps];
        turn = new double[9 * lamps];
        lumens = new double[lamps];
        count = new double[lamps];
        light = new IntensityDistribution[lamps];
        passed = new LuminousTransmission[lamps];
        aerosolHeight = air.aerosol().scaleHeightM();
        Map<Spectrum, LuminousTransmission> shared = new HashMap<>();
        for (int i = 0; i < lamps; i++) {
            Lamp lamp = scene.get(i);
            east[i] = lamp.position().eastM();
            north[i] = lamp.position().northM();
            height[i] = lamp.position().heightM();
            horizon[i] = DirectPath.horizonDistanceM(height[i]);
            lumens[i] = lamp.flux().lumens();
            count[i] = lamp.count();
            light[i] = lamp.light();
            passed[i] = shared.computeIfAbsent(lamp.spectrum(), spectrum -> new LuminousTransmission(spectrum, air));
            store(lamp.attitude().rotation().inverse(), 9 * i);
        }
    }

    private void store(Rotation toOwn, int at) {
        turn[at] = toOwn.xx();
        turn[at + 1] = toOwn.xy();
        turn[at + 2] = toOwn.xz();
        turn[at + 3] = toOwn.yx();
        turn[at + 4] = toOwn.yy();
        turn[at + 5] = toOwn.yz();
        turn[at + 6] = toOwn.zx();
        turn[at + 7] = toOwn.zy();
        turn[at + 8] = toOwn.zz();
    }

    /** What one eye gets; filled anew by {@link #at}. */
    public static final class Sum {

        private double seenLx;
        private double inVacuumLx;
        private double windowLx;
        private double veilCdM2;
        private double brightestLx;
        private int brightest;

        /** All together on a plane facing each lamp, through the air, in lux. */
        public double seenLx() {
            return seenLx;
        }

        /** The same with nothing taken by the air, as limits count it, in lux. */
        public double inVacuumLx() {
            return inVacuumLx;
        }

        /** On the plane the observer's window lies in, with nothing taken by the air, in lux. */
        public double windowLx() {
            return windowLx;
        }

        /** Veil over the direction looked in, cd/m²; 0 where none was asked for. */
        public double veilCdM2() {
            return veilCdM2;
        }

        /** Light of the brightest single lamp through the air, in lux. */
        public double brightestLx() {
            return brightestLx;
        }

        /** Index of the brightest single lamp in the list; −1 when none is seen. */
        public int brightest() {
            return brightest;
        }
    }

    /** How strongly one lux at an angle veils: cd/m² per lx. */
    public interface Veil {

        /** {@code Lv / E} at an angle between the light and the line of sight, in degrees; 0 outside its validity. */
        double perLux(double angleDeg);
    }

    /**
     * Fills a sum with what an eye gets.
     *
     * @param eye    where it is
     * @param facing outward normal of the window it looks through
     * @param look   the direction looked in, for the veil
     * @param veil   how light beside that direction veils it
     * @param sum    to be filled
     */
    public void at(Position eye, Direction facing, Direction look, Veil veil, Sum sum) {
        sum.seenLx = 0;
        sum.inVacuumLx = 0;
        sum.windowLx = 0;
        sum.veilCdM2 = 0;
        sum.brightestLx = 0;
        sum.brightest = -1;
        double eyeHorizon = DirectPath.horizonDistanceM(eye.heightM());
        for (int i = 0; i < lamps; i++) {
            double dx = eye.eastM() - east[i];
            double dy = eye.northM() - north[i];
            double ground = Math.sqrt(dx * dx + dy * dy);
            if (ground > horizon[i] + eyeHorizon) {
                continue;
            }
            double half = ground / (2 * EARTH);
            half -= half * half * half / 6; // sine of a small angle
            double rise = height[i] - eye.heightM();
            double squared = rise * rise + 4 * (EARTH + height[i]) * (EARTH + eye.heightM()) * half * half;
            double distance = Math.sqrt(squared);
            double sineAtLamp = -(rise + (EARTH + eye.heightM()) * 2 * half * half) / distance;
            double level = ground == 0 ? 0 : Math.sqrt(1 - sineAtLamp * sineAtLamp) / ground;
            double x = dx * level;
            double y = dy * level;
            int at = 9 * i;
            double perLumen = light[i].perLumen(
                    turn[at] * x + turn[at + 1] * y + turn[at + 2] * sineAtLamp,
                    turn[at + 3] * x + turn[at + 4] * y + turn[at + 5] * sineAtLamp,
                    turn[at + 6] * x + turn[at + 7] * y + turn[at + 8] * sineAtLamp);
            if (perLumen == 0) {
                continue;
            }
            double oneInVacuum = lumens[i] * perLumen / squared;
            double molecules = ExponentialLayer.on(EARTH, Molecules.SCALE_HEIGHT_M, height[i], sineAtLamp, distance);
            double haze = ExponentialLayer.on(EARTH, aerosolHeight, height[i], sineAtLamp, distance);
            double one = oneInVacuum * passed[i].through(molecules, haze);
            if (one > sum.brightestLx && count[i] > 0) {
                sum.brightestLx = one;
                sum.brightest = i;
            }
            double sineAtEye = (rise - (EARTH + height[i]) * 2 * half * half) / distance;
            double levelAtEye = ground == 0 ? 0 : -Math.sqrt(1 - sineAtEye * sineAtEye) / ground;
            double towardX = dx * levelAtEye;
            double towardY = dy * levelAtEye;
            double onWindow = facing.x() * towardX + facing.y() * towardY + facing.z() * sineAtEye;
            sum.inVacuumLx += count[i] * oneInVacuum;
            sum.windowLx += count[i] * oneInVacuum * Math.max(0, onWindow);
            sum.seenLx += count[i] * one;
            sum.veilCdM2 += count[i] * one * veil.perLux(angleDeg(look, towardX, towardY, sineAtEye));
        }
    }

    /** Angle between two unit directions, from half the chord between them or between one and the other's opposite. */
    private static double angleDeg(Direction look, double x, double y, double z) {
        boolean near = look.x() * x + look.y() * y + look.z() * z >= 0;
        double sign = near ? -1 : 1;
        double chordX = look.x() + sign * x;
        double chordY = look.y() + sign * y;
        double chordZ = look.z() + sign * z;
        double half = Math.sqrt(chordX * chordX + chordY * chordY + chordZ * chordZ) / 2;
        double angle = 2 * Math.asin(Math.min(1, half));
        return Math.toDegrees(near ? angle : Math.PI - angle);
    }
}
