package skytally.assessment;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import skytally.scene.OpenScene;

/**
 * What a page of a project asks for: one place in full and the shares at all others. The largest project is 40 times one
 * of 500 lights; the ratio of the two tells what gathering saves.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 2, time = 5)
@Measurement(iterations = 3, time = 5)
@Fork(1)
public class AssessorBenchmark {

    private static final int PLACES = 200;

    private final OpenScene few = BigScene.of(500, PLACES);
    private final OpenScene many = BigScene.of(20_000, PLACES);
    private final Assessor assessor = new Assessor(Circumstance.EARLY_CLEAR);

    @Benchmark
    public Assessment fewLightsDirect() {
        return assess(few, skytally.assessment.Scope.Others.DIRECT);
    }

    @Benchmark
    public Assessment manyLightsDirect() {
        return assess(many, skytally.assessment.Scope.Others.DIRECT);
    }

    @Benchmark
    public Assessment fewLightsWithTheSky() {
        return assess(few, skytally.assessment.Scope.Others.DIRECT_AND_OVERHEAD);
    }

    @Benchmark
    public Assessment manyLightsWithTheSky() {
        return assess(many, skytally.assessment.Scope.Others.DIRECT_AND_OVERHEAD);
    }

    private Assessment assess(OpenScene scene, skytally.assessment.Scope.Others others) {
        return assessor.assess(scene, skytally.assessment.Scope.of("P5", others));
    }
}
