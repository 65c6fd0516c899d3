package skytally.assessment;

import java.util.List;
import skytally.skyglow.Emission;

/**
 * What matt ground sends back of one lumen it reflects, from one point at its level: {@code cos z / π}.
 *
 * @param heightM of that ground
 */
record GroundEmission(double heightM) implements Emission {

    @Override
    public double toward(double ahead, double left, double up) {
        return up > 0 ? up / Math.PI : 0;
    }

    @Override
    public List<Cone> edges() {
        return List.of();
    }
}
