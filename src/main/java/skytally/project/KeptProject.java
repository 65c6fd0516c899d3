package skytally.project;

import java.time.Instant;

/**
 * A project as it stands in the database.
 *
 * @param project   its content
 * @param version   moved on by every save; a form carries it, so that a clash is noticed
 * @param changedAt when it was last saved
 */
public record KeptProject(Project project, long version, Instant changedAt) {

    /**
     * Goes on only if nobody saved it since.
     *
     * @throws ProjectClashException if this is not the version an editor started from
     */
    public KeptProject requireVersion(long openedAt) {
        if (version != openedAt) {
            throw new ProjectClashException();
        }
        return this;
    }
}
