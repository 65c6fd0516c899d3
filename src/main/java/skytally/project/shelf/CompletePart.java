package skytally.project.shelf;

import java.util.List;
import java.util.Optional;
import skytally.project.Project;
import skytally.project.Scheme;
import skytally.project.completeness.Answer;
import skytally.project.completeness.Completeness;
import skytally.project.completeness.Reply;
import skytally.project.entry.Words;

/**
 * The first part of a project's front page: is it complete?
 *
 * @param schemes     each that may be asked about, by a link
 * @param lines       the questions and their answers, those to be mended first
 * @param tally       how many of each answer
 * @param notAssessed what no number speaks of
 */
public record CompletePart(List<Choice> schemes, List<Line> lines, String tally, List<String> notAssessed) {

    /** A scheme to ask about. */
    public record Choice(String mark, String name, boolean current) {}

    /**
     * A question and its answer.
     *
     * @param question in words
     * @param reply    id of the answer, as in style sheets and messages
     * @param says     the evidence, in one sentence
     * @param href     where it can be seen or mended
     * @param go       what stands there
     */
    public record Line(String question, String reply, String says, String href, String go) {}

    /**
     * Of one scheme.
     *
     * @param asked mark of the scheme asked about; any other text is the proposal
     */
    static CompletePart of(Project project, String asked, Words words) {
        Optional<Scheme> proposed = project.schemes().stream()
                .filter(scheme -> scheme.kind() == Scheme.Kind.PROPOSED)
                .findFirst();
        Scheme about = project.scheme(asked)
                .or(() -> proposed)
                .or(() -> project.schemes().stream().findFirst())
                .orElseGet(() -> new Scheme("proposed", Scheme.Kind.PROPOSED, "", List.of(), List.of()));
        List<Answer> answers = Completeness.of(project, about);
        return new CompletePart(
                project.schemes().stream()
                        .filter(scheme ->
                                scheme.equals(about) || !scheme.types().isEmpty())
                        .map(scheme -> new Choice(scheme.mark(), scheme.name(), scheme.equals(about)))
                        .toList(),
                answers.stream().map(answer -> line(project, answer, words)).toList(),
                words.say(
                        "complete.tally",
                        count(answers, Reply.NO),
                        count(answers, Reply.NOT_KNOWN),
                        count(answers, Reply.YES)),
                List.of(words.say("complete.not-assessed.list").split("; ")));
    }

    private static long count(List<Answer> answers, Reply reply) {
        return answers.stream().filter(answer -> answer.reply() == reply).count();
    }

    private static Line line(Project project, Answer answer, Words words) {
        return new Line(
                words.say("complete." + answer.question().id()),
                answer.reply().id(),
                words.say(answer.key(), answer.with().toArray()),
                "/projects/" + project.id() + "/" + answer.page(),
                words.say("complete.go." + answer.about(), answer.mark()));
    }
}
