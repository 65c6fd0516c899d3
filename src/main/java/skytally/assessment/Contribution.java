package skytally.assessment;

import java.util.Map;
import skytally.scene.Look;

/**
 * What the lamps of one type cause at one place. Over all types of a place each column adds up to the place's figure.
 *
 * @param place         mark of the place
 * @param type          mark of the luminaire type
 * @param illuminanceLx light at the eye, through the air
 * @param windowLx      light on the window, nothing taken by the air
 * @param veilCdM2      veil in the eye in the direction beside the lights; none (NaN) where nobody looks there
 * @param skyCdM2       sky glow, photopic, by the id of the direction looked in
 */
public record Contribution(
        String place,
        String type,
        double illuminanceLx,
        double windowLx,
        double veilCdM2,
        Map<String, Double> skyCdM2) {

    public Contribution {
        skyCdM2 = Map.copyOf(skyCdM2);
    }

    public double skyZenithCdM2() {
        return skyCdM2.getOrDefault(Look.ZENITH, Double.NaN);
    }

    public double skyTowardCdM2() {
        return skyCdM2.getOrDefault(Look.TOWARD_SITE, Double.NaN);
    }
}
