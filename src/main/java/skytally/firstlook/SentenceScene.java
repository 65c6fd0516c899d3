package skytally.firstlook;

import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.DirectPath;
import skytally.geometry.Attitude;
import skytally.geometry.Direction;
import skytally.geometry.Position;
import skytally.luminaire.Shape;
import skytally.photometry.LuminousFlux;
import skytally.scene.Known;
import skytally.scene.Lamp;
import skytally.scene.Look;
import skytally.scene.Observer;
import skytally.scene.OpenScene;
import skytally.scene.Property;
import skytally.scene.Scene;
import skytally.scene.Surroundings;

/**
 * The scene a sentence describes: the lights at one point, one eye to the north of them, over level ground at the
 * height of the sea.
 */
final class SentenceScene implements OpenScene {

    /** Mark of the one place. */
    static final String HERE = "here";

    private static final double TOWARD_SITE_ALTITUDE = Math.toRadians(30);

    private final Sentence sentence;
    private final Map<String, Guess> open = new LinkedHashMap<>();

    SentenceScene(Sentence sentence) {
        this.sentence = sentence;
        sentence.guesses().stream()
                .filter(Guess::hasRange)
                .forEach(guess -> open.put(guess.blank().field(), guess));
    }

    @Override
    public List<String> guesses() {
        return List.copyOf(open.keySet());
    }

    @Override
    public Known known(Property property, String mark) {
        Blank blank = blank(property);
        return sentence.isGuess(blank) ? Known.assumed(sentence.guess(blank).why()) : Known.given("your sentence");
    }

    private static Blank blank(Property property) {
        return switch (property) {
            case COUNT -> Blank.COUNT;
            case LUMENS -> Blank.LUMENS;
            case SPECTRUM -> Blank.SPECTRAL_CLASS;
            case SHAPE -> Blank.SHAPE;
            case TILT, BEARING -> Blank.TILT; // the tilt is typed as one toward the eye
            case MOUNTING_HEIGHT -> Blank.MOUNTING_HEIGHT;
            case EYE_HEIGHT -> Blank.EYE_HEIGHT;
            case DISTANCE -> Blank.DISTANCE;
            case LOOK_ANGLE -> Blank.GLARE_ANGLE;
            case AIR -> Blank.AIR;
            case GROUND -> Blank.GROUND_REFLECTANCE;
        };
    }

    @Override
    public Scene drawn(Map<String, End> ends) {
        Map<Blank, String> moved = new EnumMap<>(Blank.class);
        ends.forEach((name, end) -> {
            Guess guess = open.get(name);
            if (guess != null) {
                moved.put(guess.blank(), end == End.LOW ? guess.low() : guess.high());
            }
        });
        return scene(moved.isEmpty() ? sentence : sentence.with(moved));
    }

    private static Scene scene(Sentence s) {
        Shape shape = s.shape();
        Lamp lights = new Lamp(
                "lights",
                "lights",
                s.count(),
                new Position(0, 0, s.mountingHeightM()),
                new Attitude(shape.facesUp() ? 180 : 0, s.tiltDeg(), 0), // leans its light toward the eye
                new LuminousFlux(s.lumens()),
                shape.distribution(),
                s.spectralClass().spectrum(),
                shape.luminousSizeM(),
                shape.nearestM());
        return new Scene(
                List.of(lights),
                List.of(observer(s)),
                new Surroundings(Atmosphere.atSeaLevel(s.air()), s.groundReflectance()));
    }

    private static Observer observer(Sentence s) {
        DirectPath path = DirectPath.between(s.mountingHeightM(), s.eyeHeightM(), s.distanceM());
        Direction south = Direction.toward(Math.PI, 0);
        return new Observer(
                HERE,
                new Position(0, s.distanceM(), s.eyeHeightM()),
                south,
                List.of(
                        new Look(
                                Look.BESIDE,
                                Look.Purpose.GLARE,
                                beside(path.altitudeAtEyeRad(), Math.toRadians(s.glareAngleDeg()))),
                        new Look(Look.ZENITH, Look.Purpose.SKY, Direction.UP),
                        new Look(Look.TOWARD_SITE, Look.Purpose.SKY, Direction.toward(Math.PI, TOWARD_SITE_ALTITUDE))));
    }

    /**
     * A direction at an angle to the right of the lights: level beside them, and where they stand below the eye's
     * level, along that level, so that it does not run into the ground.
     */
    private static Direction beside(double altitudeRad, double angleRad) {
        double near = StrictMath.cos(angleRad);
        double level = StrictMath.cos(altitudeRad);
        if (altitudeRad < 0 && near < level) {
            double turn = StrictMath.acos(near / level);
            return Direction.of(-StrictMath.sin(turn), -StrictMath.cos(turn), 0);
        }
        return Direction.of(-StrictMath.sin(angleRad), -near * level, near * StrictMath.sin(altitudeRad));
    }
}
