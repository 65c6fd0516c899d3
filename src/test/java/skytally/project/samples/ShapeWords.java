package skytally.project.samples;

import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import skytally.geometry.Attitude;
import skytally.luminaire.FluxShare;
import skytally.luminaire.Shape;
import skytally.luminaire.Shapes;

/**
 * What the schedules of the samples call a fitting, and the plain shape it is taken for. Where several shapes answer to
 * the words, the one is taken whose share above the level, as the fitting hangs, is nearest to the share stated.
 */
final class ShapeWords {

    /** Words that a fitting's name contains, the shapes they may mean, and why. The first row that fits counts. */
    private record Row(String words, List<String> shapes, String why) {}

    private static final List<Row> ROWS = List.of(
            new Row("self-lit", List.of("self-lit-panel"), "it glows by itself"),
            new Row("narrow ground spotlight", List.of("beam-10"), "narrow, by its name"),
            new Row("ground spotlight", List.of("beam-30"), "the usual beam of a spotlight for signs"),
            new Row("lit from below", List.of("diffuse-down"), "a plain face; the sign above it is not reckoned with"),
            new Row("globe on post", List.of("all-round"), "a bare globe"),
            new Row(
                    "open wall light",
                    List.of("all-round"),
                    "its lens is seen from all sides; no plain shape sends a fifth up, and this one is not dimmer"),
            new Row("louvred bollard", List.of("all-round-capped"), "it has a cap and light to all sides"),
            new Row(
                    "bowl-lens road lantern",
                    List.of("flat-road", "all-round-capped"),
                    "a bowl throws more to the side than a flat lens"),
            new Row("road lantern", List.of("flat-road"), "a flat lens for a road"),
            new Row("crossing lantern", List.of("flat-road"), "a flat lens that throws to one side"),
            new Row("forward throw", List.of("flat-road"), "it throws forward like a road light"),
            new Row(
                    "area light with house-side shield",
                    List.of("flat-road"),
                    "it throws forward like a road light; the shield is not reckoned with"),
            new Row("flat floodlight", List.of("beam-60", "beam-30"), "a flood light, aimed"),
            new Row("flat-glass floodlight", List.of("beam-60", "beam-30"), "a flood light, aimed"),
            new Row("wide", List.of("beam-60"), "wide, by its name"),
            new Row("floodlight", List.of("beam-60", "beam-30"), "a flood light, aimed"),
            new Row("flat", List.of("flat-area"), "a flat lens"));

    private ShapeWords() {}

    /** A shape, and why it was taken. */
    record Choice(String shape, String why) {}

    static Choice of(String words, double tiltDeg, double statedUpwardPercent) {
        Row row = ROWS.stream()
                .filter(each -> words.contains(each.words()))
                .findFirst()
                .orElseThrow(() -> new IllegalArgumentException("No shape answers to “" + words + "”"));
        Shape nearest = row.shapes().stream()
                .map(id -> Shapes.byId(id).orElseThrow())
                .min(Comparator.comparingDouble(shape -> Math.abs(upward(shape, tiltDeg) - statedUpwardPercent)))
                .orElseThrow();
        String share = String.format(
                Locale.ROOT,
                "as it hangs it sends %.1f %% above the level, against %.1f %% stated",
                upward(nearest, tiltDeg),
                statedUpwardPercent);
        return new Choice(
                nearest.id(), "“" + words + "” taken as: " + nearest.words() + "; " + row.why() + "; " + share);
    }

    private static double upward(Shape shape, double tiltDeg) {
        return 100 * FluxShare.upward(shape.distribution(), new Attitude(0, tiltDeg, 0));
    }
}
