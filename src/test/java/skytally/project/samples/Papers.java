package skytally.project.samples;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import skytally.project.Claim;
import skytally.project.Document;
import skytally.project.Party;
import skytally.project.Source;

/** The documents of one sample, and the words by which its tables call them. */
final class Papers {

    private record Paper(String mark, Party party) {}

    private final List<Document> documents = new ArrayList<>();
    private final Map<String, Paper> byWords = new HashMap<>();

    /** Adds the next document, numbered, under the words the tables use for it. */
    Papers with(String title, String revision, String from, Party party, String... words) {
        String mark = "D" + (documents.size() + 1);
        documents.add(new Document(mark, title, "", revision, from));
        for (String each : words) {
            byWords.put(each, new Paper(mark, party));
        }
        return this;
    }

    List<Document> documents() {
        return List.copyOf(documents);
    }

    boolean has(String words) {
        return byWords.containsKey(words);
    }

    /** A value read in the document the table names, at a place in it. */
    Claim given(String value, String unit, String words, String place) {
        Paper paper = byWords.get(words);
        if (paper == null) {
            throw new IllegalArgumentException("No document is called “" + words + "”");
        }
        return Claim.given(value, unit, Source.document(paper.mark(), place), paper.party());
    }
}
