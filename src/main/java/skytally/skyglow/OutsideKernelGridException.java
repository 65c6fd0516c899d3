package skytally.skyglow;

/** Air or ground for which no kernel is kept nor can be found between those kept; the message says why. */
public final class OutsideKernelGridException extends IllegalArgumentException {

    private static final long serialVersionUID = 1;

    OutsideKernelGridException(String reason) {
        super(reason);
    }
}
