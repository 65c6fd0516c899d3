package skytally.assessment;

import java.util.List;
import skytally.geometry.Position;
import skytally.scene.Lamp;
import skytally.scene.Look;
import skytally.scene.Present;
import skytally.scene.Scene;
import skytally.skyglow.SingleScattering;

/** The lamps of one scene, made ready once for every place it is seen from. */
final class SceneLights {

    private final Scene scene;
    private final DirectLight direct;
    private final GatheredLights lamps;
    private final GatheredLights present;
    private final SingleScattering air;
    private final List<String> types;

    SceneLights(Scene scene) {
        this.scene = scene;
        this.direct = new DirectLight(scene.lamps(), scene.surroundings().air());
        this.types = scene.allLamps().stream().map(Lamp::type).distinct().toList();
        this.lamps = new GatheredLights(scene.allLamps());
        this.present = new GatheredLights(scene.present().map(Present::lamps).orElse(List.of()));
        this.air = new SingleScattering(scene.surroundings().air(), SpectralSum.WAVELENGTHS_NM);
    }

    Scene scene() {
        return scene;
    }

    /** Marks of all luminaire types, in the order of the lamps. */
    List<String> types() {
        return types;
    }

    DirectLight direct() {
        return direct;
    }

    /** The sky over one eye, which gathers the lights for it. */
    Sky over(Position eye) {
        return new Sky(eye, lamps.seenFrom(eye), present.seenFrom(eye));
    }

    /** What the lamps send into any line of sight of one eye. */
    final class Sky {

        private final Position eye;
        private final GatheredLights.View seen;
        private final GatheredLights.View seenNow;

        private Sky(Position eye, GatheredLights.View seen, GatheredLights.View seenNow) {
            this.eye = eye;
            this.seen = seen;
            this.seenNow = seenNow;
        }

        SkyLight along(Look look) {
            return along(look, seen.along(look.direction()), lamps);
        }

        /** Good enough for the shares of the types, and quicker. */
        SkyLight sharesAlong(Look look) {
            return along(look, seen.forShares(look.direction()), lamps);
        }

        /** Of the lamps that shine at present. */
        SkyLight atPresent(Look look) {
            return along(look, seenNow.along(look.direction()), present);
        }

        private SkyLight along(Look look, List<GatheredLights.Light> lights, GatheredLights all) {
            return SkyLight.along(
                    look, eye, lights, all.strands(), scene.surroundings().groundReflectance(), air);
        }
    }
}
