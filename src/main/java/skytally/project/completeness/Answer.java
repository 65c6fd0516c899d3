package skytally.project.completeness;

import java.util.List;

/**
 * An answer with its evidence.
 *
 * @param question what was asked
 * @param reply    what it comes to
 * @param says     key of the sentence of evidence, after {@code complete.} and the question's id
 * @param with     what goes into the sentence
 * @param page     where it can be seen or mended, after the address of the project
 * @param about    what stands there, as in {@code complete.go.type}
 * @param mark     of what stands there, or empty
 */
public record Answer(
        Question question, Reply reply, String says, List<Object> with, String page, String about, String mark) {

    public Answer {
        with = List.copyOf(with);
    }

    /** Key of the sentence of evidence. */
    public String key() {
        return "complete." + question.id() + "." + says;
    }
}
