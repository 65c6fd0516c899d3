package skytally.project.hours;

import java.math.BigDecimal;
import org.jspecify.annotations.Nullable;

/**
 * How much of its output a light has.
 *
 * @param active in percent, while it is on or something moves
 * @param idle   in percent, while nothing moves; nothing for a light that is not sensed
 * @param duty   percent of the time something moves; nothing where that is not said
 */
public record Level(
        BigDecimal active,
        @Nullable BigDecimal idle,
        @Nullable BigDecimal duty) {

    /** A steady level. */
    static Level of(BigDecimal percent) {
        return new Level(percent, null, null);
    }

    public boolean isSensed() {
        return idle != null;
    }

    String written() {
        return idle == null
                ? percent(active)
                : "sensed idle " + percent(idle) + " active " + percent(active)
                        + (duty == null ? "" : " duty " + percent(duty));
    }

    private static String percent(BigDecimal number) {
        return (number.signum() == 0 ? "0" : number.stripTrailingZeros().toPlainString()) + "%";
    }
}
