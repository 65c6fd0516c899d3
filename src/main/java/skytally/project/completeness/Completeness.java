package skytally.project.completeness;

import java.util.Comparator;
import java.util.List;
import java.util.stream.Stream;
import skytally.project.Project;
import skytally.project.Scheme;

/**
 * The ten questions a reviewer asks first, answered from what was said of one scheme of a project.
 *
 * <p>An answer is yes where a paper of the project, or what was worked out from one, says so; what only we assumed is
 * not known. Nothing is asked of a type of which there are to be none.
 */
public final class Completeness {

    private Completeness() {}

    /** The answers, those to be read first first: no, not known, yes. */
    public static List<Answer> of(Project project, Scheme scheme) {
        PlaceQuestions places = new PlaceQuestions(project, scheme);
        ScheduleQuestions schedule = new ScheduleQuestions(project, scheme);
        SiteQuestions site = new SiteQuestions(project);
        return Stream.of(
                        places.window(),
                        schedule.counts(),
                        schedule.tilt(),
                        schedule.upward(),
                        schedule.initial(),
                        site.zone(),
                        schedule.late(),
                        site.reading(),
                        places.observatory(),
                        schedule.shields())
                .sorted(Comparator.comparing(Answer::reply))
                .toList();
    }
}
