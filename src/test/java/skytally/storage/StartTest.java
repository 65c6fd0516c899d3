package skytally.storage;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.net.InetAddress;
import java.net.ServerSocket;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.springframework.jdbc.core.simple.JdbcClient;
import org.springframework.jdbc.datasource.DriverManagerDataSource;

/** Starts the tool as a process of its own, as a person does, on data directories in every state they come in. */
@DisplayName("Starting on a data directory")
class StartTest {

    @TempDir
    private Path temporary;

    @Test
    void makesItForItsOwnerOnlyAndSaysWhereThePagesAre() throws Exception {
        Path data = temporary.resolve("new/data");

        try (Run run = Run.of(data)) {
            run.awaitLine("Skytally is ready at http://localhost:");

            assertThat(run.lines()).hasSize(1);
            assertThat(run.lines().get(0)).endsWith(" - data in " + data);
            assertThat(permissions(data)).isEqualTo("rwx------");
            try (Stream<Path> files = Files.list(data)) {
                assertThat(files.toList())
                        .extracting(file -> file.getFileName() + " " + permissions(file))
                        .containsExactlyInAnyOrder("skytally.lock rw-------", "skytally.mv.db rw-------");
            }

            assertThat(Run.of(data).awaitRefusal())
                    .contains("Another copy of Skytally is already using the data directory " + data);
        }
    }

    @Test
    void refusesASecondCopy() throws Exception {
        Path data = temporary.resolve("data");

        try (DataDirectory held = DataDirectory.open(data)) {
            assertThat(Run.of(data).awaitRefusal())
                    .contains("Another copy of Skytally is already using the data directory " + held.path())
                    .contains("stop it, or start this one with another skytally.data-directory");
        }
    }

    @Test
    void saysInOneLineThatThePortIsTaken() throws Exception {
        try (ServerSocket taken = new ServerSocket(0, 1, InetAddress.getLoopbackAddress())) {
            assertThat(Run.of(temporary.resolve("data"), "--server.port=" + taken.getLocalPort())
                            .awaitRefusal())
                    .contains("Port " + taken.getLocalPort() + " is in use by another program")
                    .contains("--server.port=");
        }
    }

    @Test
    void refusesADirectoryThatCannotBeMade() throws Exception {
        Path file = Files.createFile(temporary.resolve("a-file"));

        assertThat(Run.of(file.resolve("data")).awaitRefusal())
                .contains("The data directory " + file.resolve("data") + " cannot be written")
                .contains("name another with skytally.data-directory");
    }

    @Test
    void refusesADirectoryThatIsNotItsOwners() throws Exception {
        assumeTrue(
                !"root".equals(System.getProperty("user.name")),
                "the superuser may write everywhere, so there is nothing to refuse");
        Path parent = Files.createDirectory(
                temporary.resolve("closed"),
                PosixFilePermissions.asFileAttribute(PosixFilePermissions.fromString("r-x------")));

        assertThat(Run.of(parent.resolve("data")).awaitRefusal()).contains("cannot be written (access denied)");
    }

    @Test
    void refusesADirectoryWithOtherThingsInItAndLeavesItAlone() throws Exception {
        Files.writeString(temporary.resolve("letter.txt"), "mine");
        Files.setPosixFilePermissions(temporary, PosixFilePermissions.fromString("rwxr-xr-x"));

        assertThat(Run.of(temporary).awaitRefusal()).contains("holds files that are not Skytally's");
        assertThat(permissions(temporary)).isEqualTo("rwxr-xr-x");
        assertThat(temporary).isDirectoryNotContaining("glob:**skytally*");
    }

    @Test
    void refusesADamagedDatabaseAndLeavesItAsItIs() throws Exception {
        Path data = temporary.resolve("data");
        byte[] damaged = SampleDatabase.noise(SampleDatabase.in(data, "classpath:db/migration"), 0);
        Path file = data.resolve("skytally.mv.db");
        Files.write(file, damaged);

        assertThat(Run.of(data).awaitRefusal())
                .contains("The database " + file + " is damaged and cannot be read (code 90030)")
                .contains("Nothing was changed.")
                .contains("before-migration");
        assertThat(file).hasBinaryContent(damaged);
    }

    @Test
    void refusesADatabaseOfANewerVersionAndNamesThatVersion() throws Exception {
        Path data = temporary.resolve("data");
        Path newer = Files.createDirectory(temporary.resolve("newer"));
        Files.writeString(newer.resolve("V900__later.sql"), """
                CREATE TABLE later (id INT PRIMARY KEY);
                INSERT INTO opened_by VALUES ('9.0.0', CURRENT_TIMESTAMP);
                """);
        byte[] before = SampleDatabase.in(data, "classpath:db/migration", "filesystem:" + newer);

        assertThat(Run.of(data).awaitRefusal())
                .contains("was made by a newer version of Skytally (last opened by 9.0.0)")
                .contains("Nothing was changed.");
        assertThat(data.resolve("skytally.mv.db")).hasBinaryContent(before);
    }

    @Test
    void copiesTheDatabaseAsideBeforeItChangesIt() throws Exception {
        Path data = temporary.resolve("data");
        byte[] before = SampleDatabase.in(data, "classpath:db/migration");
        Path later = Files.createDirectory(temporary.resolve("later"));
        Files.writeString(later.resolve("V900__later.sql"), "CREATE TABLE later (id INT PRIMARY KEY);");

        try (Run run = Run.of(data, "--spring.flyway.locations=classpath:db/migration,filesystem:" + later)) {
            run.awaitLine("Skytally is ready at");
        }

        try (Stream<Path> copies = Files.list(data.resolve("before-migration"))) {
            assertThat(copies.toList()).singleElement().satisfies(copy -> {
                assertThat(copy.getFileName().toString()).endsWith("-before-V900.mv.db");
                assertThat(copy).hasBinaryContent(before);
                assertThat(permissions(copy)).isEqualTo("rw-------");
            });
        }
        assertThat(permissions(data.resolve("before-migration"))).isEqualTo("rwx------");
        assertThat(JdbcClient.create(new DriverManagerDataSource("jdbc:h2:file:" + data.resolve("skytally"), "sa", ""))
                        .sql("SELECT COUNT(*) FROM later")
                        .query(Integer.class)
                        .single())
                .isZero();
    }

    private static String permissions(Path path) {
        try {
            return PosixFilePermissions.toString(Files.getPosixFilePermissions(path));
        } catch (IOException gone) {
            throw new AssertionError(gone);
        }
    }

    /** The tool in a process of its own, with everything it says. */
    private static final class Run implements AutoCloseable {

        private static final long PATIENCE_SECONDS = 120;

        private final Process process;
        private final Path says;

        private Run(Process process, Path says) {
            this.process = process;
            this.says = says;
        }

        static Run of(Path data, String... more) throws IOException {
            Path says = Files.createTempFile("skytally-start", ".log");
            List<String> command = new ArrayList<>(List.of(
                    Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                    "-XX:TieredStopAtLevel=1",
                    "-cp",
                    System.getProperty("java.class.path"),
                    "skytally.SkytallyApplication",
                    "--skytally.data-directory=" + data));
            command.addAll(List.of(more));
            if (command.stream().noneMatch(word -> word.startsWith("--server.port="))) {
                command.add("--server.port=0");
            }
            Process process = new ProcessBuilder(command)
                    .redirectErrorStream(true)
                    .redirectOutput(says.toFile())
                    .start();
            return new Run(process, says);
        }

        /** What was said, without the lines by which the virtual machine announces its options. */
        List<String> lines() throws IOException {
            return Files.readAllLines(says).stream()
                    .filter(line -> !line.startsWith("Picked up ") && !line.isBlank())
                    .toList();
        }

        void awaitLine(String part) throws IOException, InterruptedException {
            long end = System.nanoTime() + TimeUnit.SECONDS.toNanos(PATIENCE_SECONDS);
            while (lines().stream().noneMatch(line -> line.contains(part))) {
                assertThat(process.isAlive())
                        .as("running, having said %s", lines())
                        .isTrue();
                assertThat(System.nanoTime()).as("saying %s", part).isLessThan(end);
                process.waitFor(100, TimeUnit.MILLISECONDS);
            }
        }

        /** Waits until the process has stopped with a failure, having said one line. */
        String awaitRefusal() throws IOException, InterruptedException {
            try (this) {
                assertThat(process.waitFor(PATIENCE_SECONDS, TimeUnit.SECONDS))
                        .as("stopped by itself")
                        .isTrue();
                assertThat(process.exitValue()).isEqualTo(1);
                assertThat(lines()).hasSize(1);
                return lines().get(0);
            }
        }

        @Override
        public void close() throws IOException {
            process.destroy();
            try {
                if (!process.waitFor(30, TimeUnit.SECONDS)) {
                    process.destroyForcibly();
                }
            } catch (InterruptedException interrupted) {
                process.destroyForcibly();
                Thread.currentThread().interrupt();
            }
            Files.delete(says);
        }
    }
}
