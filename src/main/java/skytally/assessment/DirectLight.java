package skytally.assessment;

import java.util.Arrays;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.DirectPath;
import skytally.atmosphere.ExponentialLayer;
import skytally.atmosphere.Molecules;
import skytally.geometry.Arcsine;
import skytally.geometry.Direction;
import skytally.geometry.Position;
import skytally.geometry.Rotation;
import skytally.luminaire.IntensityDistribution;
import skytally.scene.GroundLine;
import skytally.scene.Lamp;
import skytally.scene.Observer;
import skytally.spectrum.Spectrum;

/**
 * Direct light of many lamps at one place after another: {@code E = Σ n I T / d²}. Lamps are held as a structure of
 * arrays, and nothing is made anew in the loop.
 *
 * <p>Lines of sight run over the Earth enlarged for mean refraction; a lamp behind the horizon adds nothing.
 */
public final class DirectLight {

    private static final double EARTH = DirectPath.EFFECTIVE_EARTH_RADIUS_M;
    private static final double DEGREES_PER_RADIAN = 180 / Math.PI;

    private final int lamps;
    private final double[] east;
    private final double[] north;
    private final double[] height;
    private final double[] horizon;
    private final double[] moleculesAtLamp; // density, 1 at the ground
    private final double[] hazeAtLamp;
    private final double[] turn; // nine for each lamp: from the world's frame to its own, row by row
    private final double[] lumens;
    private final double[] count;
    private final IntensityDistribution[] light;
    private final LuminousTransmission[] passed;
    private final int[] type;
    private final List<String> types;
    private final List<Lamp> scene;
    private final double aerosolHeight;

    /**
     * @param scene the lamps
     * @param air   what their light comes through on its way to an eye
     */
    public DirectLight(List<Lamp> scene, Atmosphere air) {
        this.scene = List.copyOf(scene);
        lamps = scene.size();
        east = new double[lamps];
        north = new double[lamps];
        height = new double[lamps];
        horizon = new double[lamps];
        moleculesAtLamp = new double[lamps];
        hazeAtLamp = new double[lamps];
        turn = new double[9 * lamps];
        lumens = new double[lamps];
        count = new double[lamps];
        light = new IntensityDistribution[lamps];
        passed = new LuminousTransmission[lamps];
        type = new int[lamps];
        Map<String, Integer> typeIndex = new LinkedHashMap<>();
        aerosolHeight = air.aerosol().scaleHeightM();
        Map<Spectrum, LuminousTransmission> shared = new HashMap<>();
        for (int i = 0; i < lamps; i++) {
            Lamp lamp = scene.get(i);
            east[i] = lamp.position().eastM();
            north[i] = lamp.position().northM();
            height[i] = lamp.position().heightM();
            horizon[i] = DirectPath.horizonDistanceM(height[i]);
            moleculesAtLamp[i] = ExponentialLayer.density(Molecules.SCALE_HEIGHT_M, height[i]);
            hazeAtLamp[i] = ExponentialLayer.density(aerosolHeight, height[i]);
            lumens[i] = lamp.flux().lumens();
            count[i] = lamp.count();
            light[i] = lamp.light();
            passed[i] = shared.computeIfAbsent(lamp.spectrum(), spectrum -> new LuminousTransmission(spectrum, air));
            type[i] = typeIndex.computeIfAbsent(lamp.type(), mark -> typeIndex.size());
            store(lamp.attitude().rotation().inverse(), 9 * i);
        }
        types = List.copyOf(typeIndex.keySet());
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

    /** Marks of the luminaire types, in the order of the sums by type. */
    public List<String> types() {
        return types;
    }

    /** What one eye gets; filled anew by {@link #at}. */
    public static final class Sum {

        private double seenLx;
        private double inVacuumLx;
        private double windowLx;
        private double levelLx;
        private double veilCdM2;
        private double veilInVacuumCdM2;
        private int hidden;
        private double[] seenByType = new double[0];
        private double[] windowByType = new double[0];
        private double[] veilByType = new double[0];
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

        /** On a level plane at the eye, facing up, with nothing taken by the air, in lux. */
        public double levelLx() {
            return levelLx;
        }

        /** Veil over the direction looked in, cd/m²; 0 where none was asked for. */
        public double veilCdM2() {
            return veilCdM2;
        }

        /** The same with nothing taken by the air, as limits count it, cd/m². */
        public double veilInVacuumCdM2() {
            return veilInVacuumCdM2;
        }

        /** How many positions the ground hides that would be seen over a bare Earth. */
        public int hidden() {
            return hidden;
        }

        /** {@link #seenLx()} of one type, by its index in {@link DirectLight#types()}. */
        public double seenLx(int type) {
            return seenByType[type];
        }

        /** {@link #windowLx()} of one type. */
        public double windowLx(int type) {
            return windowByType[type];
        }

        /** {@link #veilCdM2()} of one type. */
        public double veilCdM2(int type) {
            return veilByType[type];
        }

        private void clear(int types) {
            seenLx = 0;
            inVacuumLx = 0;
            windowLx = 0;
            levelLx = 0;
            veilCdM2 = 0;
            veilInVacuumCdM2 = 0;
            hidden = 0;
            brightestLx = 0;
            brightest = -1;
            if (seenByType.length != types) {
                seenByType = new double[types];
                windowByType = new double[types];
                veilByType = new double[types];
            }
            Arrays.fill(seenByType, 0);
            Arrays.fill(windowByType, 0);
            Arrays.fill(veilByType, 0);
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

        /** No veil is asked for. */
        Veil NONE = angleDeg -> 0;

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
        each(eye, facing, GroundLine.OPEN, look, veil, sum, null);
    }

    /** The same where ground may hide some of the lamps. */
    public void at(Observer observer, Direction look, Veil veil, Sum sum) {
        each(observer.eye(), observer.facing(), observer.ground(), look, veil, sum, null);
    }

    /** The upright plane that gets most from all lamps together, of the 360 that face a whole degree. */
    public UprightPlane brightestPlane(Observer observer) {
        UprightPlane.Search search = new UprightPlane.Search();
        each(observer.eye(), observer.facing(), observer.ground(), Direction.UP, Veil.NONE, new Sum(), search);
        return search.found();
    }

    private void each(
            Position eye,
            Direction facing,
            GroundLine ground,
            Direction look,
            Veil veil,
            Sum sum,
            UprightPlane.@Nullable Search planes) {
        sum.clear(types.size());
        boolean bare = ground.points().isEmpty();
        boolean veiled = veil != Veil.NONE;
        double eyeHeight = eye.heightM();
        double eyeRadius = EARTH + eyeHeight;
        double eyeHorizon = DirectPath.horizonDistanceM(eyeHeight);
        double eyeMolecules = ExponentialLayer.density(Molecules.SCALE_HEIGHT_M, eyeHeight);
        double eyeHaze = ExponentialLayer.density(aerosolHeight, eyeHeight);
        for (int i = 0; i < lamps; i++) {
            double dx = eye.eastM() - east[i];
            double dy = eye.northM() - north[i];
            double groundSquared = dx * dx + dy * dy;
            double view = horizon[i] + eyeHorizon;
            if (groundSquared > view * view) {
                continue;
            }
            // φ is the angle at the Earth's centre; sin φ / φ and 2 (1 − cos φ) by their series, φ being small
            double turnSquared = groundSquared / (EARTH * EARTH);
            double sine = 1 - turnSquared * (1 - turnSquared / 20) / 6;
            double drop = turnSquared * (1 - turnSquared * (1 - turnSquared / 30) / 12);
            double lampRadius = EARTH + height[i];
            double rise = height[i] - eyeHeight;
            double inverse = 1 / Math.sqrt(rise * rise + drop * lampRadius * eyeRadius);
            if (inverse == Double.POSITIVE_INFINITY) {
                throw new IllegalArgumentException("Lamp and eye must be apart");
            }
            double upAtLamp = -(rise + eyeRadius * drop / 2) * inverse;
            double level = eyeRadius / EARTH * sine * inverse;
            double x = dx * level;
            double y = dy * level;
            int at = 9 * i;
            double perLumen = light[i].perLumen(
                    turn[at] * x + turn[at + 1] * y + turn[at + 2] * upAtLamp,
                    turn[at + 3] * x + turn[at + 4] * y + turn[at + 5] * upAtLamp,
                    turn[at + 6] * x + turn[at + 7] * y + turn[at + 8] * upAtLamp);
            if (perLumen == 0) {
                continue;
            }
            if (!bare && ground.hides(scene.get(i).position(), eye)) {
                sum.hidden++;
                continue;
            }
            double oneInVacuum = lumens[i] * perLumen * inverse * inverse;
            double distance = 1 / inverse;
            double molecules = ExponentialLayer.between(
                    Molecules.SCALE_HEIGHT_M, lampRadius, upAtLamp, distance, moleculesAtLamp[i], eyeMolecules);
            double haze =
                    ExponentialLayer.between(aerosolHeight, lampRadius, upAtLamp, distance, hazeAtLamp[i], eyeHaze);
            double one = oneInVacuum * passed[i].through(molecules, haze);
            if (one > sum.brightestLx && count[i] > 0) {
                sum.brightestLx = one;
                sum.brightest = i;
            }
            double upAtEye = (rise - lampRadius * drop / 2) * inverse;
            double levelAtEye = -lampRadius / EARTH * sine * inverse;
            double towardX = dx * levelAtEye;
            double towardY = dy * levelAtEye;
            double onWindow = facing.x() * towardX + facing.y() * towardY + facing.z() * upAtEye;
            double allInVacuum = count[i] * oneInVacuum;
            double window = allInVacuum * Math.max(0, onWindow);
            double seen = count[i] * one;
            sum.inVacuumLx += allInVacuum;
            sum.windowLx += window;
            sum.levelLx += allInVacuum * Math.max(0, upAtEye);
            sum.seenLx += seen;
            sum.windowByType[type[i]] += window;
            sum.seenByType[type[i]] += seen;
            if (veiled) {
                double perLux = veil.perLux(angleDeg(look, towardX, towardY, upAtEye));
                sum.veilCdM2 += seen * perLux;
                sum.veilInVacuumCdM2 += allInVacuum * perLux;
                sum.veilByType[type[i]] += seen * perLux;
            }
            if (planes != null) {
                planes.add(allInVacuum * towardX, allInVacuum * towardY);
            }
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
        double angle = 2 * DEGREES_PER_RADIAN * Arcsine.of(half);
        return near ? angle : 180 - angle;
    }
}
