package skytally.project;

/**
 * A project with the bytes of every file its documents have.
 *
 * @param project     its content
 * @param attachments no more and no fewer than it names
 */
public record WholeProject(Project project, Attachments attachments) {}
