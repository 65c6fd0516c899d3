package skytally.assessment;

/**
 * A value with the least and the most it may be, as its guesses go from end to end.
 *
 * @param low    not more than likely
 * @param likely the value
 * @param high   not less than likely
 */
public record Range(double low, double likely, double high) {

    public Range {
        if (!(low <= likely && likely <= high && Double.isFinite(low) && Double.isFinite(high))) {
            throw new IllegalArgumentException(
                    "A range rises from low over likely to high, not " + low + ", " + likely + ", " + high);
        }
    }

    /** Whether there is any width to it. */
    public boolean isOpen() {
        return high > low;
    }
}
