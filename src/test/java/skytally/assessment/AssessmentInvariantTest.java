package skytally.assessment;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Locale;
import java.util.Objects;
import java.util.concurrent.Callable;
import java.util.concurrent.CyclicBarrier;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import skytally.geometry.Attitude;
import skytally.geometry.Position;
import skytally.scene.Lamp;
import skytally.scene.Observer;

@DisplayName("Assessments: what must hold whatever the numbers")
class AssessmentInvariantTest {

    private static final Observer HERE = TestScenes.observer(1500, 1.6, 10);

    private static Assessment town() {
        return assess(TestScenes.town(6));
    }

    private static Assessment assess(List<Lamp> lamps) {
        return new Assessor(Circumstance.EARLY_CLEAR).assess(TestScenes.settled(TestScenes.scene(lamps, HERE)));
    }

    private static Lamp flatLens(double lumens, int count) {
        return TestScenes.lamp("flat-area", "led3000", lumens, count, new Position(0, 0, 6), Attitude.LEVEL);
    }

    /** To the last bit and the last letter, workings and all: {@code equals} of records compares doubles by their bits. */
    @Test
    void theSameSceneGivesTheSameAnswerOnTwoThreadsAtOnce() throws Exception {
        Assessment alone = town();
        CyclicBarrier together = new CyclicBarrier(2);
        Callable<Assessment> task = () -> {
            together.await();
            return town();
        };
        ExecutorService threads = Executors.newFixedThreadPool(2);
        try {
            for (Future<Assessment> other : threads.invokeAll(List.of(task, task))) {
                assertThat(other.get()).isEqualTo(alone);
            }
        } finally {
            threads.shutdown();
        }
    }

    @Test
    void theLocaleOfTheMachineDoesNotMatter() {
        Assessment usual = town();
        Locale before = Locale.getDefault();
        try {
            for (String tag : List.of("de-DE", "tr-TR", "ar-EG-u-nu-arab", "hi-IN-u-nu-deva")) {
                Locale.setDefault(Locale.forLanguageTag(tag));
                assertThat(town()).as(tag).isEqualTo(usual);
            }
        } finally {
            Locale.setDefault(before);
        }
    }

    @Test
    void twiceTheLumensAreTwiceTheLight() {
        Assessment once = assess(List.of(flatLens(4000, 1)));
        Assessment twice = assess(List.of(flatLens(8000, 1)));
        for (String measure : List.of(
                "direct/illuminance",
                "direct/window-illuminance",
                "beside/glare/veil",
                "beside/glare/halo",
                "zenith/sky/artificial",
                "toward-site/sky/increase")) {
            double one = once.figure("here", measure).likely();
            assertThat(twice.figure("here", measure).likely()).as(measure).isCloseTo(2 * one, within(1e-12 * one));
        }
        assertThat(once.figure("here", "direct/magnitude").likely()
                        - twice.figure("here", "direct/magnitude").likely())
                .isCloseTo(2.5 * Math.log10(2), within(1e-12));
    }

    @Test
    void lampsAtOnePointAreAsGoodAsTheirCount() {
        Assessment apart = assess(List.of(flatLens(4000, 1), flatLens(4000, 2)));
        Assessment together = assess(List.of(flatLens(4000, 3)));
        assertThat(apart.figures().keySet()).isEqualTo(together.figures().keySet());
        for (Figure figure : together.figures().values()) {
            Figure other = Objects.requireNonNull(apart.figures().get(figure.key()));
            assertThat(other.range().isPresent())
                    .as(figure.key())
                    .isEqualTo(figure.range().isPresent());
            figure.range()
                    .ifPresent(range -> assertThat(other.likely())
                            .as(figure.key())
                            .isCloseTo(range.likely(), within(1e-12 * Math.abs(range.likely()))));
        }
    }

    @Test
    void noLightLeavesTheNaturalSky() {
        Assessment dark = assess(List.of(flatLens(0, 1)));
        assertThat(dark.figure("here", "direct/illuminance").likely()).isZero();
        assertThat(dark.figure("here", "beside/glare/veil").likely()).isZero();
        assertThat(dark.figure("here", "zenith/sky/artificial").likely()).isZero();
        assertThat(dark.figure("here", "zenith/sky/brightness").likely())
                .isEqualTo(dark.figure("here", "zenith/sky/natural-brightness").likely());
        assertThat(dark.figure("here", "direct/magnitude").range()).isEmpty();
    }
}
