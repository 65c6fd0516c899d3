package skytally.project;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.BufferedReader;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.Map;
import java.util.Objects;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * Kills the process in the middle of saving, again and again, on one data directory. The process is the tool without
 * its pages, because a start with them takes several times as long; the saves and the database are the same.
 */
@DisplayName("A save that was acknowledged")
class KilledTest {

    private static final int KILLS = 20;

    @TempDir
    private Path temporary;

    /** What was acknowledged of one project: how many saves, and the title of the last. */
    private record Acknowledged(int saves, String title) {}

    @Test
    void isFoundAfterTheProcessWasKilled() throws Exception {
        Map<String, Acknowledged> all = new HashMap<>();
        for (int kill = 0; kill <= KILLS; kill++) {
            Process process = SavingProcess.on(temporary.resolve("data"));
            try (BufferedReader says = process.inputReader()) {
                Map<String, Acknowledged> found = new HashMap<>();
                String line = says.readLine();
                while (line != null && !line.equals(SavingProcess.READY)) {
                    if (line.startsWith(SavingProcess.FOUND)) {
                        note(line.substring(SavingProcess.FOUND.length()), found);
                    }
                    line = says.readLine();
                }
                assertThat(line).as("started after %d kills", kill).isEqualTo(SavingProcess.READY);
                assertKept(all, found);

                // Killed at another moment each time, mostly within a save; a line already sent counts.
                for (int saves = 0; saves < 1 + kill % 7; saves++) {
                    acknowledge(says.readLine(), all);
                }
                Thread.sleep(kill % 5);
                // By its handle, which leaves what it said before to be read.
                assertThat(process.toHandle().destroyForcibly()).isTrue();
                for (String late = says.readLine(); late != null; late = says.readLine()) {
                    if (late.matches("kept \\S+ \\d \\d of \\d+")) {
                        acknowledge(late, all);
                    }
                }
                assertThat(process.waitFor()).isNotZero();
            } finally {
                process.destroyForcibly();
            }
        }
        assertThat(all).hasSizeGreaterThanOrEqualTo(KILLS);
    }

    /** The last line before a kill may be cut short; it is then not counted as acknowledged. */
    private static void acknowledge(String line, Map<String, Acknowledged> all) {
        assertThat(line).startsWith(SavingProcess.KEPT);
        note(line.substring(SavingProcess.KEPT.length()), all);
    }

    private static void note(String rest, Map<String, Acknowledged> into) {
        String[] parts = rest.split(" ", 3);
        into.put(parts[0], new Acknowledged(Integer.parseInt(parts[1]), parts[2]));
    }

    private static void assertKept(Map<String, Acknowledged> all, Map<String, Acknowledged> found) {
        all.forEach((id, acknowledged) -> {
            Acknowledged kept = Objects.requireNonNull(found.get(id), () -> "lost: " + id);
            assertThat(kept.saves()).isGreaterThanOrEqualTo(acknowledged.saves());
            if (kept.saves() == acknowledged.saves()) {
                assertThat(kept.title()).isEqualTo(acknowledged.title());
            }
        });
    }
}
