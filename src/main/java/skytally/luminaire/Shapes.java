package skytally.luminaire;

import java.util.List;
import java.util.Optional;

/** The plain shapes. Every shape's axis is its nadir; only the two named "up" are turned over already. */
public final class Shapes {

    private static final double NO_BEAM = 180;

    private static final List<Shape> ALL = List.of(
            new Shape("flat-area", "flat lens facing down", FlatLens.AREA, 0, 0.4, NO_BEAM),
            new Shape("flat-road", "flat lens for a road, its street side toward me", FlatLens.ROAD, 0, 0.4, NO_BEAM),
            new Shape("diffuse-down", "matt glowing face looking down", new Beam(1), 0, 0.4, NO_BEAM),
            new Shape("all-round", "bare globe, light all round", new AllRound(), 0, 0.4, NO_BEAM),
            new Shape("all-round-capped", "globe under a solid cap", new Capped(), 0, 0.4, NO_BEAM),
            new Shape("beam-60", "floodlight with a beam of 60°", Beam.ofWidth(60), 0, 0.5, 60),
            new Shape("beam-30", "floodlight with a beam of 30°", Beam.ofWidth(30), 0, 0.5, 30),
            new Shape("beam-10", "spotlight with a beam of 10°", Beam.ofWidth(10), 0, 0.3, 10),
            new Shape("self-lit-panel", "self-lit panel, upright and facing me", new Beam(1), 90, 2, NO_BEAM),
            new Shape("diffuse-up", "matt glowing face looking up", new TurnedUp(new Beam(1)), 0, 0.4, NO_BEAM),
            new Shape("narrow-up", "narrow spotlight aimed up", new TurnedUp(Beam.ofWidth(12)), 0, 0.3, 12));

    private Shapes() {}

    /** All of them, the usual first. */
    public static List<Shape> all() {
        return ALL;
    }

    public static Optional<Shape> byId(String id) {
        return ALL.stream().filter(shape -> shape.id().equals(id)).findFirst();
    }

    /**
     * A round beam of any width about the nadir axis.
     *
     * @param widthDeg full width at half the peak, 1 to 120 degrees
     */
    public static IntensityDistribution beam(double widthDeg) {
        return Beam.ofWidth(widthDeg);
    }
}
