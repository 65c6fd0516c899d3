package skytally.storage;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.FileAttribute;
import java.nio.file.attribute.PosixFilePermission;
import java.nio.file.attribute.PosixFilePermissions;
import java.time.Instant;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;

/**
 * The directory in which this copy of the tool keeps what is kept: readable by its owner only, and held by
 * one running copy at a time from {@link #open} to {@link #close}.
 */
public final class DataDirectory implements AutoCloseable {

    /** How many copies from before a migration are kept; the oldest goes first. */
    static final int COPIES_KEPT = 3;

    private static final String LOCK = "skytally.lock";
    private static final String DATABASE = "skytally";
    private static final String DATABASE_FILE = DATABASE + ".mv.db";
    private static final String COPIES = "before-migration";
    private static final Set<PosixFilePermission> OWNER_DIRECTORY = PosixFilePermissions.fromString("rwx------");
    private static final Set<PosixFilePermission> OWNER_FILE = PosixFilePermissions.fromString("rw-------");
    private static final DateTimeFormatter TO_THE_MILLISECOND =
            DateTimeFormatter.ofPattern("uuuuMMdd'T'HHmmssSSS'Z'", Locale.ROOT).withZone(ZoneOffset.UTC);

    private final Path path;
    private final FileChannel lockFile;

    private DataDirectory(Path path, FileChannel lockFile) {
        this.path = path;
        this.lockFile = lockFile;
    }

    /**
     * Makes the directory if it is not there, closes it to everybody but its owner, and takes hold of it.
     *
     * @throws StorageRefusal if it cannot be used, with nothing in it changed
     */
    static DataDirectory open(Path asked) {
        Path path = asked.toAbsolutePath().normalize();
        if (path.toString().contains(";")) {
            throw new StorageRefusal("The data directory " + path
                    + " has a semicolon in its name, which the database cannot open; name another with"
                    + " skytally.data-directory.");
        }
        try {
            refuseSomebodyElses(path);
            Files.createDirectories(path, ownerOnly(path, OWNER_DIRECTORY));
            keepToOwner(path, OWNER_DIRECTORY);
            return new DataDirectory(path, locked(path));
        } catch (IOException cannot) {
            throw new StorageRefusal(
                    "The data directory " + path + " cannot be written (" + reason(cannot)
                            + "); make it writable for the user that runs Skytally, or name another with"
                            + " skytally.data-directory.",
                    cannot);
        }
    }

    /** Absolute, so that it can be told to people. */
    public Path path() {
        return path;
    }

    /** The address of the database in this directory, durable at each commit and closed to the network. */
    String databaseUrl() {
        return "jdbc:h2:file:" + path.resolve(DATABASE) + ";WRITE_DELAY=0;DB_CLOSE_ON_EXIT=FALSE;TRACE_LEVEL_FILE=0";
    }

    Path databaseFile() {
        return path.resolve(DATABASE_FILE);
    }

    /** Makes an empty file for the database to grow in, so that it is its owner's from the first byte. */
    void prepareDatabaseFile() {
        try {
            if (Files.notExists(databaseFile())) {
                Files.createFile(databaseFile(), ownerOnly(path, OWNER_FILE));
            }
            keepToOwner(databaseFile(), OWNER_FILE);
            if (!Files.isWritable(databaseFile())) {
                throw new StorageRefusal("The database " + databaseFile()
                        + " cannot be written; make it writable for the user that runs Skytally.");
            }
        } catch (IOException cannot) {
            throw new StorageRefusal(
                    "The database " + databaseFile() + " cannot be made or closed to other users (" + reason(cannot)
                            + ").",
                    cannot);
        }
    }

    /**
     * Copies the closed database aside, whole or not at all, and lets go of the oldest copies.
     *
     * @param version what the database is about to be changed to
     * @return the new copy
     */
    Path copyDatabaseAside(String version, Instant now) {
        Path copies = path.resolve(COPIES);
        Path copy = copies.resolve(DATABASE + "-" + TO_THE_MILLISECOND.format(now) + "-before-" + version + ".mv.db");
        Path partial = copies.resolve("copying.part");
        try {
            Files.createDirectories(copies, ownerOnly(path, OWNER_DIRECTORY));
            keepToOwner(copies, OWNER_DIRECTORY);
            Files.copy(databaseFile(), partial, StandardCopyOption.REPLACE_EXISTING);
            keepToOwner(partial, OWNER_FILE);
            try (FileChannel written = FileChannel.open(partial, StandardOpenOption.WRITE)) {
                written.force(true);
            }
            Files.move(partial, copy, StandardCopyOption.ATOMIC_MOVE);
            List<Path> kept = copiesOldestFirst(copies);
            for (Path old : kept.subList(0, Math.max(0, kept.size() - COPIES_KEPT))) {
                Files.delete(old);
            }
            return copy;
        } catch (IOException cannot) {
            throw new StorageRefusal(
                    "The database must be changed for this version, but could not first be copied to " + copies + " ("
                            + reason(cannot) + "); make room or make it writable, and start again.",
                    cannot);
        }
    }

    private static List<Path> copiesOldestFirst(Path copies) throws IOException {
        try (Stream<Path> files = Files.list(copies)) {
            return files.filter(file -> file.getFileName().toString().endsWith(".mv.db"))
                    .sorted(Comparator.comparing(file -> file.getFileName().toString()))
                    .toList();
        }
    }

    /** Lets another copy of the tool have the directory. */
    @Override
    public void close() throws IOException {
        lockFile.close();
    }

    /** A directory with other things in it is not made private under their owner's feet. */
    private static void refuseSomebodyElses(Path path) throws IOException {
        if (!Files.isDirectory(path) || Files.exists(path.resolve(LOCK)) || Files.exists(path.resolve(DATABASE_FILE))) {
            return;
        }
        try (Stream<Path> inIt = Files.list(path)) {
            if (inIt.findAny().isPresent()) {
                throw new StorageRefusal("The data directory " + path
                        + " holds files that are not Skytally's; name an empty or a new directory with"
                        + " skytally.data-directory.");
            }
        }
    }

    private static FileChannel locked(Path path) throws IOException {
        Path file = path.resolve(LOCK);
        FileChannel channel = FileChannel.open(
                file, Set.of(StandardOpenOption.WRITE, StandardOpenOption.CREATE), ownerOnly(path, OWNER_FILE));
        try {
            keepToOwner(file, OWNER_FILE);
            FileLock lock = channel.tryLock();
            if (lock != null) {
                return channel;
            }
        } catch (OverlappingFileLockException sameProcess) {
            channel.close();
            throw inUse(path, sameProcess);
        } catch (IOException cannot) {
            channel.close();
            throw cannot;
        }
        channel.close();
        throw inUse(path, null);
    }

    static StorageRefusal inUse(Path path, @Nullable Throwable cause) {
        String line = "Another copy of Skytally is already using the data directory " + path
                + "; stop it, or start this one with another skytally.data-directory.";
        return cause == null ? new StorageRefusal(line) : new StorageRefusal(line, cause);
    }

    private static void keepToOwner(Path file, Set<PosixFilePermission> wanted) throws IOException {
        if (knowsOwners(file) && !Files.getPosixFilePermissions(file).equals(wanted)) {
            Files.setPosixFilePermissions(file, wanted);
        }
    }

    private static FileAttribute<?>[] ownerOnly(Path path, Set<PosixFilePermission> wanted) {
        return knowsOwners(path)
                ? new FileAttribute<?>[] {PosixFilePermissions.asFileAttribute(wanted)}
                : new FileAttribute<?>[0];
    }

    private static boolean knowsOwners(Path path) {
        return path.getFileSystem().supportedFileAttributeViews().contains("posix");
    }

    private static String reason(IOException cannot) {
        return cannot instanceof NoSuchFileException
                ? "no such file or directory"
                : cannot.getClass()
                        .getSimpleName()
                        .replaceAll("(?<=[a-z])(?=[A-Z])", " ")
                        .replace(" Exception", "")
                        .toLowerCase(Locale.ROOT);
    }
}
