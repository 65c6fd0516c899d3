package skytally.firstlook;

import static org.assertj.core.api.Assertions.assertThat;

import java.lang.management.ManagementFactory;
import java.lang.management.MemoryMXBean;
import java.util.HashMap;
import java.util.Map;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import skytally.assessment.Assessor;
import skytally.assessment.Circumstance;

@DisplayName("Ten thousand first looks")
class AnswersHeapTest {

    private static final int LOOKS = 10_000;
    private static final int WARM_UP = 1_000;
    private static final long MOST_GROWTH_BYTES = 10_000_000;

    private final MemoryMXBean memory = ManagementFactory.getMemoryMXBean();
    private final Answers answers = new Answers(new Assessor(Circumstance.EARLY_CLEAR));
    private double seen;

    @Test
    void leaveTheHeapFlat() {
        look(0, WARM_UP);
        long before = usedAfterCollection();
        look(WARM_UP, LOOKS);
        long after = usedAfterCollection();

        assertThat(seen).isPositive();
        assertThat(after - before).as("growth of the heap in bytes").isLessThan(MOST_GROWTH_BYTES);
    }

    /** No two alike, in number and in kind, so that whatever is remembered of any of them would pile up. */
    private void look(int from, int count) {
        for (int i = from; i < from + count; i++) {
            Map<String, String> typed = new HashMap<>();
            for (Blank blank : Blank.values()) {
                typed.put(
                        blank.field(),
                        blank.kind() == Blank.Kind.CHOICE
                                ? SentenceReader.choices(blank)
                                        .get(i % SentenceReader.choices(blank).size())
                                : blank.example());
            }
            typed.put("distanceM", Integer.toString(100 + i));
            typed.put("mountingHeightM", "6." + i);
            Answer answer = answers.to(EveryFigureTest.sentence(typed));
            seen += answer.figure("zenith/sky/increase").likely();
        }
    }

    private long usedAfterCollection() {
        long least = Long.MAX_VALUE;
        for (int i = 0; i < 5; i++) {
            System.gc();
            least = Math.min(least, memory.getHeapMemoryUsage().getUsed());
        }
        return least;
    }
}
