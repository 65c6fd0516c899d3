package skytally.assessment;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.sun.management.OperatingSystemMXBean;
import java.lang.management.ManagementFactory;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import skytally.assessment.Scope.Others;
import skytally.scene.OpenScene;

@DisplayName("The largest project")
class BigSceneTest {

    /** Five seconds of two processors. What other programs do to the clock on the wall does not count. */
    private static final double WORK_SECONDS = 10;

    private static final OperatingSystemMXBean PROCESS =
            (OperatingSystemMXBean) ManagementFactory.getOperatingSystemMXBean();

    @Test
    void isAnsweredInFiveSecondsOfTwoProcessors() {
        OpenScene big = BigScene.of(20_000, 200);
        Assessor assessor = new Assessor(Circumstance.EARLY_CLEAR);
        for (Others others : List.of(Others.DIRECT, Others.DIRECT_AND_OVERHEAD)) {
            List<Double> work = new ArrayList<>();
            for (int i = 0; i < 3; i++) {
                long before = PROCESS.getProcessCpuTime();
                Assessment answer = assessor.assess(big, Scope.of("P5", others));
                work.add((PROCESS.getProcessCpuTime() - before) / 1e9);
                assertThat(answer.contributions()).hasSize(200 * 10);
                assertThat(answer.figuresOf("P5")).hasSizeGreaterThan(80);
            }
            assertThat(work.stream().mapToDouble(each -> each).min().orElseThrow())
                    .as(others + ", seconds of work: " + work)
                    .isLessThan(WORK_SECONDS);
        }
    }

    /** What is worked out for a place beside another is what is worked out for it alone. */
    @Test
    void saysOfAPlaceNotLookedAtWhatItSaysWhenLookedAt() {
        OpenScene scene = BigScene.of(1500, 6);
        Assessor assessor = new Assessor(Circumstance.EARLY_CLEAR);
        Assessment whole = assessor.assess(scene);
        Assessment part = assessor.assess(scene, Scope.of("P1", Others.DIRECT_AND_OVERHEAD));
        assertThat(part.figures().keySet()).allMatch(key -> key.startsWith("P1/"));
        assertThat(part.contributions()).hasSameSizeAs(whole.contributions());
        for (int i = 0; i < whole.contributions().size(); i++) {
            Contribution full = whole.contributions().get(i);
            Contribution share = part.contributions().get(i);
            assertThat(share.type()).isEqualTo(full.type());
            assertThat(share.illuminanceLx()).isEqualTo(full.illuminanceLx());
            assertThat(share.windowLx()).isEqualTo(full.windowLx());
            assertThat(share.veilCdM2()).isEqualTo(full.veilCdM2());
        }
        for (String place : whole.eyes().keySet()) {
            double full = overhead(whole, place);
            assertThat(overhead(part, place)).as(place).isCloseTo(full, within(0.015 * full));
        }
        assertThat(assessor.assess(scene, Scope.of("P1", Others.NOTHING)).eyes())
                .containsOnlyKeys("P1");
    }

    private static double overhead(Assessment assessment, String place) {
        return assessment.contributions().stream()
                .filter(each -> each.place().equals(place))
                .mapToDouble(Contribution::skyZenithCdM2)
                .sum();
    }
}
