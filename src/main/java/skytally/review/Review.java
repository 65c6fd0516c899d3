package skytally.review;

import skytally.project.Project;

/**
 * One scheme of a project through the night.
 *
 * @param project its project
 * @param asked   what was asked for
 * @param early   before the curfew
 * @param late    after it
 */
public record Review(Project project, Asked asked, Night early, Night late) {

    public Night at(Hour hour) {
        return hour == Hour.EARLY ? early : late;
    }

    /** At the hour asked for. */
    public Night shown() {
        return at(asked.hour());
    }
}
