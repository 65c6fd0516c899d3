package skytally.project;

import java.math.BigDecimal;
import java.util.Map;

/** The units a value may be typed in, each as a factor to the one results are reckoned in. */
public final class Units {

    private static final BigDecimal ONE = BigDecimal.ONE;

    /** Exact by definition: the foot is 0.3048 m, the acre 43 560 square feet. */
    private static final Map<String, BigDecimal> TO_FIRST = Map.ofEntries(
            Map.entry("m", ONE),
            Map.entry("ft", new BigDecimal("0.3048")),
            Map.entry("ha", ONE),
            Map.entry("m²", new BigDecimal("0.0001")),
            Map.entry("acre", new BigDecimal("0.40468564224")),
            Map.entry("sq ft", new BigDecimal("0.000009290304")));

    private Units() {}

    /** A value in a unit as the first unit of its kind has it; a unit that stands alone is its own first. */
    public static BigDecimal inFirst(BigDecimal value, String unit) {
        return value.multiply(TO_FIRST.getOrDefault(unit, ONE));
    }
}
