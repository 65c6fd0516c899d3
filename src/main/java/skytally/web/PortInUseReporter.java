package skytally.web;

import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import org.springframework.boot.SpringBootExceptionReporter;
import org.springframework.boot.web.server.PortInUseException;
import org.springframework.core.Ordered;
import org.springframework.core.annotation.Order;

/** Says in one line that another program, perhaps another copy of this one, listens at the port already. */
@Order(Ordered.HIGHEST_PRECEDENCE + 1)
final class PortInUseReporter implements SpringBootExceptionReporter {

    private static final Logger LOG = LoggerFactory.getLogger("skytally");

    @Override
    public boolean reportException(Throwable failure) {
        for (Throwable cause = failure; cause != null; cause = cause.getCause()) {
            if (cause instanceof PortInUseException taken) {
                LOG.error(
                        "Port {} is in use by another program. Close it, or choose another port with --server.port=8081",
                        taken.getPort());
                LOG.debug("The refusal in full", taken);
                return true;
            }
        }
        return false;
    }
}
