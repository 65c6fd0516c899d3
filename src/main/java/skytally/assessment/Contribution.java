package skytally.assessment;

/**
 * What the lamps of one type cause at one place. Over all types of a place each column adds up to the place's figure.
 *
 * @param place           mark of the place
 * @param type            mark of the luminaire type
 * @param illuminanceLx   light at the eye, through the air
 * @param windowLx        light on the window, nothing taken by the air
 * @param veilCdM2        veil in the eye in the direction beside the lights
 * @param skyZenithCdM2   sky glow overhead, photopic
 * @param skyTowardCdM2   sky glow toward the site, photopic
 */
public record Contribution(
        String place,
        String type,
        double illuminanceLx,
        double windowLx,
        double veilCdM2,
        double skyZenithCdM2,
        double skyTowardCdM2) {}
