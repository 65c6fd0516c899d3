package skytally.storage;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.flywaydb.core.Flyway;

/** Databases for the tests, sound and otherwise. */
final class SampleDatabase {

    private SampleDatabase() {}

    /** Makes a database in that data directory as those migrations leave it, and closes it. */
    static byte[] in(Path data, String... locations) throws IOException {
        try (DataDirectory directory = DataDirectory.open(data)) {
            directory.prepareDatabaseFile();
            Flyway.configure()
                    .dataSource(directory.databaseUrl(), "sa", "")
                    .locations(locations)
                    .load()
                    .migrate();
            return Files.readAllBytes(directory.databaseFile());
        }
    }

    /** The same, with every byte from that place on replaced. */
    static byte[] noise(byte[] whole, int from) {
        byte[] damaged = whole.clone();
        for (int i = from; i < damaged.length; i++) {
            damaged[i] = (byte) (i * 31);
        }
        return damaged;
    }
}
