package skytally.project;

import org.springframework.http.HttpStatus;
import org.springframework.web.bind.annotation.ResponseStatus;

/** A project that would not fit into a project file any more; nothing of it was saved. */
@ResponseStatus(HttpStatus.CONTENT_TOO_LARGE)
public class ProjectTooLargeException extends IllegalArgumentException {

    private static final long serialVersionUID = 1;

    ProjectTooLargeException() {
        super("The project with its files would be larger than 25 MB, the most a project file may be. Leave out a file"
                + " or some of the lights");
    }
}
