package skytally.browser;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.file.Path;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ConditionEvaluationResult;

@DisplayName("A test in a browser")
class BrowserConditionTest {

    private static final Path THERE = Path.of(System.getProperty("java.home"), "bin", "java");
    private static final Path MISSING = Path.of("no-such-browser");

    @Test
    void runsWhereThereIsOne() {
        assertThat(BrowserCondition.evaluate("a test", true, THERE, THERE).isDisabled())
                .isFalse();
    }

    @Test
    void isSkippedWithTheReasonWhereThereIsNone() {
        ConditionEvaluationResult result = BrowserCondition.evaluate("a test", false, THERE, MISSING);

        assertThat(result.isDisabled()).isTrue();
        assertThat(result.getReason()).hasValue("There is no no-such-browser (Debian: chromium, chromium-driver)");
    }

    @Test
    void failsWhereThereIsNoneAndOneIsRequired() {
        assertThatThrownBy(() -> BrowserCondition.evaluate("a test", true, MISSING, THERE))
                .hasMessageContaining("There is no no-such-browser")
                .hasMessageContaining("skytally.browser.required is true");
    }
}
