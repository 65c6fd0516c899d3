package skytally.project;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import skytally.geometry.Attitude;
import skytally.luminaire.FittedShape;
import skytally.luminaire.FluxShare;
import skytally.luminaire.Shapes;
import skytally.notation.QuantityFormat;
import skytally.project.Field.Subject;
import skytally.scene.Known;
import skytally.scene.State;

/**
 * What the values of a luminaire type come to, as the scene takes them: its lumens, its shape fitted to the share stated
 * above the level, and how it hangs. The scene is drawn from it and the pages show it, so that they cannot differ.
 */
public final class TypeLight {

    /**
     * A number that was worked out or stands as it was stated.
     *
     * @param value in the field's first unit
     * @param known how well, and from where
     */
    public record Amount(double value, Known known) {}

    private final Values values;
    private final Optional<Amount> lumens;
    private final Reading shapeId;
    private final Reading tilt;
    private final Reading roll;
    private final Optional<Reading> statedShare;
    private final FittedShape shape;

    private TypeLight(Values values) {
        this.values = values;
        this.lumens = lumens(values);
        this.shapeId = shapeId(values);
        this.tilt = required("tilt");
        this.roll = required("roll");
        this.statedShare = Reading.of(Subject.TYPE, "upwardShare", values);
        this.shape = FittedShape.of(
                Shapes.byId(shapeId.text()).orElseThrow(),
                statedShare.stream().mapToDouble(each -> each.number() / 100).findFirst(),
                hang());
    }

    public static TypeLight of(Values values) {
        return new TypeLight(values);
    }

    private Reading required(String field) {
        return Reading.of(Subject.TYPE, field, values).orElseThrow();
    }

    /** What was said of the shape, else what the schedule's words are taken for, else what stands in. */
    private static Reading shapeId(Values values) {
        Optional<Claim> fromWords = values.get("shape").equals(Stated.NOTHING)
                ? ShapeFromWords.of(values.text("shapeWords"))
                : Optional.empty();
        return fromWords
                .map(claim ->
                        new Reading(claim.value(), Known.assumed(claim.source().reason())))
                .orElseGet(() -> Reading.of(Subject.TYPE, "shape", values).orElseThrow());
    }

    /** Lumens of each that leave the luminaire on the first night; nothing without lumens and without watts. */
    public Optional<Amount> lumens() {
        return lumens;
    }

    private static Optional<Amount> lumens(Values values) {
        Optional<Reading> stated = Reading.of(Subject.TYPE, "lumens", values);
        return stated.isPresent() ? stated.map(each -> leaving(each, values)) : fromWatts(values);
    }

    private static Amount leaving(Reading stated, Values values) {
        String basis =
                Reading.of(Subject.TYPE, "lumensBasis", values).orElseThrow().text();
        Optional<Reading> ratio = Reading.of(Subject.TYPE, "lightOutputRatio", values);
        double lumens = stated.number();
        return switch (basis) {
            case "lamp-initial" ->
                ratio.map(share -> new Amount(
                                lumens * share.number(),
                                new Known(
                                        weakest(
                                                State.WORKED_OUT,
                                                stated.known().state(),
                                                share.known().state()),
                                        "the lamp's " + written(lumens) + " lm times " + share.text())))
                        .orElseGet(() -> new Amount(
                                lumens,
                                Known.assumed("lumens of the bare lamp, without a light output ratio: all of it is"
                                        + " taken to leave the luminaire")));
            case "luminaire-maintained" ->
                new Amount(
                        lumens,
                        Known.assumed("lumens when aged; the first night is brighter, by how much is not stated"));
            default -> new Amount(lumens, stated.known());
        };
    }

    private static Optional<Amount> fromWatts(Values values) {
        Optional<Reading> watts = Reading.of(Subject.TYPE, "watts", values);
        Optional<Reading> efficacy = Reading.of(Subject.TYPE, "efficacy", values);
        if (watts.isEmpty() || efficacy.isEmpty()) {
            return Optional.empty();
        }
        double lumens = watts.get().number() * efficacy.get().number();
        String how = watts.get().text() + " W times " + efficacy.get().text() + " lm/W: low confidence";
        return Optional.of(new Amount(lumens, Known.assumed(how)));
    }

    /** The shape, its width and its shares. */
    public FittedShape shape() {
        return shape;
    }

    /** How well the shape is known, with what was done to it. */
    public Known shapeKnown() {
        String from = shapeId.known().from();
        return switch (shape.fit()) {
            case NOTHING_STATED, AS_STATED -> shapeId.known();
            case WIDTH_WORKED_OUT ->
                new Known(
                        weakest(
                                State.WORKED_OUT,
                                shapeId.known().state(),
                                stated().known().state()),
                        from + "; a beam of " + written(shape.beamWidthDeg()) + "°, so that " + stated().text()
                                + " % go above the level");
            case DIFFERS ->
                new Known(
                        weakest(
                                State.WORKED_OUT,
                                shapeId.known().state(),
                                stated().known().state()),
                        from + "; it sends " + written(100 * shape.shapeShare()) + " % above the level and "
                                + stated().text() + " % are stated: the brighter counts in each direction");
        };
    }

    private Reading stated() {
        return statedShare.orElseThrow();
    }

    private static String written(double value) {
        return QuantityFormat.atMost(value, 4).plain();
    }

    private static State weakest(State... states) {
        return Stream.of(states).max(State::compareTo).orElseThrow();
    }

    public double tiltDeg() {
        return tilt.number();
    }

    Known tiltKnown() {
        return tilt.known();
    }

    public double rollDeg() {
        return roll.number();
    }

    /** The bearing of the street side, or nothing where none is stated. */
    public OptionalDouble bearingDeg() {
        return bearing().stream().mapToDouble(Reading::number).findFirst();
    }

    private Optional<Reading> bearing() {
        return Reading.of(Subject.TYPE, "bearing", values);
    }

    /** How it hangs, facing north, for what does not depend on the bearing. */
    public Attitude hang() {
        return new Attitude(0, tilt.number(), roll.number());
    }

    /** How one light of the type hangs: its own values first, then the type's. */
    Attitude hang(Values light) {
        return new Attitude(
                own(light, "bearing").orElse(bearingDeg().orElse(0)),
                own(light, "tilt").orElse(tiltDeg()),
                own(light, "roll").orElse(rollDeg()));
    }

    private static OptionalDouble own(Values light, String field) {
        return Reading.of(Subject.LIGHT, field, light).stream()
                .mapToDouble(Reading::number)
                .findFirst();
    }

    /** Whether it matters to the result where one light of the type faces, and nobody says. */
    public boolean lacksBearing(Values light) {
        Attitude hang = hang(light);
        return own(light, "bearing").isEmpty()
                && bearingDeg().isEmpty()
                && FittedShape.bearingMatters(shape.light(), hang.tiltDeg(), hang.rollDeg());
    }

    /** How well it is known where the lights of the type face, given whether any lacks a bearing that matters. */
    Known bearingKnown(boolean lacking) {
        if (lacking) {
            return new Known(State.NOT_KNOWN, "no bearing is stated: reckoned as facing true north");
        }
        return bearing()
                .map(Reading::known)
                .orElseGet(() -> Known.workedOut("the bearings on the plan, or none needed"));
    }

    /** Share above the level with the type's own tilt, as reckoned with; 0 to 1. */
    public double upwardShare() {
        return FluxShare.upward(shape.light(), hang());
    }

    /** Share above the level of lights of the type, all together and each as it hangs itself; 0 to 1. */
    public double upwardShare(List<Values> lights) {
        Map<Attitude, Double> byHang = new HashMap<>();
        double up = 0;
        for (Values light : lights) {
            Attitude own = hang(light);
            Attitude north = new Attitude(0, own.tiltDeg(), own.rollDeg());
            up += byHang.computeIfAbsent(north, hang -> FluxShare.upward(shape.light(), hang));
        }
        return up / lights.size();
    }

    /** The tilt of one light of the type: its own, else the type's. */
    public double tiltDeg(Values light) {
        return own(light, "tilt").orElse(tiltDeg());
    }

    /** Share between the level and 10° above it with the type's own tilt, as reckoned with; 0 to 1. */
    public double lowShare() {
        return FluxShare.low(shape.light(), hang());
    }
}
