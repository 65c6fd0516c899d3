package skytally.skyglow;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Arrays;
import skytally.atmosphere.Aerosol;

/**
 * A kernel on disk: what it is of, its numbers, and a checksum over both (SHA-256), so that a file cut short, changed
 * or made by another method is known for what it is.
 *
 * <p>Big-endian; four bytes "SKYK", the method's version, the form of the grid and of the functions, the air and the
 * ground, then wavelength by wavelength the sizes of the rows (64 bits), the ground's illuminances and the moments
 * (32 bits each).
 */
final class KernelFile {

    private static final byte[] MAGIC = "SKYK".getBytes(StandardCharsets.US_ASCII);
    private static final int CHECKSUM_BYTES = 32;
    private static final int MOST_VERSION_BYTES = 100;
    private static final int MOST_WAVELENGTHS = 64;
    private static final int MOST_ROWS = 200;
    private static final int MOST_DEGREE = 40;

    private KernelFile() {}

    /** A file that is not the kernel asked for, and why. */
    static final class Unusable extends Exception {

        private static final long serialVersionUID = 1;

        Unusable(String reason) {
            super(reason);
        }

        Unusable(String reason, Exception cause) {
            super(reason, cause);
        }
    }

    /** Writes beside the place and moves there once all is on disk: a reader sees a whole file or none. */
    static void write(SkyglowKernel kernel, Path to) throws IOException {
        ByteBuffer bytes = ByteBuffer.wrap(content(kernel));
        Path beside = Files.createTempFile(
                to.toAbsolutePath().getParent(), to.getFileName().toString(), ".part");
        try {
            try (FileChannel channel = FileChannel.open(beside, StandardOpenOption.WRITE)) {
                while (bytes.hasRemaining()) {
                    channel.write(bytes);
                }
                channel.force(true);
            }
            moveOver(beside, to);
        } finally {
            Files.deleteIfExists(beside);
        }
    }

    /** All that the file holds, checksum last. */
    static byte[] content(SkyglowKernel kernel) {
        ByteBuffer bytes = ByteBuffer.allocate(size(kernel));
        putHead(kernel, bytes);
        for (int w = 0; w < kernel.air().wavelengths(); w++) {
            bytes.asDoubleBuffer().put(kernel.logSize(w));
            bytes.position(bytes.position() + Double.BYTES * kernel.logSize(w).length);
            putFloats(kernel.onGround(w), bytes);
            putFloats(kernel.moments(w), bytes);
        }
        bytes.put(checksum(bytes.array(), bytes.position()));
        return bytes.array();
    }

    private static void moveOver(Path from, Path to) throws IOException {
        try {
            Files.move(from, to, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
        } catch (AtomicMoveNotSupportedException e) {
            Files.move(from, to, StandardCopyOption.REPLACE_EXISTING);
        }
    }

    private static int size(SkyglowKernel kernel) {
        int wavelengths = kernel.air().wavelengths();
        int head = MAGIC.length + 5 * Integer.BYTES + version().length + (5 + 3 * wavelengths) * Double.BYTES;
        int each = kernel.logSize(0).length * Double.BYTES
                + (kernel.onGround(0).length + kernel.moments(0).length) * Float.BYTES;
        return head + Integer.BYTES + wavelengths * each + CHECKSUM_BYTES;
    }

    private static byte[] version() {
        return SkyglowKernel.METHOD.getBytes(StandardCharsets.UTF_8);
    }

    private static void putHead(SkyglowKernel kernel, ByteBuffer bytes) {
        LayeredAir air = kernel.air();
        bytes.put(MAGIC);
        bytes.putInt(version().length).put(version());
        bytes.putInt(kernel.grid().distances()).putInt(kernel.grid().levels());
        bytes.putInt(kernel.basis().highestDegree()).putInt(kernel.basis().highestOrder());
        bytes.putInt(air.wavelengths());
        Aerosol haze = air.aerosol();
        bytes.putDouble(haze.opticalDepthAt550())
                .putDouble(haze.angstromExponent())
                .putDouble(haze.scaleHeightM())
                .putDouble(haze.singleScatteringAlbedo())
                .putDouble(haze.asymmetry());
        for (double[] values : new double[][] {air.molecularDepth(), air.hazeDepth(), air.reflectance()}) {
            for (double value : values) {
                bytes.putDouble(value);
            }
        }
    }

    private static void putFloats(float[] values, ByteBuffer bytes) {
        bytes.asFloatBuffer().put(values);
        bytes.position(bytes.position() + Float.BYTES * values.length);
    }

    /**
     * Reads the kernel of this air and ground.
     *
     * @throws Unusable if the file is something else, or not whole
     */
    static SkyglowKernel read(Path from, LayeredAir expected) throws IOException, Unusable {
        byte[] all = Files.readAllBytes(from);
        int body = all.length - CHECKSUM_BYTES;
        if (body < MAGIC.length || !Arrays.equals(all, 0, MAGIC.length, MAGIC, 0, MAGIC.length)) {
            throw new Unusable("it is no kernel file");
        }
        if (!MessageDigest.isEqual(checksum(all, body), Arrays.copyOfRange(all, body, all.length))) {
            throw new Unusable("its checksum does not fit its content");
        }
        ByteBuffer bytes = ByteBuffer.wrap(all, MAGIC.length, body - MAGIC.length);
        String version = version(bytes);
        if (!version.equals(SkyglowKernel.METHOD)) {
            throw new Unusable("it was made by method " + version + ", this is " + SkyglowKernel.METHOD);
        }
        FieldGrid grid = new FieldGrid(
                within(bytes.getInt(), 2, MOST_ROWS, "rows"), within(bytes.getInt(), 2, MOST_ROWS, "levels"));
        AngularBasis basis = basis(bytes);
        LayeredAir air = air(bytes);
        if (!air.isSameAs(expected)) {
            throw new Unusable("it is of other air or other ground");
        }
        return body(bytes, air, grid, basis);
    }

    private static SkyglowKernel body(ByteBuffer bytes, LayeredAir air, FieldGrid grid, AngularBasis basis)
            throws Unusable {
        int wavelengths = air.wavelengths();
        double[][] logSize = new double[wavelengths][grid.distances()];
        float[][] onGround = new float[wavelengths][grid.distances() * ZenithHats.COUNT];
        float[][] moments = new float[wavelengths][grid.points() * basis.size() * ZenithHats.COUNT];
        long expected = (long) wavelengths
                * (Double.BYTES * logSize[0].length + Float.BYTES * ((long) onGround[0].length + moments[0].length));
        if (bytes.remaining() != expected) {
            throw new Unusable("it holds " + bytes.remaining() + " bytes of numbers, not " + expected);
        }
        for (int w = 0; w < wavelengths; w++) {
            bytes.asDoubleBuffer().get(logSize[w]);
            bytes.position(bytes.position() + Double.BYTES * logSize[w].length);
            getFloats(bytes, onGround[w]);
            getFloats(bytes, moments[w]);
        }
        return new SkyglowKernel(air, grid, basis, moments, logSize, onGround);
    }

    private static String version(ByteBuffer bytes) throws Unusable {
        byte[] version = new byte[within(bytes.getInt(), 0, MOST_VERSION_BYTES, "bytes of the method's version")];
        bytes.get(version);
        return new String(version, StandardCharsets.UTF_8);
    }

    private static AngularBasis basis(ByteBuffer bytes) throws Unusable {
        int degree = within(bytes.getInt(), 0, MOST_DEGREE, "degree");
        return new AngularBasis(degree, within(bytes.getInt(), 0, degree / 3, "order"));
    }

    private static LayeredAir air(ByteBuffer bytes) throws Unusable {
        int wavelengths = within(bytes.getInt(), 1, MOST_WAVELENGTHS, "wavelengths");
        try {
            Aerosol haze = new Aerosol(
                    bytes.getDouble(), bytes.getDouble(), bytes.getDouble(), bytes.getDouble(), bytes.getDouble());
            return new LayeredAir(
                    haze, doubles(bytes, wavelengths), doubles(bytes, wavelengths), doubles(bytes, wavelengths));
        } catch (IllegalArgumentException e) {
            throw new Unusable("its air cannot be", e);
        }
    }

    private static double[] doubles(ByteBuffer bytes, int count) {
        double[] values = new double[count];
        for (int i = 0; i < count; i++) {
            values[i] = bytes.getDouble();
        }
        return values;
    }

    private static void getFloats(ByteBuffer bytes, float[] values) {
        bytes.asFloatBuffer().get(values);
        bytes.position(bytes.position() + Float.BYTES * values.length);
    }

    private static int within(int value, int low, int high, String what) throws Unusable {
        if (value < low || value > high) {
            throw new Unusable("it says " + value + " " + what + ", which cannot be");
        }
        return value;
    }

    private static byte[] checksum(byte[] content, int length) {
        try {
            MessageDigest digest = MessageDigest.getInstance("SHA-256");
            digest.update(content, 0, length);
            return digest.digest();
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("Every Java has SHA-256", e);
        }
    }
}
