package skytally.assessment;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import skytally.geometry.Position;
import skytally.scene.Look;
import skytally.skyglow.SingleScattering;
import skytally.skyglow.Sightline;

/**
 * The light that the air sends into one line of sight, once scattered, from all lamps of a scene.
 *
 * @param lampsCdM2     from the lamps themselves, photopic
 * @param groundCdM2    from what the ground under them sends back, photopic
 * @param johnsonV      both, mean over the Johnson V band, W m⁻² sr⁻¹ nm⁻¹
 * @param byTypeCdM2    lamps and ground together, photopic, by mark of the luminaire type
 */
record SkyLight(double lampsCdM2, double groundCdM2, double johnsonV, Map<String, Double> byTypeCdM2) {

    static final SkyLight NONE = new SkyLight(0, 0, 0, Map.of());

    double artificialCdM2() {
        return lampsCdM2 + groundCdM2;
    }

    /**
     * @param lights            as gathered for the eye, of which they are
     * @param strands           that the lights are made of
     * @param groundReflectance of the ground under all of them
     */
    static SkyLight along(
            Look look,
            Position eye,
            List<GatheredLights.Light> lights,
            List<GatheredLights.Strand> strands,
            double groundReflectance,
            SingleScattering air) {
        double[] lamps = new double[strands.size()];
        double[] ground = new double[strands.size()];
        double johnsonV = 0;
        List<SpectralSum> spectra = new ArrayList<>();
        strands.forEach(strand -> spectra.add(SpectralSum.of(strand.spectrum())));
        for (GatheredLights.Light light : lights) {
            Sightline line = sightline(look, eye, light.at());
            double[][] fromLamps = air.radiance(light.emissions(), line);
            double[] fromGround = air.radiance(new GroundEmission(light.groundHeightM()), line);
            for (int i = 0; i < fromLamps.length; i++) {
                int strand = light.strands()[i];
                SpectralSum spectrum = spectra.get(strand);
                double lumens = light.lumens()[i];
                double returned = light.onGround()[i] * groundReflectance;
                lamps[strand] += lumens * spectrum.luminance(fromLamps[i]);
                ground[strand] += returned * spectrum.luminance(fromGround);
                johnsonV += lumens * spectrum.johnsonV(fromLamps[i]) + returned * spectrum.johnsonV(fromGround);
            }
        }
        return of(lamps, ground, johnsonV, strands);
    }

    private static SkyLight of(
            double[] lamps, double[] ground, double johnsonV, List<GatheredLights.Strand> strands) {
        Map<String, Double> byType = new LinkedHashMap<>();
        double allLamps = 0;
        double allGround = 0;
        for (int i = 0; i < lamps.length; i++) {
            allLamps += lamps[i];
            allGround += ground[i];
            byType.merge(strands.get(i).type(), lamps[i] + ground[i], Double::sum);
        }
        return new SkyLight(allLamps, allGround, johnsonV, byType);
    }

    private static Sightline sightline(Look look, Position eye, Position light) {
        double bearingOfLook =
                StrictMath.atan2(look.direction().x(), look.direction().y());
        return new Sightline(
                Math.max(1e-3, light.groundDistanceTo(eye)),
                eye.heightM(),
                StrictMath.toRadians(look.zenithAngleDeg()),
                bearingOfLook - eye.bearingTo(light));
    }
}
