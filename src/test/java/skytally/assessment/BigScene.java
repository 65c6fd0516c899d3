package skytally.assessment;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import skytally.geometry.Attitude;
import skytally.geometry.Direction;
import skytally.geometry.Position;
import skytally.luminaire.Shape;
import skytally.luminaire.Shapes;
import skytally.photometry.LuminousFlux;
import skytally.scene.Lamp;
import skytally.scene.Look;
import skytally.scene.Observer;
import skytally.scene.OpenScene;
import skytally.scene.Present;
import skytally.scene.Scene;
import skytally.scene.Surroundings;
import skytally.spectrum.SpectralClasses;

/**
 * The largest project there may be: lights 15 m apart on a square, of ten kinds, each turned one of four ways; one place
 * in five among them, the others 1 to 11 km away, each with the directions a project asks for.
 */
final class BigScene {

    private static final List<String> SHAPES = List.of(
            "flat-area",
            "flat-area",
            "flat-road",
            "beam-60",
            "flat-area",
            "all-round-capped",
            "flat-road",
            "beam-30",
            "self-lit-panel",
            "flat-area");
    private static final double[] TILT_DEG = {0, 0, 0, 50, 0, 0, 5, 64, 90, 0};
    private static final double PITCH_M = 15;
    private static final long SEED = 7;

    private BigScene() {}

    static OpenScene of(int lights, int places) {
        Random random = new Random(SEED);
        int side = (int) Math.ceil(Math.sqrt(lights));
        List<Lamp> lamps = new ArrayList<>();
        for (int i = 0; i < lights; i++) {
            double east = (i % side - side / 2.0) * PITCH_M;
            double north = (Math.floorDiv(i, side) - side / 2.0) * PITCH_M;
            lamps.add(lamp(i, random.nextInt(SHAPES.size()), 90.0 * random.nextInt(4), east, north));
        }
        List<Observer> observers = new ArrayList<>();
        for (int i = 0; i < places; i++) {
            double distance = i % 5 == 0 ? 1000 * random.nextDouble() : 1000 + Math.pow(10, 3 + random.nextDouble());
            observers.add(observer("P" + i, distance, 2 * Math.PI * random.nextDouble()));
        }
        return TestScenes.settled(new Scene(
                lamps,
                List.of(),
                observers,
                new Surroundings(TestScenes.CLEAR, 0.12),
                Optional.of(new Present(List.of(), OptionalDouble.of(20.9))),
                List.of()));
    }

    private static Lamp lamp(int number, int kind, double bearingDeg, double east, double north) {
        Shape shape = Shapes.byId(SHAPES.get(kind)).orElseThrow();
        return new Lamp(
                "L" + number,
                "T" + kind,
                1,
                new Position(east, north, 4 + 2 * (kind % 4)),
                new Attitude(bearingDeg, TILT_DEG[kind], 0),
                new LuminousFlux(2000 + 1000 * kind),
                shape.distribution(),
                SpectralClasses.byId(kind % 2 == 0 ? "led3000" : "led4000")
                        .orElseThrow()
                        .spectrum(),
                shape.luminousSizeM(),
                shape.nearestM());
    }

    private static Observer observer(String mark, double distanceM, double bearingRad) {
        double toSite = bearingRad + Math.PI;
        double low = Math.toRadians(30);
        List<Look> looks = new ArrayList<>(List.of(
                new Look(Look.BESIDE, Look.Purpose.GLARE, Direction.toward(toSite + Look.BESIDE_RAD, 0)),
                new Look(Look.ZENITH, Look.Purpose.SKY, Direction.UP),
                new Look(Look.TOWARD_SITE, Look.Purpose.SKY, Direction.toward(toSite, low))));
        for (int quarter = 0; quarter < 4; quarter++) {
            looks.add(new Look("quarter-" + quarter, Look.Purpose.SKY, Direction.toward(quarter * Math.PI / 2, low)));
        }
        Position eye =
                new Position(distanceM * Math.sin(bearingRad) + 0.37, distanceM * Math.cos(bearingRad) + 0.21, 1.6);
        return new Observer(mark, eye, Direction.toward(toSite, 0), looks);
    }
}
