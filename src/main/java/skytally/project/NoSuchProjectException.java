package skytally.project;

import org.springframework.http.HttpStatus;
import org.springframework.web.bind.annotation.ResponseStatus;

/** No project is kept under that address, or the address is none. */
@ResponseStatus(HttpStatus.NOT_FOUND)
public final class NoSuchProjectException extends RuntimeException {

    private static final long serialVersionUID = 1;

    public NoSuchProjectException() {
        super("No project is kept under that address");
    }
}
