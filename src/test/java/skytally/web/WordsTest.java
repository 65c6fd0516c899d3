package skytally.web;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.Objects;
import java.util.Properties;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;

@DisplayName("The words of the message file")
class WordsTest {

    @Test
    void tellEveryFailureInFullAndEverySwitch() throws IOException {
        Properties words = new Properties();
        words.load(new InputStreamReader(
                Objects.requireNonNull(WordsTest.class.getResourceAsStream("/messages.properties")),
                StandardCharsets.UTF_8));

        for (String status : new String[] {"400", "403", "404", "405", "409", "413", "500"}) {
            assertTold(words, status);
        }
        for (Refusal refusal : Refusal.values()) {
            assertTold(words, refusal.words());
        }
        for (SwitchRow row : SwitchRow.of(new Switches(Switches.Units.METRIC, Switches.Theme.DAY), "")) {
            assertThat(words).containsKey("switch." + row.name());
            row.choices()
                    .forEach(choice -> assertThat(words).containsKey("switch." + row.name() + "." + choice.word()));
        }
    }

    private static void assertTold(Properties words, String failure) {
        assertThat(words)
                .containsKeys(
                        "error." + failure + ".title",
                        "error." + failure + ".happened",
                        "error." + failure + ".kept",
                        "error." + failure + ".do");
    }
}
