package skytally.assessment;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import skytally.atmosphere.DirectPath;
import skytally.geometry.Attitude;
import skytally.geometry.Position;
import skytally.luminaire.FluxShare;
import skytally.luminaire.IntensityDistribution;
import skytally.scene.Lamp;
import skytally.spectrum.Spectrum;

/**
 * The lamps of a scene as a place's sky sees them: those that stand close together, measured by how far they are, count
 * as one light at their middle. What is not far enough is divided, down to the single lamp.
 *
 * <p>Lamps are gathered around the middle of their light, so that what a lamp nearer than the middle adds too much one
 * farther adds too little: the error goes with the square of {@link #APART}.
 */
final class GatheredLights {

    /** Gathered lamps lie within this share of their distance from their middle. */
    static final double APART = 0.05;

    private static final double NONE_BEYOND_M = 500_000;

    private final List<Strand> strands;
    private final List<Node> roots;

    /** Lamps of one type and one spectrum, whose light is added up apart. */
    record Strand(String type, Spectrum spectrum) {}

    /** Lamps that send the same way: their lumens, and those the ground under them gets. */
    private record Bundle(int strand, IntensityDistribution light, Attitude attitude, double lumens, double onGround) {

        private record Key(int strand, IntensityDistribution light, Attitude attitude) {}

        Key key() {
            return new Key(strand, light, attitude);
        }

        Bundle with(Bundle other) {
            return new Bundle(strand, light, attitude, lumens + other.lumens, onGround + other.onGround);
        }
    }

    private record Node(Position middle, double groundHeightM, double radiusM, List<Bundle> bundles, List<Node> parts) {

        double lumens() {
            return bundles.stream().mapToDouble(Bundle::lumens).sum();
        }
    }

    /**
     * A light made of lamps that stand close together.
     *
     * @param at            their middle
     * @param groundHeightM of the ground under them
     * @param emissions     toward the place, per lumen
     * @param strands       index of the strand of each emission
     * @param lumens        of each emission
     * @param onGround      lumens of each that fall on the ground
     */
    record Light(
            Position at,
            double groundHeightM,
            List<LampEmission> emissions,
            int[] strands,
            double[] lumens,
            double[] onGround) {}

    GatheredLights(List<Lamp> lamps) {
        Map<Strand, Integer> index = new LinkedHashMap<>();
        Map<Bundle.Key, Double> upward = new LinkedHashMap<>();
        List<Node> leaves = new ArrayList<>();
        for (Lamp lamp : lamps) {
            double lumens = lamp.allFlux().lumens();
            if (lumens > 0) {
                int strand = index.computeIfAbsent(new Strand(lamp.type(), lamp.spectrum()), key -> index.size());
                leaves.add(leaf(lamp, strand, lumens, upward));
            }
        }
        strands = List.copyOf(index.keySet());
        roots = leaves.isEmpty() ? List.of() : List.of(gathered(leaves));
    }

    private static Node leaf(Lamp lamp, int strand, double lumens, Map<Bundle.Key, Double> upward) {
        Attitude attitude = plain(lamp);
        double up = upward.computeIfAbsent(
                new Bundle.Key(strand, lamp.light(), attitude), key -> FluxShare.upward(lamp.light(), attitude));
        Bundle bundle = new Bundle(strand, lamp.light(), attitude, lumens, lumens * Math.max(0, 1 - up));
        return new Node(lamp.position(), lamp.groundHeightM(), 0, List.of(bundle), List.of());
    }

    /** A round fitting that hangs level sends the same whichever way it is turned. */
    private static Attitude plain(Lamp lamp) {
        Attitude attitude = lamp.attitude();
        boolean turnless = lamp.light().isRound() && attitude.tiltDeg() == 0 && attitude.rollDeg() == 0;
        return turnless ? Attitude.LEVEL : attitude;
    }

    private static Node gathered(List<Node> nodes) {
        if (nodes.size() == 1) {
            return nodes.get(0);
        }
        List<Node> sorted = new ArrayList<>(nodes);
        sorted.sort(alongTheLongerSide(nodes));
        int half = sorted.size() / 2;
        Node one = gathered(sorted.subList(0, half));
        Node other = gathered(sorted.subList(half, sorted.size()));
        double share = one.lumens() / (one.lumens() + other.lumens());
        Position middle = new Position(
                mean(share, one.middle().eastM(), other.middle().eastM()),
                mean(share, one.middle().northM(), other.middle().northM()),
                mean(share, one.middle().heightM(), other.middle().heightM()));
        double radius = nodes.stream()
                .mapToDouble(node -> apart(middle, node.middle()))
                .max()
                .orElse(0);
        Map<Bundle.Key, Bundle> merged = new LinkedHashMap<>();
        add(one.bundles(), merged);
        add(other.bundles(), merged);
        return new Node(
                middle,
                mean(share, one.groundHeightM(), other.groundHeightM()),
                radius,
                List.copyOf(merged.values()),
                List.of(one, other));
    }

    private static void add(Collection<Bundle> bundles, Map<Bundle.Key, Bundle> merged) {
        bundles.forEach(bundle -> merged.merge(bundle.key(), bundle, Bundle::with));
    }

    private static Comparator<Node> alongTheLongerSide(List<Node> nodes) {
        Comparator<Node> east = Comparator.comparingDouble(node -> node.middle().eastM());
        Comparator<Node> north = Comparator.comparingDouble(node -> node.middle().northM());
        return spread(nodes, true) >= spread(nodes, false) ? east : north;
    }

    private static double spread(List<Node> nodes, boolean east) {
        double least = Double.POSITIVE_INFINITY;
        double most = Double.NEGATIVE_INFINITY;
        for (Node node : nodes) {
            double at = east ? node.middle().eastM() : node.middle().northM();
            least = Math.min(least, at);
            most = Math.max(most, at);
        }
        return most - least;
    }

    private static double mean(double share, double one, double other) {
        return one == other ? one : share * one + (1 - share) * other;
    }

    private static double apart(Position a, Position b) {
        return Math.hypot(a.groundDistanceTo(b), a.heightM() - b.heightM());
    }

    /** What light is added up apart. */
    List<Strand> strands() {
        return strands;
    }

    /** The lights as an eye at this place is to reckon with them. */
    List<Light> seenFrom(Position eye) {
        List<Light> lights = new ArrayList<>();
        roots.forEach(root -> collect(root, eye, lights));
        return lights;
    }

    private static void collect(Node node, Position eye, List<Light> lights) {
        double distance = node.middle().groundDistanceTo(eye);
        if (node.radiusM() > APART * distance) {
            node.parts().forEach(part -> collect(part, eye, lights));
        } else if (distance <= NONE_BEYOND_M) {
            lights.add(light(node, eye, distance));
        }
    }

    /** A light in view lights the air on all sides of the line of sight; one out of view only what lies above it. */
    private static Light light(Node node, Position eye, double distance) {
        DirectPath path =
                DirectPath.between(node.middle().heightM(), eye.heightM(), Math.max(1e-6, distance));
        double bearing = node.middle().bearingTo(eye);
        List<LampEmission> emissions = node.bundles().stream()
                .map(bundle -> new LampEmission(
                        bundle.light(),
                        bundle.attitude(),
                        node.middle().heightM(),
                        bearing,
                        !path.clearsTheHorizon()))
                .toList();
        return new Light(
                node.middle(),
                node.groundHeightM(),
                emissions,
                node.bundles().stream().mapToInt(Bundle::strand).toArray(),
                node.bundles().stream().mapToDouble(Bundle::lumens).toArray(),
                node.bundles().stream().mapToDouble(Bundle::onGround).toArray());
    }
}
