package skytally.project;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.BufferedReader;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;

@DisplayName("The backup the README tells")
@EnabledOnOs({OS.LINUX, OS.MAC})
class BackupTest {

    @TempDir
    private Path home;

    @Test
    void bringsBackEveryProjectWithItsHistory() throws Exception {
        List<String> commands = Files.readAllLines(Path.of("README.md")).stream()
                .filter(line -> line.startsWith("    cp -a "))
                .map(String::strip)
                .toList();
        assertThat(commands).hasSize(2);
        Path data = home.resolve(".skytally");

        List<String> kept = lines(data, SavingProcess.KEPT);
        run(commands.get(0));
        run("rm -r ~/.skytally");
        run(commands.get(1));
        List<String> found = lines(data, SavingProcess.FOUND);

        assertThat(kept).isNotEmpty();
        assertThat(found).contains(kept.get(kept.size() - 1).replace(SavingProcess.KEPT, SavingProcess.FOUND));
    }

    /** Starts the tool, lets it save a little, stops it, and gives the lines of that kind. */
    private static List<String> lines(Path data, String kind) throws IOException, InterruptedException {
        Process process = SavingProcess.on(data);
        List<String> all = new ArrayList<>();
        try (BufferedReader says = process.inputReader()) {
            boolean asked = false;
            for (String line = says.readLine(); line != null; line = says.readLine()) {
                all.add(line);
                if (!asked && line.startsWith(SavingProcess.KEPT)) {
                    asked = true;
                    process.outputWriter().append("stop").close();
                }
            }
            assertThat(process.waitFor()).isZero();
        } finally {
            process.destroyForcibly();
        }
        return all.stream().filter(line -> line.startsWith(kind)).toList();
    }

    private void run(String command) throws IOException, InterruptedException {
        ProcessBuilder shell = new ProcessBuilder("sh", "-c", command).inheritIO();
        shell.environment().put("HOME", home.toString());
        assertThat(shell.start().waitFor()).as(command).isZero();
    }
}
