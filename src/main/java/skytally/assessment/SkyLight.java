package skytally.assessment;

import skytally.atmosphere.DirectPath;
import skytally.geometry.Position;
import skytally.luminaire.FluxShare;
import skytally.scene.Lamp;
import skytally.scene.Look;
import skytally.scene.Scene;
import skytally.skyglow.Emission;
import skytally.skyglow.Sightline;
import skytally.skyglow.SingleScattering;

/**
 * The light that the air sends into one line of sight, once scattered, from all lamps of a scene.
 *
 * @param lampsCdM2   from the lamps themselves, photopic
 * @param groundCdM2  from what the ground under them sends back, photopic
 * @param johnsonV    both, mean over the Johnson V band, W m⁻² sr⁻¹ nm⁻¹
 */
record SkyLight(double lampsCdM2, double groundCdM2, double johnsonV) {

    private static final double NONE_BEYOND_M = 500_000;

    double artificialCdM2() {
        return lampsCdM2 + groundCdM2;
    }

    static SkyLight along(Look look, Position eye, Scene scene) {
        SingleScattering air = new SingleScattering(scene.surroundings().air(), SpectralSum.WAVELENGTHS_NM);
        double lamps = 0;
        double ground = 0;
        double johnsonV = 0;
        for (Lamp lamp : scene.lamps()) {
            double distance = lamp.position().groundDistanceTo(eye);
            if (distance > NONE_BEYOND_M) {
                continue;
            }
            Sightline line = sightline(look, eye, lamp, distance);
            SpectralSum spectrum = SpectralSum.of(lamp.spectrum());
            double lumens = lamp.allFlux().lumens();
            double returned = lumens
                    * FluxShare.downward(lamp.light(), lamp.attitude())
                    * scene.surroundings().groundReflectance();

            double[] fromLamp = air.radiance(emission(lamp, eye), line);
            double[] fromGround = air.radiance(new GroundEmission(), line);
            lamps += lumens * spectrum.luminance(fromLamp);
            ground += returned * spectrum.luminance(fromGround);
            johnsonV += lumens * spectrum.johnsonV(fromLamp) + returned * spectrum.johnsonV(fromGround);
        }
        return new SkyLight(lamps, ground, johnsonV);
    }

    /** A lamp in view lights the air on all sides of the line of sight; one out of view only what lies above it. */
    private static Emission emission(Lamp lamp, Position eye) {
        DirectPath path = DirectPath.between(
                lamp.position().heightM(),
                eye.heightM(),
                Math.max(1e-6, lamp.position().groundDistanceTo(eye)));
        return new LampEmission(lamp, lamp.position().bearingTo(eye), !path.clearsTheHorizon());
    }

    private static Sightline sightline(Look look, Position eye, Lamp lamp, double distance) {
        double bearingOfLook =
                StrictMath.atan2(look.direction().x(), look.direction().y());
        double bearingOfLamp = eye.bearingTo(lamp.position());
        return new Sightline(
                Math.max(1e-3, distance),
                eye.heightM(),
                StrictMath.toRadians(look.zenithAngleDeg()),
                bearingOfLook - bearingOfLamp);
    }
}
