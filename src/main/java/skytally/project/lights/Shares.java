package skytally.project.lights;

import skytally.luminaire.FittedShape;
import skytally.notation.QuantityFormat;
import skytally.project.entry.Words;

/** Shares of light and angles as these pages write them. */
final class Shares {

    /** Below this a share is a rounding, not light. */
    private static final double NONE = 1e-6;

    private Shares() {}

    /** In percent, such as {@code 4 %}. */
    static String percent(double share) {
        double kept = share < NONE ? 0 : share > 1 - NONE ? 1 : share;
        return QuantityFormat.atMost(100 * kept, 3).plain() + "\u00a0%";
    }

    static String degrees(double angleDeg) {
        return QuantityFormat.atMost(angleDeg, 3).plain() + "°";
    }

    /** What came of the shape and the share stated. */
    static String fit(FittedShape shape, Words words) {
        if (shape.statedShare().isEmpty()) {
            return words.say("type.fit.not-stated");
        }
        String stated = percent(shape.statedShare().getAsDouble());
        String own = percent(shape.shapeShare());
        if (shape.hasWidthWorkedOut()) {
            return words.say("type.fit.width", stated, degrees(shape.beamWidthDeg()));
        }
        if (!shape.differs()) {
            return words.say("type.fit.agrees", stated);
        }
        return shape.allRoundPart() > 0
                ? words.say("type.fit.brighter", own, stated, percent(shape.allRoundPart()))
                : words.say("type.fit.shape", own, stated);
    }
}
