package skytally.geometry;

/**
 * A turn in space, held as an orthonormal matrix (rows first): {@code world = M · own}.
 *
 * <p>Its inverse is its transpose, so the way back costs no more than the way there.
 */
public record Rotation(
        double xx, double xy, double xz, double yx, double yy, double yz, double zx, double zy, double zz) {

    public static final Rotation NONE = new Rotation(1, 0, 0, 0, 1, 0, 0, 0, 1);

    /** Right-handed turn about the x axis. */
    public static Rotation aboutX(double angleRad) {
        double c = StrictMath.cos(angleRad);
        double s = StrictMath.sin(angleRad);
        return new Rotation(1, 0, 0, 0, c, -s, 0, s, c);
    }

    /** Right-handed turn about the y axis. */
    public static Rotation aboutY(double angleRad) {
        double c = StrictMath.cos(angleRad);
        double s = StrictMath.sin(angleRad);
        return new Rotation(c, 0, s, 0, 1, 0, -s, 0, c);
    }

    /** Right-handed turn about the z axis. */
    public static Rotation aboutZ(double angleRad) {
        double c = StrictMath.cos(angleRad);
        double s = StrictMath.sin(angleRad);
        return new Rotation(c, -s, 0, s, c, 0, 0, 0, 1);
    }

    /** This turn after another: {@code this · first}. */
    public Rotation after(Rotation first) {
        return new Rotation(
                xx * first.xx + xy * first.yx + xz * first.zx,
                xx * first.xy + xy * first.yy + xz * first.zy,
                xx * first.xz + xy * first.yz + xz * first.zz,
                yx * first.xx + yy * first.yx + yz * first.zx,
                yx * first.xy + yy * first.yy + yz * first.zy,
                yx * first.xz + yy * first.yz + yz * first.zz,
                zx * first.xx + zy * first.yx + zz * first.zx,
                zx * first.xy + zy * first.yy + zz * first.zy,
                zx * first.xz + zy * first.yz + zz * first.zz);
    }

    /** The turn back: its matrix is this one's transposed. */
    public Rotation inverse() {
        return new Rotation(xx, yx, zx, xy, yy, zy, xz, yz, zz);
    }

    /** A direction of the turned thing's own frame, as the world sees it. */
    public Direction turn(Direction own) {
        return Direction.of(
                xx * own.x() + xy * own.y() + xz * own.z(),
                yx * own.x() + yy * own.y() + yz * own.z(),
                zx * own.x() + zy * own.y() + zz * own.z());
    }

    /** A direction of the world, as the turned thing's own frame sees it. */
    public Direction turnBack(Direction world) {
        return inverse().turn(world);
    }
}
