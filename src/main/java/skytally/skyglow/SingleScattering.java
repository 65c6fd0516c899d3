package skytally.skyglow;

import java.util.Arrays;
import java.util.List;
import org.hipparchus.analysis.integration.gauss.GaussIntegrator;
import org.hipparchus.analysis.integration.gauss.GaussIntegratorFactory;
import skytally.atmosphere.Aerosol;
import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.ExponentialLayer;
import skytally.atmosphere.Molecules;

/**
 * The sky's brightness from light scattered once, exactly: for a line of sight P(s) = O + s v and a light at S
 * <pre>
 *   L = ∫ I(S→P) / |SP|² · exp(−τ(S,P)) · [ β_m p_m(γ) + ω β_a p_a(γ) ](P) · exp(−τ(P,O)) ds
 * </pre>
 * with γ the angle the light is turned by, over a round Earth. Nothing reaches P from behind the Earth's curve.
 *
 * <p>The line is cut at every edge of the emission; in each piece, with s₀ the point nearest the light and q the
 * distance there, s = s₀ + q sinh y turns the peak near the light into a gentle slope for Gauss and Legendre's rule.
 * Light scattered more than once is not in it, so read every result as "at least".
 *
 * @see "Garstang, R. H. (1986), Model for artificial night-sky illumination, PASP 98, 364: the geometry of single
 *     scattering of a city's light"
 */
public final class SingleScattering {

    private static final int NODES = 12;
    /** Longest stretch of y that one set of nodes covers. */
    private static final double PANEL = 2.4;

    private static final double[] NODE = new double[NODES];
    private static final double[] WEIGHT = new double[NODES];

    static {
        GaussIntegrator rule = new GaussIntegratorFactory().legendre(NODES);
        for (int i = 0; i < NODES; i++) {
            NODE[i] = rule.getPoint(i);
            WEIGHT[i] = rule.getWeight(i);
        }
    }

    private static final double EARTH = Atmosphere.EARTH_RADIUS_M;
    private static final double MOLECULES_HEIGHT = Molecules.SCALE_HEIGHT_M;

    private final Aerosol aerosol;
    private final double aerosolHeight;
    private final double[] molecularDepth;
    private final double[] aerosolDepth;

    /**
     * @param air           the atmosphere between light and viewer
     * @param wavelengthsNm the wavelengths to work at, in nanometres
     */
    public SingleScattering(Atmosphere air, double... wavelengthsNm) {
        this(
                air.aerosol(),
                Arrays.stream(wavelengthsNm).map(air::molecularOpticalDepth).toArray(),
                Arrays.stream(wavelengthsNm).map(air.aerosol()::opticalDepth).toArray());
    }

    /** With the optical depths of both layers given outright, one pair for each wavelength. */
    SingleScattering(Aerosol aerosol, double[] molecularDepth, double[] aerosolDepth) {
        this.aerosol = aerosol;
        this.aerosolHeight = aerosol.scaleHeightM();
        this.molecularDepth = molecularDepth;
        this.aerosolDepth = aerosolDepth;
    }

    /**
     * Radiance along a line of sight, for each wavelength.
     *
     * @return per square metre (and per steradian, where the intensity was in watts per steradian): multiply W/sr in
     *     to get W/(m² sr) out, cd in to get cd/m² out
     */
    public double[] radiance(Emission light, Sightline line) {
        return radiance(new Emissions(List.of(light)), line)[0];
    }

    /**
     * Radiance of several lights at one point along the same line of sight, for each light and wavelength. The air is
     * worked out once for all of them.
     *
     * <p>Where there are more edges than a line is worth cutting at, it is cut at none: the kinks of many lights even out
     * to within 2e-4.
     *
     * @return as {@link #radiance(Emission, Sightline)}, light by light
     */
    public double[][] radiance(Emissions lights, Sightline line) {
        double[][] sums = new double[lights.size()][molecularDepth.length];
        new Line(lights, line).addTo(sums);
        return sums;
    }

    /** One line of sight in the frame of the light: x level toward the viewer, y to the left, z up. */
    private final class Line {

        private final Emission[] lights;
        private final List<Emission.Cone> edges;
        private final double[] strength;
        private final double[] passed;
        private final double lightHeight;
        private final double eyeHeight;
        private final double moleculesAtLight; // densities, 1 at the ground
        private final double hazeAtLight;
        private final double moleculesAtEye;
        private final double hazeAtEye;
        private final double eyeX;
        private final double eyeZ; // from the light, not from the ground
        private final double viewX;
        private final double viewY;
        private final double viewZ;
        private final double zenithCosine;
        private final double nearest; // s of the point nearest the light
        private final double nearestDistance;
        private final double end;

        Line(Emissions lights, Sightline line) {
            this.lights = lights.toArray();
            edges = lights.edgesWorthCutting();
            lightHeight = lights.heightM();
            strength = new double[lights.size()];
            passed = new double[molecularDepth.length];
            eyeHeight = line.eyeHeightM();
            moleculesAtLight = ExponentialLayer.density(MOLECULES_HEIGHT, lightHeight);
            hazeAtLight = ExponentialLayer.density(aerosolHeight, lightHeight);
            moleculesAtEye = ExponentialLayer.density(MOLECULES_HEIGHT, eyeHeight);
            hazeAtEye = ExponentialLayer.density(aerosolHeight, eyeHeight);
            double turn = line.groundDistanceM() / EARTH;
            double sine = StrictMath.sin(turn);
            double half = StrictMath.sin(turn / 2);
            eyeX = (EARTH + eyeHeight) * sine;
            eyeZ = eyeHeight - lightHeight - (EARTH + eyeHeight) * 2 * half * half;

            zenithCosine = StrictMath.cos(line.zenithAngleRad());
            double zenithSine = StrictMath.sin(line.zenithAngleRad());
            double towardLight = zenithSine * StrictMath.cos(line.azimuthRad());
            double cosine = 1 - 2 * half * half;
            viewX = -towardLight * cosine + zenithCosine * sine;
            viewY = zenithSine * StrictMath.sin(line.azimuthRad());
            viewZ = towardLight * sine + zenithCosine * cosine;

            nearest = -(eyeX * viewX + eyeZ * viewZ);
            double apartSquared = eyeX * eyeX + eyeZ * eyeZ;
            double least = 1e-12 * apartSquared;
            nearestDistance = Math.sqrt(Math.max(apartSquared - nearest * nearest, least));
            end = lengthInAir();
        }

        /** To the top of the air, or to the ground where the line runs into it. */
        private double lengthInAir() {
            double radius = EARTH + eyeHeight;
            double along = radius * zenithCosine;
            double lowestSquared = radius * radius - along * along;
            if (zenithCosine < 0 && lowestSquared < EARTH * EARTH) {
                // (R + h)² − R² written out, so that nothing is lost to rounding near the ground
                double toGround = eyeHeight * (2 * EARTH + eyeHeight);
                return toGround / (-along + Math.sqrt(along * along - toGround));
            }
            double top = EARTH + Atmosphere.TOP_M;
            return -along + Math.sqrt(along * along + top * top - radius * radius);
        }

        void addTo(double[][] sums) {
            double[] cuts = cuts();
            double fromY = yOf(cuts[0]);
            for (int i = 1; i < cuts.length; i++) {
                double toY = yOf(cuts[i]);
                if (toY > fromY) {
                    addPiece(fromY, toY, sums);
                }
                fromY = toY;
            }
        }

        private double yOf(double s) {
            double x = (s - nearest) / nearestDistance;
            // asinh, odd by construction
            return Math.copySign(Math.log(Math.abs(x) + Math.sqrt(x * x + 1)), x);
        }

        private void addPiece(double fromY, double toY, double[][] sums) {
            int panels = Math.max(1, (int) Math.ceil((toY - fromY) / PANEL));
            double half = (toY - fromY) / panels / 2;
            for (int panel = 0; panel < panels; panel++) {
                double middle = fromY + (2 * panel + 1) * half;
                for (int i = 0; i < NODES; i++) {
                    double y = middle + half * NODE[i];
                    double grown = Math.exp(y);
                    double shrunk = 1 / grown;
                    double s = nearest + nearestDistance * (grown - shrunk) / 2;
                    double ds = nearestDistance * (grown + shrunk) / 2 * half * WEIGHT[i];
                    addPoint(s, ds, sums);
                }
            }
        }

        private void addPoint(double s, double ds, double[][] sums) {
            double x = eyeX + s * viewX;
            double y = s * viewY;
            double z = eyeZ + s * viewZ;
            double squared = x * x + y * y + z * z;
            double distance = Math.sqrt(squared);
            double up = z / distance;
            if (isBehindTheEarth(up, distance)) {
                return;
            }
            boolean dark = true;
            for (int k = 0; k < lights.length; k++) {
                strength[k] = lights[k].toward(x / distance, y / distance, up) / squared * ds;
                dark &= strength[k] == 0;
            }
            if (dark) {
                return;
            }
            double cosine = (nearest - s) / distance; // light travels S→P, then P→O along −v
            double height = heightAt(s);
            double moleculesThere = ExponentialLayer.density(MOLECULES_HEIGHT, height);
            double hazeThere = ExponentialLayer.density(aerosolHeight, height);
            double molecularAir =
                    air(MOLECULES_HEIGHT, s, distance, up, moleculesAtLight, moleculesThere, moleculesAtEye);
            double hazyAir = air(aerosolHeight, s, distance, up, hazeAtLight, hazeThere, hazeAtEye);
            double molecules = moleculesThere / MOLECULES_HEIGHT * Molecules.phase(cosine);
            double haze = hazeThere / aerosolHeight * aerosol.singleScatteringAlbedo() * aerosol.phase(cosine);
            for (int i = 0; i < passed.length; i++) {
                double scattered = molecularDepth[i] * molecules + aerosolDepth[i] * haze;
                passed[i] = scattered * Math.exp(-molecularDepth[i] * molecularAir - aerosolDepth[i] * hazyAir);
            }
            for (int k = 0; k < lights.length; k++) {
                for (int i = 0; i < passed.length; i++) {
                    sums[k][i] += strength[k] * passed[i];
                }
            }
        }

        /** Air on the way from the light to a point and on from there to the eye. */
        private double air(
                double scaleHeight, double s, double distance, double up, double atLight, double there, double atEye) {
            return ExponentialLayer.between(scaleHeight, EARTH + lightHeight, up, distance, atLight, there)
                    + ExponentialLayer.between(scaleHeight, EARTH + eyeHeight, zenithCosine, s, atEye, there);
        }

        /** √(r² + 2 r s cos z + s²) − R, written so that nothing is lost to rounding near the ground. */
        private double heightAt(double s) {
            double radius = EARTH + eyeHeight;
            double gained = s * (2 * radius * zenithCosine + s);
            return eyeHeight + gained / (radius + Math.sqrt(radius * radius + gained));
        }

        private boolean isBehindTheEarth(double up, double distance) {
            if (up >= 0) {
                return false;
            }
            double radius = EARTH + lightHeight;
            double toLowest = -radius * up;
            double lowestSquared = radius * radius - toLowest * toLowest;
            return toLowest < distance && lowestSquared < EARTH * EARTH;
        }

        /** Both ends of the line and every edge of the emission between them, in order. */
        private double[] cuts() {
            double[] found = new double[2 + 3 * (edges.size() + 2)];
            int count = 0;
            found[count++] = 0;
            found[count++] = end;
            for (Emission.Cone edge : edges) {
                count = addCuts(edge, found, count);
            }
            count = addCuts(Emission.Cone.aboutZenith(0), found, count);
            double radius = EARTH + lightHeight;
            double dip = -Math.sqrt(lightHeight * (2 * EARTH + lightHeight)) / radius;
            if (dip < 0) {
                count = addCuts(Emission.Cone.aboutZenith(dip), found, count);
            }
            double[] cuts = Arrays.copyOf(found, count);
            Arrays.sort(cuts);
            return cuts;
        }

        /**
         * Where {@code (P · axis)² = cosine² |P|²}; a plane gives a linear equation, not a double root. A cone is also
         * cut where the line comes nearest its axis, for a beam may graze the line without its edge reaching it.
         */
        private int addCuts(Emission.Cone edge, double[] found, int count) {
            double atEye = eyeX * edge.axisAhead() + eyeZ * edge.axisUp();
            double gain = viewX * edge.axisAhead() + viewY * edge.axisLeft() + viewZ * edge.axisUp();
            if (edge.cosine() == 0) {
                return addCut(-atEye / gain, found, count);
            }
            double apartSquared = eyeX * eyeX + eyeZ * eyeZ;
            int nearer = addCut((gain * apartSquared + atEye * nearest) / (atEye + gain * nearest), found, count);
            double square = edge.cosine() * edge.cosine();
            double a = gain * gain - square;
            double b = atEye * gain + square * nearest;
            double c = atEye * atEye - square * apartSquared;
            double root = Math.sqrt(b * b - a * c);
            if (!(root >= 0)) {
                return nearer;
            }
            double far = -(b + Math.copySign(root, b));
            return addCut(c / far, found, addCut(far / a, found, nearer));
        }

        private int addCut(double s, double[] found, int count) {
            if (s > 0 && s < end) {
                found[count++] = s;
            }
            return count;
        }
    }
}
