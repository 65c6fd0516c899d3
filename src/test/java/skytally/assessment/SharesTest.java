package skytally.assessment;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import skytally.assessment.Shares.Share;

@DisplayName("What each type causes of one number")
class SharesTest {

    private static Shares of(double... lux) {
        List<Contribution> all = new ArrayList<>();
        for (int i = 0; i < lux.length; i++) {
            all.add(new Contribution("here", "T" + i, lux[i], 0, 0, Map.of()));
        }
        all.add(new Contribution("elsewhere", "T0", 1000, 0, 0, Map.of()));
        Assessment assessment =
                new Assessment(Circumstance.EARLY_CLEAR, Map.of(), Map.of(), all, Map.of(), List.of(), List.of());
        return Shares.of(assessment, "here", Contribution::illuminanceLx);
    }

    @Test
    void isItsPartOfAHundred() {
        Shares shares = of(1, 0, 3, Double.NaN);

        assertThat(shares.total()).isEqualTo(4);
        assertThat(shares.all()).extracting(Share::percent).containsExactly(25.0, 0.0, 75.0, 0.0);
        assertThat(shares.ranked()).extracting(Share::type).containsExactly("T2", "T0");
        assertThat(shares.of("T1")).isEmpty();
        assertThat(shares.together("others", List.of("T0", "T1")))
                .hasValueSatisfying(both -> assertThat(both.percent()).isEqualTo(25));
        assertThat(shares.together("others", List.of("T1", "T3"))).isEmpty();
    }

    @Test
    void isNoneWhereThereIsNothingToShare() {
        assertThat(of(0, 0).total()).isZero();
        assertThat(of(0, 0).all()).extracting(Share::percent).containsOnly(0.0);
    }

    @Test
    void addsUpToTheNumberOfTheAssessment() {
        Assessment assessment = new Assessor(Circumstance.EARLY_CLEAR)
                .assess(TestScenes.settled(TestScenes.scene(TestScenes.town(12), TestScenes.observer(2000, 10, 10))));
        double all = assessment.figure("here", "direct/illuminance").likely();

        Shares shares = Shares.of(assessment, "here", Contribution::illuminanceLx);

        assertThat(shares.total()).isCloseTo(all, within(1e-9 * all));
        assertThat(shares.all().stream().mapToDouble(Share::percent).sum()).isCloseTo(100, within(1e-9));
    }
}
