package skytally.project.lights;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import skytally.notation.NumberReader;
import skytally.project.Claim;
import skytally.project.LuminaireType;
import skytally.project.Placement;
import skytally.project.Stated;
import skytally.project.Values;
import skytally.project.entry.Amount;
import skytally.project.entry.Spot;
import skytally.project.entry.ValuesEditor;
import skytally.project.entry.Words;

/**
 * Several lights on one pole, each turned by an angle from the bearing of the pole.
 *
 * @param anglesDeg one a light, clockwise; none where a pole has one light
 */
record Heads(List<Double> anglesDeg) {

    /** One a letter. */
    private static final int MOST = 26;

    /**
     * Reads angles with spaces between them.
     *
     * @throws IllegalArgumentException with what to write instead
     */
    static Heads read(String typed, Words words) {
        List<Double> angles = new ArrayList<>();
        Set<Double> seen = new HashSet<>();
        for (String word : typed.isBlank() ? new String[0] : typed.strip().split("[\\s;]+")) {
            String bare = word.endsWith("°") ? word.substring(0, word.length() - 1) : word;
            double angle = NumberReader.read(bare, false) instanceof NumberReader.Number number
                    ? number.value().doubleValue()
                    : Double.NaN;
            if (!(angle >= 0 && angle < 360)) {
                throw new IllegalArgumentException(words.say("position.fault.heads", word));
            }
            if (!seen.add(angle)) {
                throw new IllegalArgumentException(words.say("position.fault.heads.twice", word));
            }
            angles.add(angle);
        }
        if (angles.size() > MOST) {
            throw new IllegalArgumentException(words.say("position.fault.heads.many", MOST));
        }
        return new Heads(List.copyOf(angles));
    }

    /** Lights a pole. */
    int aPole() {
        return Math.max(1, anglesDeg.size());
    }

    /**
     * The lights of one pole.
     *
     * @param pole what its light would be if it had one
     * @param type whose bearing counts where the pole has none
     * @throws IllegalArgumentException if no bearing is known to turn from
     */
    List<Placement> on(Placement pole, LuminaireType type, Words words) {
        if (anglesDeg.isEmpty()) {
            return List.of(pole);
        }
        Claim basis = pole.values().get("bearing").inUse();
        Optional<Double> own = Amount.of(basis).map(Number::doubleValue);
        Claim typeBasis = type.values().get("bearing").inUse();
        double bearing = own.or(() -> Amount.of(typeBasis).map(Number::doubleValue))
                .orElseThrow(() -> new IllegalArgumentException(words.say("position.fault.heads.bearing")));
        List<Placement> lights = new ArrayList<>();
        for (int i = 0; i < anglesDeg.size(); i++) {
            String how = words.say(
                    own.isPresent() ? "position.how.head" : "position.how.head.type",
                    i + 1,
                    anglesDeg.size(),
                    Spot.metres(anglesDeg.get(i)),
                    Spot.metres(bearing));
            Claim turned = ValuesEditor.workedOut(
                    own.isPresent() ? basis : typeBasis, Spot.metres((bearing + anglesDeg.get(i)) % 360), "°", how);
            Values values = pole.values().with("bearing", Stated.of(turned));
            lights.add(new Placement(pole.mark() + (char) ('a' + i), pole.type(), values));
        }
        return lights;
    }
}
