package skytally.project;

import java.time.Instant;

/**
 * A project as it stands in the database.
 *
 * @param project   its content
 * @param version   moved on by every save; a form carries it, so that a clash is noticed
 * @param changedAt when it was last saved
 */
public record KeptProject(Project project, long version, Instant changedAt) {}
