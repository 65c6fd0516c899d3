package skytally.skyglow;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/** Several lights at one point, made ready to be looked at along many lines of sight. */
public final class Emissions {

    /** With more edges than this a line is not cut at them. */
    private static final int MOST_EDGES = 12;

    private final Emission[] lights;
    private final List<Emission.Cone> edges;

    /**
     * @param lights at one height, at least one
     * @throws IllegalArgumentException for none, or for several heights
     */
    public Emissions(List<? extends Emission> lights) {
        if (lights.isEmpty()) {
            throw new IllegalArgumentException("There must be a light");
        }
        this.lights = lights.toArray(Emission[]::new);
        Set<Emission.Cone> distinct = new LinkedHashSet<>();
        for (Emission light : lights) {
            if (light.heightM() != heightM()) {
                throw new IllegalArgumentException("Lights at one point are at one height");
            }
            distinct.addAll(light.edges());
        }
        this.edges = distinct.size() <= MOST_EDGES ? List.copyOf(distinct) : List.of();
    }

    /** Height of the point above the ground, in metres. */
    public double heightM() {
        return lights[0].heightM();
    }

    public int size() {
        return lights.length;
    }

    List<Emission.Cone> edgesWorthCutting() {
        return edges;
    }

    Emission[] toArray() {
        return lights;
    }
}
