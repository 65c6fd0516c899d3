package skytally.skyglow;

import java.util.Arrays;
import skytally.atmosphere.Molecules;

/**
 * Light scattered once, toward any point, for all hats and wavelengths together: what {@link SingleScattering} works
 * out for one emission, with fewer nodes, as a source for the orders above it.
 *
 * <p>With s₀ the point of the line nearest the light and q its distance, s = s₀ + q tan ψ makes ds/r² = dψ/q, and the
 * angle the light is turned by has the cosine −sin ψ.
 */
final class OnceScattered {

    /** Seen along the way to the light itself, the line is kept this far from it, as a share of the distance. */
    private static final double LEAST_DISTANCE = 1e-4;

    private final LayeredAir air;
    private final int wavelengths;
    private final GaussRule low;
    private final GaussRule high;

    OnceScattered(LayeredAir air, int lowNodes, int highNodes) {
        this.air = air;
        this.wavelengths = air.wavelengths();
        this.low = GaussRule.of(lowNodes);
        this.high = GaussRule.of(highNodes);
    }

    /**
     * Radiance along a ray.
     *
     * @param distance of the ray's beginning from the light
     * @param into     set to the radiance, by wavelength and then by hat
     */
    void gather(Ray ray, double distance, double[] into) {
        Arrays.fill(into, 0);
        double nearest = Math.max(ray.nearestDistance(), LEAST_DISTANCE * distance);
        double level = ray.crossesLevel();
        double litFrom = ray.climbs() && level > 0 ? level : 0;
        double litTo = !ray.climbs() && level < ray.end() ? Math.max(level, 0) : ray.end();
        for (int piece = 0; piece < ray.pieces(); piece++) {
            double from = Math.max(ray.from(piece), litFrom);
            double to = Math.min(ray.to(piece), litTo);
            if (to > from) {
                addPiece(ray, from, to, nearest, ray.isLow(piece) ? low : high, into);
            }
        }
    }

    private void addPiece(Ray ray, double from, double to, double nearest, GaussRule rule, double[] into) {
        double begin = StrictMath.atan((from - ray.nearest()) / nearest);
        double half = (StrictMath.atan((to - ray.nearest()) / nearest) - begin) / 2;
        for (int i = 0; i < rule.count(); i++) {
            double angle = begin + half * (1 + rule.nodes()[i]);
            double s = ray.nearest() + nearest * StrictMath.tan(angle);
            addPoint(ray, s, -StrictMath.sin(angle), half * rule.weights()[i] / nearest, into);
        }
    }

    private void addPoint(Ray ray, double s, double turnCosine, double weight, double[] into) {
        ray.goTo(s);
        double zenithCosine = ray.pointZenithCosine();
        if (zenithCosine <= 0) {
            return;
        }
        double zenithAngle = StrictMath.acos(Math.min(1, zenithCosine));
        int hat = ZenithHats.lower(zenithAngle);
        double share = ZenithHats.share(hat, zenithAngle);
        double molecularAir = ray.moleculesFromLight() + ray.moleculesOnWay(s);
        double hazyAir = ray.hazeFromLight() + ray.hazeOnWay(s);
        double molecules = air.molecularScattering() * ray.molecules() * Molecules.phase(turnCosine) * weight;
        double haze = air.hazeScattering() * ray.haze() * air.aerosol().phase(turnCosine) * weight;
        double[] molecularDepth = air.molecularDepth();
        double[] hazeDepth = air.hazeDepth();
        for (int w = 0; w < wavelengths; w++) {
            double through = StrictMath.exp(-molecularDepth[w] * molecularAir - hazeDepth[w] * hazyAir);
            double scattered = (molecularDepth[w] * molecules + hazeDepth[w] * haze) * through;
            into[w * ZenithHats.COUNT + hat] += scattered * (1 - share);
            into[w * ZenithHats.COUNT + hat + 1] += scattered * share;
        }
    }
}
