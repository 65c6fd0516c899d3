package skytally.assessment;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.Clearness;
import skytally.geometry.Attitude;
import skytally.geometry.Direction;
import skytally.geometry.Position;
import skytally.luminaire.Shape;
import skytally.luminaire.Shapes;
import skytally.photometry.LuminousFlux;
import skytally.scene.Known;
import skytally.scene.Lamp;
import skytally.scene.Look;
import skytally.scene.Observer;
import skytally.scene.OpenScene;
import skytally.scene.Property;
import skytally.scene.Scene;
import skytally.scene.Surroundings;
import skytally.spectrum.SpectralClasses;

/** Lamps, observers and scenes for tests. */
final class TestScenes {

    static final Atmosphere CLEAR = Atmosphere.atSeaLevel(Clearness.CLEAR);
    private static final List<String> LIGHTS = List.of("led3000", "led4000", "hps", "lps");

    private TestScenes() {}

    static Lamp lamp(String shape, String light, double lumens, int count, Position position, Attitude attitude) {
        Shape found = Shapes.byId(shape).orElseThrow();
        return new Lamp(
                "lamp",
                "type",
                count,
                position,
                attitude,
                new LuminousFlux(lumens),
                found.distribution(),
                SpectralClasses.byId(light).orElseThrow().spectrum(),
                found.luminousSizeM(),
                found.nearestM());
    }

    static Lamp lamp(String shape, double lumens, Position position) {
        return lamp(shape, "led3000", lumens, 1, position, Attitude.LEVEL);
    }

    /** Lamps of every shape, here and there within a kilometre, hung at random; the same each time. */
    static List<Lamp> town(int lamps) {
        Random random = new Random(42);
        List<Lamp> town = new ArrayList<>();
        for (int i = 0; i < lamps; i++) {
            town.add(lamp(
                    Shapes.all().get(i % Shapes.all().size()).id(),
                    LIGHTS.get(i % LIGHTS.size()),
                    1000 + 9000 * random.nextDouble(),
                    1 + i % 3,
                    new Position(
                            1000 * random.nextDouble() - 500,
                            1000 * random.nextDouble() - 500,
                            3 + 9 * random.nextDouble()),
                    new Attitude(360 * random.nextDouble(), 60 * random.nextDouble(), 20 * random.nextDouble() - 10)));
        }
        return town;
    }

    /** An eye north of the middle that looks overhead, toward the lights 30° up, and beside them by an angle. */
    static Observer observer(double northM, double heightM, double besideDeg) {
        double beside = Math.toRadians(besideDeg);
        return new Observer(
                "here",
                new Position(0, northM, heightM),
                Direction.toward(Math.PI, 0),
                List.of(
                        new Look(Look.BESIDE, Look.Purpose.GLARE, Direction.toward(Math.PI + beside, 0)),
                        new Look(Look.ZENITH, Look.Purpose.SKY, Direction.UP),
                        new Look(Look.TOWARD_SITE, Look.Purpose.SKY, Direction.toward(Math.PI, Math.toRadians(30)))));
    }

    static Scene scene(List<Lamp> lamps, Observer observer) {
        return new Scene(lamps, List.of(observer), new Surroundings(CLEAR, 0.12));
    }

    /** A scene with nothing left open. */
    static OpenScene settled(Scene scene) {
        return new OpenScene() {
            @Override
            public List<String> guesses() {
                return List.of();
            }

            @Override
            public Scene drawn(Map<String, End> ends) {
                return scene;
            }

            @Override
            public Known known(Property property, String mark) {
                return Known.given("the test");
            }
        };
    }
}
