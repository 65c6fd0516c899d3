package skytally.project.documents;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import skytally.project.Attachment;
import skytally.project.Document;
import skytally.project.entry.Typed;
import skytally.project.entry.Words;
import skytally.web.InvalidInputException.Fault;

/**
 * What is typed of a document.
 *
 * @param version of the project it starts from
 * @param texts   by the name of the input
 * @param faults  what is wrong
 */
public record DocumentForm(long version, Map<String, String> texts, List<Fault> faults) {

    private static final List<String> NAMES = List.of("mark", "title", "date", "revision", "from");
    private static final int LONGEST = 1000;

    static DocumentForm blank(long version) {
        return new DocumentForm(version, Map.of(), List.of());
    }

    static DocumentForm of(long version, Document document) {
        return new DocumentForm(
                version,
                Map.of(
                        "mark", document.mark(),
                        "title", document.title(),
                        "date", document.date(),
                        "revision", document.revision(),
                        "from", document.from()),
                List.of());
    }

    static DocumentForm sent(long version, Typed typed, Words words) {
        Map<String, String> texts = new LinkedHashMap<>();
        List<Fault> faults = new ArrayList<>();
        for (String name : NAMES) {
            String text = typed.text(name);
            texts.put(name, text);
            if (text.length() > LONGEST) {
                faults.add(new Fault(
                        name, words.say("entry.fault.long", words.say("document." + name), String.valueOf(LONGEST))));
            }
        }
        for (String name : List.of("mark", "title")) {
            if (typed.text(name).isEmpty()) {
                faults.add(new Fault(name, words.say("document.fault." + name)));
            }
        }
        return new DocumentForm(version, texts, faults);
    }

    DocumentForm refused(String name, String message) {
        List<Fault> more = new ArrayList<>(faults);
        more.add(new Fault(name, message));
        return new DocumentForm(version, texts, more);
    }

    boolean isValid() {
        return faults.isEmpty();
    }

    /** The document, if its mark is one. */
    Document document(@Nullable Attachment file) {
        return new Document(text("mark"), text("title"), text("date"), text("revision"), text("from"), file);
    }

    /** Of the inputs, in order. */
    public List<String> names() {
        return NAMES;
    }

    public String text(String name) {
        return texts.getOrDefault(name, "");
    }

    public boolean isWrong(String name) {
        return faults.stream().anyMatch(fault -> fault.field().equals(name));
    }
}
