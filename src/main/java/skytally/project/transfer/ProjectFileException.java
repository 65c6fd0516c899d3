package skytally.project.transfer;

/** A text that is no project file, with the place in it and what to do. */
public final class ProjectFileException extends Exception {

    private static final long serialVersionUID = 1;

    private final String path;

    /**
     * @param path   where in the file, such as {@code /schemes/0/types/2/mark}; empty for the file as a whole
     * @param reason what is there and what should be
     */
    ProjectFileException(String path, String reason) {
        super(path.isEmpty() ? reason : path + ": " + reason);
        this.path = path;
    }

    public String path() {
        return path;
    }
}
