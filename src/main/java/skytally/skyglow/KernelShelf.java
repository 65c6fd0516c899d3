package skytally.skyglow;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.lang.ref.SoftReference;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.Locale;
import java.util.function.DoubleConsumer;
import org.jspecify.annotations.Nullable;
import skytally.atmosphere.Atmosphere;

/**
 * The kernels kept on disk: twenty of them, for hazes of 0.05, 0.10, 0.20, 0.30 and 0.40 over grounds of reflectance
 * 0.05, 0.15, 0.30 and 0.80, about 6 MB each, and any between them without solving. What lies outside is refused with
 * the reason; {@link SkyglowKernel#solve} works it out in some seconds.
 *
 * <p>A file that is missing, damaged, of other air or made by an earlier method is made again. Safe for use by
 * several threads; one at a time makes what is missing.
 */
public final class KernelShelf {

    private static final System.Logger LOG = System.getLogger(KernelShelf.class.getName());

    private final Path directory;
    private final Solver solver;
    private final KernelGrid grid = new KernelGrid(this::ready);
    private final SoftReference<SkyglowKernel>[][] read;
    private final boolean[][] sound;

    /** How a kernel is made. */
    interface Solver {
        SkyglowKernel solve(LayeredAir air, DoubleConsumer progress);
    }

    /** @param directory where the files are and will be; it must be there */
    public KernelShelf(Path directory) {
        this(directory, SkyglowKernel::solve);
    }

    @SuppressWarnings({"unchecked", "rawtypes"}) // arrays know nothing of type arguments
    KernelShelf(Path directory, Solver solver) {
        this.directory = directory;
        this.solver = solver;
        this.read = new SoftReference[KernelGrid.HAZE_DEPTHS.length][KernelGrid.REFLECTANCES.length];
        this.sound = new boolean[KernelGrid.HAZE_DEPTHS.length][KernelGrid.REFLECTANCES.length];
    }

    /** How many kernels there are on a full shelf. */
    public static int size() {
        return KernelGrid.COUNT;
    }

    /** How many have been read and found sound, or made, since the start. */
    public synchronized int ready() {
        int count = 0;
        for (boolean[] row : sound) {
            for (boolean one : row) {
                count += one ? 1 : 0;
            }
        }
        return count;
    }

    /** Whether {@link #between} has all it needs. */
    public boolean isFull() {
        return ready() == size();
    }

    /**
     * Looks through the shelf and makes what is missing or not sound: about a minute at the very first start, moments
     * later on. Call it from a thread of its own.
     *
     * @param progress told the share done, 0 to 1; an exception from it stops the work, and whole kernels made until
     *                 then stay
     * @throws IOException if a file cannot be read or written; the message names it
     */
    public void fill(DoubleConsumer progress) throws IOException {
        int done = 0;
        for (int haze = 0; haze < KernelGrid.HAZE_DEPTHS.length; haze++) {
            for (int reflectance = 0; reflectance < KernelGrid.REFLECTANCES.length; reflectance++) {
                int before = done;
                fetch(haze, reflectance, share -> progress.accept((before + share) / size()));
                done++;
                progress.accept(done / (double) size());
            }
        }
    }

    /**
     * The kernel of this air over matt ground, from those kept.
     *
     * @throws OutsideKernelGridException if it lies beyond them
     * @throws IllegalStateException      if the shelf has not been filled yet
     */
    public SkyglowKernel between(Atmosphere air, double reflectance, double... wavelengthsNm) {
        return grid.between(air, reflectance, wavelengthsNm);
    }

    private SkyglowKernel ready(int haze, int reflectance) {
        synchronized (this) {
            if (!sound[haze][reflectance]) {
                throw new IllegalStateException(
                        "The kernels are being made: " + ready() + " of " + size() + " are ready");
            }
        }
        try {
            return fetch(haze, reflectance, share -> {});
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private SkyglowKernel fetch(int haze, int reflectance, DoubleConsumer progress) throws IOException {
        SkyglowKernel kernel = inMemory(haze, reflectance);
        if (kernel != null) {
            return kernel;
        }
        synchronized (read[haze]) {
            kernel = inMemory(haze, reflectance);
            if (kernel == null) {
                kernel = readOrMade(haze, reflectance, progress);
                keep(haze, reflectance, kernel);
            }
            return kernel;
        }
    }

    private synchronized @Nullable SkyglowKernel inMemory(int haze, int reflectance) {
        SoftReference<SkyglowKernel> reference = read[haze][reflectance];
        return reference == null ? null : reference.get();
    }

    private synchronized void keep(int haze, int reflectance, SkyglowKernel kernel) {
        read[haze][reflectance] = new SoftReference<>(kernel);
        sound[haze][reflectance] = true;
    }

    private SkyglowKernel readOrMade(int haze, int reflectance, DoubleConsumer progress) throws IOException {
        LayeredAir air = KernelGrid.node(haze, reflectance);
        Path file = file(haze, reflectance);
        try {
            return KernelFile.read(file, air);
        } catch (NoSuchFileException e) {
            LOG.log(System.Logger.Level.DEBUG, "No {0} yet; making it", file.getFileName());
        } catch (KernelFile.Unusable e) {
            LOG.log(System.Logger.Level.WARNING, "{0} is made again: {1}", file.getFileName(), e.getMessage());
        }
        SkyglowKernel made = solver.solve(air, progress);
        Files.createDirectories(directory);
        KernelFile.write(made, file);
        return made;
    }

    /** Where a kernel is kept. */
    Path file(int haze, int reflectance) {
        return directory.resolve(String.format(
                Locale.ROOT,
                "haze-%.2f-ground-%.2f.kernel",
                KernelGrid.HAZE_DEPTHS[haze],
                KernelGrid.REFLECTANCES[reflectance]));
    }
}
