package skytally.storage;

import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import org.springframework.boot.SpringBootExceptionReporter;
import org.springframework.core.Ordered;
import org.springframework.core.annotation.Order;

/** Says a {@link StorageRefusal} in its own one line, and keeps the general reports of a failed start from following it. */
@Order(Ordered.HIGHEST_PRECEDENCE)
final class StorageRefusalReporter implements SpringBootExceptionReporter {

    private static final Logger LOG = LoggerFactory.getLogger("skytally");

    @Override
    public boolean reportException(Throwable failure) {
        for (Throwable cause = failure; cause != null; cause = cause.getCause()) {
            if (cause instanceof StorageRefusal refusal) {
                LOG.error("{}", refusal.getMessage());
                LOG.debug("The refusal in full", refusal);
                return true;
            }
        }
        return false;
    }
}
