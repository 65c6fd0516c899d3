package skytally.project.shelf;

import java.math.BigDecimal;
import java.time.Instant;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
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
        @Nullable StepLine undone) {

    private static final int STEPS_A_PAGE = 20;
    private static final int CHANGES_SHOWN = 40;

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
            int count) {

        public int more() {
            return count - changes.size();
        }

        /** The count as it is printed. */
        public String countText() {
            return QuantityFormat.asTyped(BigDecimal.valueOf(count)).digits();
        }
    }

    /**
     * @param history the first step first
     * @param before  only steps with a lower number
     */
    static HistoryPage of(List<Step> history, Project project, long before, Instant now) {
        Map<Long, Long> takenBack = takenBack(history);
        List<Step> wanted =
                history.stream().filter(step -> step.number() < before).toList();
        int from = Math.max(0, wanted.size() - STEPS_A_PAGE);
        List<StepLine> lines = wanted.subList(from, wanted.size()).stream()
                .map(step -> line(step, takenBack, project, now, 0, CHANGES_SHOWN))
                .sorted((a, b) -> Long.compare(b.number(), a.number()))
                .toList();
        return new HistoryPage(
                lines,
                from == 0 ? null : wanted.get(from).number(),
                Step.lastStanding(history)
                        .map(step -> line(step, takenBack, project, now, 0, 0))
                        .orElse(null));
    }

    /** One step with a stretch of its changes. */
    static StepLine one(Step step, List<Step> history, Project project, Instant now, int from, int most) {
        return line(step, takenBack(history), project, now, from, most);
    }

    private static Map<Long, Long> takenBack(List<Step> history) {
        Map<Long, Long> takenBack = new HashMap<>();
        for (Step step : history) {
            Long undoes = step.undoes();
            if (undoes != null) {
                takenBack.put(undoes, step.number());
            }
        }
        return takenBack;
    }

    private static StepLine line(
            Step step, Map<Long, Long> takenBack, Project project, Instant now, int from, int most) {
        return new StepLine(
                step.number(),
                Ago.of(step.at(), now),
                step.who(),
                step.why(),
                step.undoes(),
                takenBack.get(step.number()),
                step.changes().stream()
                        .skip(from)
                        .limit(most)
                        .map(change -> ChangeLine.of(change, project))
                        .toList(),
                step.changes().size());
    }
}
