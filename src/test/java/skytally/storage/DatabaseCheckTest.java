package skytally.storage;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatCode;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.time.Clock;
import java.util.Arrays;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

@DisplayName("The look at a database before it is used")
class DatabaseCheckTest {

    private static final String[] MIGRATIONS = {"classpath:db/migration"};

    @TempDir
    private Path temporary;

    @ParameterizedTest(name = "{0}")
    @ValueSource(strings = {"every byte wrong", "five bytes", "cut off", "a hole in the middle"})
    void refusesADamagedOneAndLeavesItAsItIs(String damage) throws Exception {
        byte[] whole = SampleDatabase.in(temporary.resolve("data"), MIGRATIONS);
        byte[] damaged = switch (damage) {
            case "every byte wrong" -> SampleDatabase.noise(whole, 0);
            case "five bytes" -> "hello".getBytes(StandardCharsets.US_ASCII);
            case "cut off" -> Arrays.copyOf(whole, 9000);
            case "a hole in the middle" -> SampleDatabase.noise(whole, 8192);
            default -> throw new IllegalArgumentException(damage);
        };

        try (DataDirectory directory = DataDirectory.open(temporary.resolve("data"))) {
            Files.write(directory.databaseFile(), damaged);

            assertThatThrownBy(() -> check(directory))
                    .isInstanceOf(StorageRefusal.class)
                    .hasMessageStartingWith("The database " + directory.databaseFile() + " is damaged")
                    .hasMessageContaining("Nothing was changed.")
                    .hasMessageContaining("before-migration");
            assertThat(directory.databaseFile()).hasBinaryContent(damaged);
        }
    }

    @Test
    void letsOneOfThisVersionThroughAsItIs() throws Exception {
        byte[] before = SampleDatabase.in(temporary.resolve("data"), MIGRATIONS);

        try (DataDirectory directory = DataDirectory.open(temporary.resolve("data"))) {
            assertThatCode(() -> check(directory)).doesNotThrowAnyException();

            assertThat(directory.databaseFile()).hasBinaryContent(before);
            assertThat(directory.path().resolve("before-migration")).doesNotExist();
        }
    }

    @Test
    void letsANewOneThrough() throws Exception {
        try (DataDirectory directory = DataDirectory.open(temporary.resolve("data"))) {
            assertThatCode(() -> check(directory)).doesNotThrowAnyException();
        }
    }

    @Test
    void refusesOneThatAnotherProgramHasOpen() throws Exception {
        SampleDatabase.in(temporary.resolve("data"), MIGRATIONS);

        try (DataDirectory directory = DataDirectory.open(temporary.resolve("data"));
                FileChannel held = FileChannel.open(directory.databaseFile(), StandardOpenOption.WRITE)) {
            assertThat(held.lock().isValid()).isTrue();
            assertThatThrownBy(() -> check(directory))
                    .isInstanceOf(StorageRefusal.class)
                    .hasMessageStartingWith("Another copy of Skytally is already using the data directory");
        }
    }

    private static void check(DataDirectory directory) {
        new DatabaseCheck(directory, MIGRATIONS, Clock.systemUTC()).run();
    }
}
