package skytally.storage;

import org.springframework.boot.ExitCodeGenerator;

/**
 * The tool cannot start on this data directory, and has changed nothing in it.
 * The message is one line for the person who started it: what is wrong, and what to do.
 */
final class StorageRefusal extends RuntimeException implements ExitCodeGenerator {

    private static final long serialVersionUID = 1;

    StorageRefusal(String oneLine) {
        super(oneLine);
    }

    StorageRefusal(String oneLine, Throwable cause) {
        super(oneLine, cause);
    }

    @Override
    public int getExitCode() {
        return 1;
    }
}
