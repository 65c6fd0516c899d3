package skytally.web;

import java.util.List;
import java.util.Locale;
import org.springframework.context.MessageSource;
import org.springframework.validation.BindingResult;

/**
 * What was sent cannot be used, field by field. Told to a program as a problem with the member {@code errors} and
 * status 400; a page shows the same faults beside its fields instead, and does not throw this.
 */
public final class InvalidInputException extends RuntimeException {

    private static final long serialVersionUID = 1;

    private final transient List<Fault> faults;

    /**
     * One fault, told to the person who typed.
     *
     * @param field   the name of the field, as in the address
     * @param message what is wrong, and what would be right
     */
    public record Fault(String field, String message) {}

    /** With at least one fault. */
    public InvalidInputException(List<Fault> faults) {
        super("Invalid input in " + faults.stream().map(Fault::field).toList());
        if (faults.isEmpty()) {
            throw new IllegalArgumentException("Without a fault, input is valid");
        }
        this.faults = List.copyOf(faults);
    }

    /** The faults found by binding and validation, in the words of the message file. */
    public static List<Fault> faults(BindingResult found, MessageSource messages) {
        return found.getFieldErrors().stream()
                .map(one -> new Fault(one.getField(), messages.getMessage(one, Locale.ENGLISH)))
                .toList();
    }

    public List<Fault> faults() {
        return faults;
    }
}
