package skytally.project.completeness;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import skytally.project.Claim;
import skytally.project.Project;
import skytally.project.Stated;
import skytally.scene.State;

/** What is asked of the site and its sky. */
final class SiteQuestions {

    private static final String READING = "existingZenithBrightness";
    private static final Pattern DATE = Pattern.compile("\\b\\d{4}-\\d{2}-\\d{2}\\b");

    private final Project project;

    SiteQuestions(Project project) {
        this.project = project;
    }

    /** Of both kinds of zone the one that is argued worse. */
    Answer zone() {
        return Stream.of("zone", "lightingZone")
                .filter(field -> project.site().get(field).inUse().state() != State.NOT_KNOWN)
                .map(this::zone)
                .min(Comparator.comparing(Answer::reply))
                .orElseGet(() -> answer(Question.ZONE, Reply.NO, "none", "zone"));
    }

    private Answer zone(String field) {
        Stated zone = project.site().get(field);
        Claim used = zone.inUse();
        String why = Told.source(project, used);
        Optional<Claim> other = zone.claims().stream()
                .filter(claim -> !claim.value().isEmpty() && !claim.value().equals(used.value()))
                .findFirst();
        if (other.isPresent()) {
            Claim against = other.get();
            return answer(
                    Question.ZONE,
                    Reply.NOT_KNOWN,
                    "disputed",
                    field,
                    used.value(),
                    why,
                    against.value(),
                    against.party().words(),
                    Told.source(project, against));
        }
        return why.isEmpty()
                ? answer(Question.ZONE, Reply.NO, "unargued", field, used.value())
                : answer(Question.ZONE, Reply.YES, "argued", field, used.value(), why);
    }

    /** The date a claim was typed on is not the date of the reading: that stands in its paper or its words. */
    Answer reading() {
        Claim reading = project.site().get(READING).inUse();
        if (reading.state() == State.NOT_KNOWN) {
            return answer(Question.READING, Reply.NO, "none", READING);
        }
        String told = Told.typed(reading);
        String source = Told.source(project, reading);
        return date(reading)
                .map(date -> answer(Question.READING, Reply.YES, "dated", READING, told, date, source))
                .orElseGet(() -> answer(Question.READING, Reply.NO, "undated", READING, told, source));
    }

    private Optional<String> date(Claim claim) {
        Matcher inWords =
                DATE.matcher(claim.source().place() + " " + claim.source().reason());
        if (inWords.find()) {
            return Optional.of(inWords.group());
        }
        return project.document(claim.source().document())
                .map(document -> document.date().strip())
                .filter(date -> !date.isEmpty());
    }

    private static Answer answer(Question question, Reply reply, String says, String field, Object... with) {
        return new Answer(question, reply, says, List.of(with), "site#" + field, "site", "");
    }
}
