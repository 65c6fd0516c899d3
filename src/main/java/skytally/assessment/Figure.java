package skytally.assessment;

import java.util.Optional;

/**
 * One number of an assessment.
 *
 * @param key     its path of marks and words, such as {@code here/direct/illuminance/early/clear}
 * @param name    in words
 * @param unit    it is held in
 * @param range   its value and how far it may go; none where there is nothing to say, such as a magnitude of no light
 * @param working how it was worked out
 */
public record Figure(String key, String name, Unit unit, Optional<Range> range, Working working) {

    /**
     * Its likely value.
     *
     * @throws IllegalStateException if it has none
     */
    public double likely() {
        return range.orElseThrow(() -> new IllegalStateException(key + " has no value"))
                .likely();
    }
}
