package skytally.guide;

import java.util.List;
import skytally.charts.TiltPicture;
import skytally.geometry.Attitude;
import skytally.luminaire.FluxShare;
import skytally.luminaire.Shape;
import skytally.luminaire.Shapes;
import skytally.notation.QuantityFormat;

/**
 * A plain shape.
 *
 * @param id      its name in files
 * @param words   as it reads in a sentence
 * @param formula intensity per lumen
 * @param tilt    it usually hangs at, in degrees
 * @param upward  share above the level, hung so, in percent
 * @param sizeM   of its bright part, in metres
 * @param svg     from the side
 */
record ShapeRow(String id, String words, String formula, String tilt, String upward, String sizeM, String svg) {

    static List<ShapeRow> all() {
        return Shapes.all().stream().map(ShapeRow::of).toList();
    }

    private static ShapeRow of(Shape shape) {
        double upward = FluxShare.upward(shape.distribution(), new Attitude(0, shape.usualTiltDeg(), 0));
        TiltPicture picture = new TiltPicture(
                "shape-" + shape.id(),
                shape.distribution(),
                shape.usualTiltDeg(),
                0,
                shape.words(),
                "From the side, how strongly it shines each way.",
                new TiltPicture.Words("", "", ""));
        return new ShapeRow(
                shape.id(),
                shape.words(),
                shape.distribution().formula(),
                QuantityFormat.atMost(shape.usualTiltDeg(), 3).plain(),
                QuantityFormat.decimals(100 * upward, 1).plain(),
                QuantityFormat.atMost(shape.luminousSizeM(), 3).plain(),
                picture.svg());
    }
}
