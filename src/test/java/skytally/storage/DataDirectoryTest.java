package skytally.storage;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.time.Instant;
import java.util.stream.Stream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

@DisplayName("The data directory")
class DataDirectoryTest {

    @TempDir
    private Path temporary;

    @Test
    void isClosedAgainToOthersWhenItWasLeftOpen() throws Exception {
        Path data = temporary.resolve("data");
        try (DataDirectory directory = DataDirectory.open(data)) {
            directory.prepareDatabaseFile();
        }
        Files.setPosixFilePermissions(data, PosixFilePermissions.fromString("rwxr-xr-x"));
        Files.setPosixFilePermissions(data.resolve("skytally.mv.db"), PosixFilePermissions.fromString("rw-rw-r--"));
        Files.setPosixFilePermissions(data.resolve("skytally.lock"), PosixFilePermissions.fromString("rw-rw-rw-"));

        try (DataDirectory directory = DataDirectory.open(data)) {
            directory.prepareDatabaseFile();

            assertThat(Files.getPosixFilePermissions(data)).isEqualTo(PosixFilePermissions.fromString("rwx------"));
            assertThat(Files.getPosixFilePermissions(data.resolve("skytally.mv.db")))
                    .isEqualTo(PosixFilePermissions.fromString("rw-------"));
            assertThat(Files.getPosixFilePermissions(data.resolve("skytally.lock")))
                    .isEqualTo(PosixFilePermissions.fromString("rw-------"));
        }
    }

    @Test
    void isFreeAgainOnceClosed() throws Exception {
        Path data = temporary.resolve("data");
        try (DataDirectory first = DataDirectory.open(data)) {
            assertThatThrownBy(() -> DataDirectory.open(data))
                    .isInstanceOf(StorageRefusal.class)
                    .hasMessageStartingWith(
                            "Another copy of Skytally is already using the data directory " + first.path());
        }
        try (DataDirectory second = DataDirectory.open(data)) {
            assertThat(second.path()).isEqualTo(data);
        }
    }

    @Test
    void keepsTheLastThreeCopies() throws Exception {
        try (DataDirectory directory = DataDirectory.open(temporary.resolve("data"))) {
            directory.prepareDatabaseFile();
            for (int version = 2; version <= 6; version++) {
                directory.copyDatabaseAside(
                        "V" + version, Instant.parse("2026-12-01T00:00:00Z").plusSeconds(version));
            }

            try (Stream<Path> copies = Files.list(directory.path().resolve("before-migration"))) {
                assertThat(copies.map(copy -> copy.getFileName().toString()))
                        .containsExactlyInAnyOrder(
                                "skytally-20261201T000004000Z-before-V4.mv.db",
                                "skytally-20261201T000005000Z-before-V5.mv.db",
                                "skytally-20261201T000006000Z-before-V6.mv.db");
            }
        }
    }

    @Test
    void mayNotHaveASemicolonInItsNameBecauseTheDatabaseReadsThatAsAnOption() {
        assertThatThrownBy(() -> DataDirectory.open(temporary.resolve("data;INIT=x")))
                .isInstanceOf(StorageRefusal.class)
                .hasMessageContaining("has a semicolon in its name");
    }
}
