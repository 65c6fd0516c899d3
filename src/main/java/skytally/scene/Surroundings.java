package skytally.scene;

import skytally.atmosphere.Atmosphere;

/**
 * What lies between and below.
 *
 * @param air               the atmosphere over the site
 * @param groundReflectance share of the light falling on the ground that it sends back, matt and grey, 0 to 1
 */
public record Surroundings(Atmosphere air, double groundReflectance) {

    public Surroundings {
        if (!(groundReflectance >= 0 && groundReflectance <= 1)) {
            throw new IllegalArgumentException("Ground reflectance must be 0 to 1, not " + groundReflectance);
        }
    }
}
