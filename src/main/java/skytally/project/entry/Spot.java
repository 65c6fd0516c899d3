package skytally.project.entry;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Optional;
import skytally.geometry.Position;
import skytally.notation.QuantityFormat;
import skytally.project.Values;

/**
 * A point on the ground.
 *
 * @param eastM  of the reference point
 * @param northM of the reference point
 */
public record Spot(double eastM, double northM) {

    private static final int CENTIMETRES = 2;
    private static final Position REFERENCE = new Position(0, 0, 0);

    /** A file may hold more than a form takes; what lies farther is taken as not placed. */
    private static final double FARTHEST_M = 1_000_000;

    /** Where the values say, if they say where. */
    public static Optional<Spot> of(Values values) {
        return of(values, "east", "north");
    }

    /** Where two of the values say, if both are known and on this Earth. */
    public static Optional<Spot> of(Values values, String east, String north) {
        Optional<BigDecimal> eastM = Amount.of(values.get(east).inUse());
        Optional<BigDecimal> northM = Amount.of(values.get(north).inUse());
        return eastM.isEmpty() || northM.isEmpty()
                ? Optional.empty()
                : Optional.of(new Spot(eastM.get().doubleValue(), northM.get().doubleValue()))
                        .filter(spot -> Math.abs(spot.eastM) <= FARTHEST_M && Math.abs(spot.northM) <= FARTHEST_M);
    }

    /** The point at a distance on a bearing from this one. */
    public Spot at(double distanceM, double bearingDeg) {
        double bearing = StrictMath.toRadians(bearingDeg);
        return new Spot(eastM + distanceM * StrictMath.sin(bearing), northM + distanceM * StrictMath.cos(bearing));
    }

    /** A point of the way to another: 0 here, 1 there. */
    public Spot toward(Spot end, double share) {
        return new Spot(eastM + (end.eastM - eastM) * share, northM + (end.northM - northM) * share);
    }

    /** Metres to the centimetre, as it is kept. */
    public static String metres(double metres) {
        BigDecimal rounded = BigDecimal.valueOf(metres).setScale(CENTIMETRES, RoundingMode.HALF_EVEN);
        return rounded.signum() == 0 ? "0" : rounded.stripTrailingZeros().toPlainString();
    }

    /** From the reference point. */
    public double distanceM() {
        return REFERENCE.groundDistanceTo(new Position(eastM, northM, 0));
    }

    /** From the reference point, 0 to 360. */
    public double bearingDeg() {
        return (StrictMath.toDegrees(REFERENCE.bearingTo(new Position(eastM, northM, 0))) + 360) % 360;
    }

    /** Distance and bearing from the reference point, written out. */
    public String fromReference(Words words) {
        return words.say(
                "position.from-reference",
                QuantityFormat.decimals(distanceM(), 1).plain(),
                QuantityFormat.decimals(bearingDeg(), 1).plain());
    }
}
