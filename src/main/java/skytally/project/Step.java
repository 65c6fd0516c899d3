package skytally.project;

import java.time.Instant;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import skytally.project.transfer.Difference;

/**
 * One save of a project and all it changed.
 *
 * @param number  counted from 1
 * @param at      when
 * @param who     or empty
 * @param why     or empty
 * @param undoes  the step it took back, if it did
 * @param changes by key
 */
public record Step(
        long number,
        Instant at,
        String who,
        String why,
        @Nullable Long undoes,
        List<Difference.Change> changes) {

    /**
     * The step an undo takes back next: the last that neither takes another back nor was taken back itself. The first,
     * which made the project, stays.
     *
     * @param history the first step first
     */
    public static Optional<Step> lastStanding(List<Step> history) {
        Set<Long> gone = new HashSet<>();
        for (int i = history.size() - 1; i > 0; i--) {
            Step step = history.get(i);
            Long undoes = step.undoes();
            if (undoes != null) {
                gone.add(undoes);
            } else if (!gone.contains(step.number())) {
                return Optional.of(step);
            }
        }
        return Optional.empty();
    }
}
