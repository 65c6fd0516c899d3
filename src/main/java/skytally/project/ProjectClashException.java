package skytally.project;

/** Somebody saved the same project first. */
public final class ProjectClashException extends RuntimeException {

    private static final long serialVersionUID = 1;

    ProjectClashException() {
        super("The project was saved by somebody else since it was opened");
    }
}
