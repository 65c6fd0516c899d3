package skytally.assessment;

import java.util.ArrayList;
import java.util.List;
import skytally.geometry.Direction;
import skytally.geometry.Rotation;
import skytally.luminaire.IntensityDistribution;
import skytally.skyglow.Emission;

/** A lamp as the sky sees it, per lumen: its light by direction in the frame that looks toward one place. */
final class LampEmission implements Emission {

    private final IntensityDistribution light;
    private final Rotation toOwn; // from the frame of the place to the lamp's own, rows first
    private final double heightM;
    private final boolean upwardOnly;
    private final List<Cone> edges;

    /**
     * @param light        how it spreads its flux
     * @param ownToWorld   how it hangs
     * @param heightM      above the ground the air is reckoned from
     * @param frameToWorld of the place, see {@link #frame}
     * @param upwardOnly   whether the light below the level is left out, as it is for a lamp out of view
     */
    LampEmission(
            IntensityDistribution light,
            Rotation ownToWorld,
            double heightM,
            Rotation frameToWorld,
            boolean upwardOnly) {
        this.light = light;
        this.heightM = heightM;
        this.upwardOnly = upwardOnly;
        this.toOwn = ownToWorld.inverse().after(frameToWorld);
        Direction nadir = frameToWorld.inverse().after(ownToWorld).turn(Direction.DOWN);
        List<Cone> cones = new ArrayList<>();
        for (double breakRad : light.breaksRad()) {
            double cosine = Math.abs(breakRad - Math.PI / 2) < 1e-12 ? 0 : StrictMath.cos(breakRad);
            cones.add(new Cone(nadir.x(), nadir.y(), nadir.z(), cosine));
        }
        this.edges = List.copyOf(cones);
    }

    /**
     * The frame that looks toward a place: ahead = (sin β, cos β, 0), left = (−cos β, sin β, 0) in east, north, up.
     *
     * @param bearingToPlaceRad bearing of the place seen from the lamp
     */
    static Rotation frame(double bearingToPlaceRad) {
        return Rotation.aboutZ(Math.PI / 2 - bearingToPlaceRad);
    }

    @Override
    public double toward(double ahead, double left, double up) {
        if (upwardOnly && up <= 0) {
            return 0;
        }
        return light.perLumen(
                toOwn.xx() * ahead + toOwn.xy() * left + toOwn.xz() * up,
                toOwn.yx() * ahead + toOwn.yy() * left + toOwn.yz() * up,
                toOwn.zx() * ahead + toOwn.zy() * left + toOwn.zz() * up);
    }

    @Override
    public List<Cone> edges() {
        return edges;
    }

    @Override
    public double heightM() {
        return heightM;
    }
}
