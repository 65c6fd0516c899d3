package skytally.browser;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.extension.ConditionEvaluationResult;
import org.junit.jupiter.api.extension.ExecutionCondition;
import org.junit.jupiter.api.extension.ExtensionContext;

/** Skips, with the reason printed, what needs a browser where there is none; or fails it where one is required. */
final class BrowserCondition implements ExecutionCondition {

    static final String REQUIRED = "skytally.browser.required";

    @Override
    public ConditionEvaluationResult evaluateExecutionCondition(ExtensionContext context) {
        return evaluate(context.getDisplayName(), Boolean.getBoolean(REQUIRED), Browser.CHROMIUM, Browser.DRIVER);
    }

    static ConditionEvaluationResult evaluate(String test, boolean required, Path... programs) {
        String missing = String.join(
                " and ",
                Stream.of(programs)
                        .filter(program -> !Files.isExecutable(program))
                        .map(Path::toString)
                        .toList());
        if (missing.isEmpty()) {
            return ConditionEvaluationResult.enabled("There is a browser");
        }
        String reason = "There is no " + missing + " (Debian: chromium, chromium-driver)";
        if (required) {
            throw new IllegalStateException(reason + ", and " + REQUIRED + " is true");
        }
        System.out.println("Skipped: " + test + ". " + reason + ".");
        return ConditionEvaluationResult.disabled(reason);
    }
}
