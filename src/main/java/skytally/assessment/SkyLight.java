package skytally.assessment;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import skytally.geometry.Position;
import skytally.scene.Look;
import skytally.skyglow.Sightline;
import skytally.skyglow.SingleScattering;

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
        int wavelengths = SpectralSum.WAVELENGTHS_NM.length;
        double[][] fromLamps = new double[strands.size()][wavelengths];
        double[][] fromGround = new double[strands.size()][wavelengths];
        for (GatheredLights.Light light : lights) {
            Sightline line = sightline(look, eye, light.at());
            double[][] perLumen = air.radiance(light.emissions(), line);
            double[] perReturned = air.radiance(light.ground(), line)[0];
            for (int i = 0; i < perLumen.length; i++) {
                int strand = light.strands()[i];
                add(light.lumens()[i], perLumen[i], fromLamps[strand]);
                add(light.onGround()[i] * groundReflectance, perReturned, fromGround[strand]);
            }
        }
        return of(fromLamps, fromGround, strands);
    }

    private static void add(double lumens, double[] perLumen, double[] sum) {
        for (int i = 0; i < sum.length; i++) {
            sum[i] += lumens * perLumen[i];
        }
    }

    private static SkyLight of(double[][] fromLamps, double[][] fromGround, List<GatheredLights.Strand> strands) {
        Map<String, Double> byType = new LinkedHashMap<>();
        double allLamps = 0;
        double allGround = 0;
        double johnsonV = 0;
        for (int i = 0; i < strands.size(); i++) {
            SpectralSum spectrum = SpectralSum.of(strands.get(i).spectrum());
            double lamps = spectrum.luminance(fromLamps[i]);
            double ground = spectrum.luminance(fromGround[i]);
            allLamps += lamps;
            allGround += ground;
            johnsonV += spectrum.johnsonV(fromLamps[i]) + spectrum.johnsonV(fromGround[i]);
            byType.merge(strands.get(i).type(), lamps + ground, Double::sum);
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
