package skytally.project.shelf;

import java.math.BigDecimal;
import java.time.Instant;
import java.util.List;
import org.jspecify.annotations.Nullable;
import skytally.notation.QuantityFormat;
import skytally.project.Project;
import skytally.project.Step;

/**
 * The history of a project as its page tells it.
 *
 * @param steps  newest first
 * @param older  step before which the rest is asked for, or nothing where this is all
 * @param undone the step an undo takes back next, or nothing
 */
public record HistoryPage(
        List<StepLine> steps,
        @Nullable Long older,
        @Nullable Long undone) {

    /** Saves on one page. */
    static final int STEPS = 20;

    /** Changes shown of each. */
    static final int CHANGES = 40;

    /**
     * One save.
     *
     * @param number      counted from 1
     * @param ago         when
     * @param who         or empty
     * @param why         or empty
     * @param undoes      the step it took back, or nothing
     * @param takenBackBy the step that took it back, or nothing
     * @param changes     as many as are shown
     * @param count       of all changes
     */
    public record StepLine(
            long number,
            Ago ago,
            String who,
            String why,
            @Nullable Long undoes,
            @Nullable Long takenBackBy,
            List<ChangeLine> changes,
            long count) {

        public long more() {
            return count - changes.size();
        }

        /** The count as it is printed. */
        public String countText() {
            return QuantityFormat.asTyped(BigDecimal.valueOf(count)).digits();
        }
    }

    /** Of as many steps as stand on a page, and one more if there is more. */
    static HistoryPage of(List<Step> found, @Nullable Long undone, Project project, Instant now) {
        List<StepLine> lines = found.stream()
                .limit(STEPS)
                .map(step -> line(step, project, now))
                .toList();
        Long older = found.size() > STEPS ? lines.get(STEPS - 1).number() : null;
        return new HistoryPage(lines, older, undone);
    }

    static StepLine line(Step step, Project project, Instant now) {
        return new StepLine(
                step.number(),
                Ago.of(step.at(), now),
                step.who(),
                step.why(),
                step.undoes(),
                step.takenBackBy(),
                step.changes().stream()
                        .map(change -> ChangeLine.of(change, project))
                        .toList(),
                step.count());
    }
}
