package skytally.assessment;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OperationsPerInvocation;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.Clearness;
import skytally.atmosphere.DirectPath;
import skytally.geometry.Attitude;
import skytally.geometry.Direction;
import skytally.geometry.Position;
import skytally.glare.VeilingLuminance;
import skytally.luminaire.Shapes;
import skytally.photometry.LuminousFlux;
import skytally.scene.Lamp;
import skytally.spectrum.SpectralClasses;

/**
 * Direct light and glare of a town of luminaires, each with its own place and tilt, at fifty places. A figure is the
 * cost of one pair of luminaire and place.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@Warmup(iterations = 6, time = 300, timeUnit = TimeUnit.MILLISECONDS)
@Measurement(iterations = 15, time = 300, timeUnit = TimeUnit.MILLISECONDS)
@Fork(2)
public class DirectLightBenchmark {

    private static final int PLACES = 50;
    private static final int FEW = 500;
    private static final int MANY = 10_000;
    private static final long SEED = 20_240_301;

    private static final Atmosphere AIR = Atmosphere.atSeaLevel(Clearness.CLEAR);
    private static final List<String> SHAPES = List.of("flat-area", "flat-road", "beam-60", "all-round-capped");
    private static final List<String> LIGHTS = List.of("led3000", "led4000", "hps");

    private final List<Position> eyes = new ArrayList<>();
    private final Direction facing = Direction.toward(Math.PI, 0);
    private final Direction look = Direction.toward(2.5, 0.3);
    private final DirectLight.Sum sum = new DirectLight.Sum();
    private final List<Lamp> few;
    private final DirectLight fewLights;
    private final DirectLight manyLights;

    public DirectLightBenchmark() {
        Random random = new Random(SEED);
        for (int i = 0; i < PLACES; i++) {
            eyes.add(new Position(between(random, -3000, 3000), between(random, 500, 6000), 1.6));
        }
        List<Lamp> many = new ArrayList<>();
        for (int i = 0; i < MANY; i++) {
            many.add(lamp(random));
        }
        few = List.copyOf(many.subList(0, FEW));
        fewLights = new DirectLight(few, AIR);
        manyLights = new DirectLight(many, AIR);
    }

    private static Lamp lamp(Random random) {
        return new Lamp(
                "lamp",
                "type",
                1,
                new Position(between(random, -2000, 2000), between(random, -2000, 2000), between(random, 4, 12)),
                new Attitude(between(random, 0, 360), between(random, 0, 15), between(random, -5, 5)),
                new LuminousFlux(between(random, 2000, 12_000)),
                Shapes.byId(SHAPES.get(random.nextInt(SHAPES.size())))
                        .orElseThrow()
                        .distribution(),
                SpectralClasses.byId(LIGHTS.get(random.nextInt(LIGHTS.size())))
                        .orElseThrow()
                        .spectrum(),
                0.4,
                2);
    }

    private static double between(Random random, double low, double high) {
        return low + (high - low) * random.nextDouble();
    }

    @Benchmark
    @OperationsPerInvocation(PLACES * FEW)
    public double fewLuminaires() {
        return veils(fewLights);
    }

    @Benchmark
    @OperationsPerInvocation(PLACES * MANY)
    public double manyLuminaires() {
        return veils(manyLights);
    }

    private double veils(DirectLight lights) {
        double veils = 0;
        for (int i = 0; i < PLACES; i++) {
            lights.at(eyes.get(i), facing, look, DirectLightBenchmark::veil, sum);
            veils += sum.veilCdM2() + sum.seenLx() + sum.windowLx();
        }
        return veils;
    }

    /** As a person would write it from the formulas, with the parts of the house that take one pair at a time. */
    @Benchmark
    @OperationsPerInvocation(PLACES * FEW)
    public double pairByPair() {
        double veils = 0;
        for (Position eye : eyes) {
            for (Lamp lamp : few) {
                DirectPath path = DirectPath.between(
                        lamp.position().heightM(),
                        eye.heightM(),
                        lamp.position().groundDistanceTo(eye));
                if (!path.clearsTheHorizon()) {
                    continue;
                }
                Direction toEye = Direction.toward(lamp.position().bearingTo(eye), path.altitudeAtLampRad());
                Direction toLamp = Direction.toward(eye.bearingTo(lamp.position()), path.altitudeAtEyeRad());
                Direction own = lamp.attitude().rotation().turnBack(toEye);
                double lux = lamp.allFlux().lumens()
                        * lamp.light().perLumen(own.x(), own.y(), own.z())
                        / (path.lengthM() * path.lengthM());
                double seen = lux * AIR.transmission(path, 555);
                veils +=
                        seen * (1 + veil(Math.toDegrees(look.angleTo(toLamp)))) + lux * Math.max(0, facing.dot(toLamp));
            }
        }
        return veils;
    }

    private static double veil(double angleDeg) {
        return angleDeg > VeilingLuminance.WIDEST_PRINTED_DEG
                ? 0
                : VeilingLuminance.CieGeneral.DEFAULT.perLux(Math.max(0.1, angleDeg));
    }
}
