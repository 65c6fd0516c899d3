package skytally.project;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;

/**
 * A full set of lights: what is there, what is proposed, or an option. Never a difference from another.
 *
 * @param mark       unique in the project
 * @param kind       what it stands for
 * @param name       in words
 * @param types      the schedule
 * @param placements the plan
 */
public record Scheme(String mark, Kind kind, String name, List<LuminaireType> types, List<Placement> placements) {

    /** What a scheme stands for. */
    public enum Kind {
        EXISTING("existing"),
        PROPOSED("proposed"),
        OPTION("option");

        private final String id;

        Kind(String id) {
            this.id = id;
        }

        /** Its name in files. */
        public String id() {
            return id;
        }

        public static Optional<Kind> byId(String id) {
            return Arrays.stream(values()).filter(kind -> kind.id.equals(id)).findFirst();
        }
    }

    public Scheme {
        Mark.require(mark);
        types = List.copyOf(types);
        placements = List.copyOf(placements);
        Bounds.require(types.size(), Bounds.TYPES, "luminaire types in a scheme");
        Bounds.require(placements.size(), Bounds.LIGHTS, "lights in a scheme");
        Mark.requireUnique("luminaire types", types, LuminaireType::mark);
        Mark.requireUnique("lights", placements, Placement::mark);
        Set<String> known = types.stream().map(LuminaireType::mark).collect(Collectors.toSet());
        for (Placement placement : placements) {
            if (!known.contains(placement.type())) {
                throw new IllegalArgumentException("Light " + placement.mark() + " is of type " + placement.type()
                        + ", which the scheme does not have");
            }
        }
    }

    public Optional<LuminaireType> type(String typeMark) {
        return types.stream().filter(type -> type.mark().equals(typeMark)).findFirst();
    }

    /** The same scheme with another schedule and plan. */
    public Scheme with(List<LuminaireType> otherTypes, List<Placement> otherPlacements) {
        return new Scheme(mark, kind, name, otherTypes, otherPlacements);
    }

    public Optional<Placement> placement(String lightMark) {
        return placements.stream()
                .filter(placement -> placement.mark().equals(lightMark))
                .findFirst();
    }

    /** The lights of one type, in the order of the plan. */
    public List<Placement> placementsOf(String typeMark) {
        return placements.stream()
                .filter(placement -> placement.type().equals(typeMark))
                .toList();
    }
}
