package skytally.project.transfer;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.StreamSupport;
import skytally.project.Claim;
import skytally.project.Stated;
import skytally.scene.State;
import tools.jackson.databind.JsonNode;

/**
 * What stood under a key of the history, as a person reads it.
 *
 * @param value the value in use with its unit, or the text
 * @param note  how well it is known and from where, or empty
 */
public record ToldValue(String value, String note) {

    /** Reads the JSON text of a {@link Difference.Change}. */
    public static ToldValue of(String json) {
        try {
            JsonNode node = ProjectFile.value(json);
            return node.has("claims")
                    ? of(ProjectFile.stated(new FileObject(node, "")))
                    : new ToldValue(text(node), "");
        } catch (ProjectFileException broken) {
            throw new IllegalStateException("A change is not kept whole", broken);
        }
    }

    private static ToldValue of(Stated stated) {
        Claim claim = stated.inUse();
        List<String> notes = new ArrayList<>();
        boolean known = claim.state() != State.NOT_KNOWN;
        if (known) {
            notes.add(claim.state().words());
        }
        if (!claim.low().isEmpty() || !claim.high().isEmpty()) {
            notes.add(claim.low() + " to " + claim.high());
        }
        String document = (claim.source().document() + " " + claim.source().place()).strip();
        if (!document.isEmpty()) {
            notes.add(document);
        }
        if (!claim.source().reason().isEmpty()) {
            notes.add(claim.source().reason());
        }
        notes.add(claim.party().words());
        if (!claim.who().isEmpty()) {
            notes.add("typed by " + claim.who());
        }
        int others = stated.claims().size() - 1;
        if (others > 0) {
            notes.add(others == 1 ? "1 other claim beside it" : others + " other claims beside it");
        }
        String value = known ? (claim.value() + " " + claim.unit()).strip() : State.NOT_KNOWN.words();
        return new ToldValue(value, String.join("; ", notes));
    }

    private static String text(JsonNode node) {
        if (node.isString()) {
            return node.stringValue();
        }
        if (node.isArray()) {
            return StreamSupport.stream(node.spliterator(), false)
                    .map(ToldValue::text)
                    .collect(Collectors.joining(node.path(0).isObject() ? "; " : ", "));
        }
        if (node.isObject()) {
            return node.properties().stream()
                    .map(Map.Entry::getValue)
                    .map(ToldValue::text)
                    .collect(Collectors.joining(" "));
        }
        return node.toString();
    }
}
