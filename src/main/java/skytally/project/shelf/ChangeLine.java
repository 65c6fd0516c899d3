package skytally.project.shelf;

import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import skytally.project.Field;
import skytally.project.Fields;
import skytally.project.Project;
import skytally.project.Scheme;
import skytally.project.transfer.Difference;
import skytally.project.transfer.ToldValue;

/**
 * One key that changed, in words.
 *
 * @param thing  what it belongs to, such as "Type A1, What is proposed"
 * @param what   of it, such as "Lumens of each"
 * @param before or nothing where there was none
 * @param after  or nothing where there is none any more
 */
public record ChangeLine(
        String thing,
        String what,
        @Nullable ToldValue before,
        @Nullable ToldValue after) {

    private static final int LONGEST = 300;

    /** Members that are no fields of the catalogue. */
    private static final Map<String, String> MEMBERS = Map.ofEntries(
            Map.entry("title", "Title"),
            Map.entry("name", "Name"),
            Map.entry("kind", "Kind"),
            Map.entry("date", "Date"),
            Map.entry("revision", "Revision"),
            Map.entry("from", "From whom"),
            Map.entry("type", "Type"),
            Map.entry("mark", "Mark"),
            Map.entry("file", "File"),
            Map.entry("ground", "Ground toward the site"),
            Map.entry("looks", "Directions looked at"),
            Map.entry("horizon", "Skyline"),
            Map.entry("#order", "Order"));

    static ChangeLine of(Difference.Change change, Project project) {
        List<String> path = List.of(change.key().split("/"));
        return new ChangeLine(thing(path, project), what(path), told(change.before()), told(change.after()));
    }

    private static @Nullable ToldValue told(@Nullable String json) {
        if (json == null) {
            return null;
        }
        ToldValue told = ToldValue.of(json);
        if (told.value().isEmpty()) {
            return null;
        }
        return told.value().length() <= LONGEST
                ? told
                : new ToldValue(told.value().substring(0, LONGEST) + "…", told.note());
    }

    private static String thing(List<String> path, Project project) {
        boolean inList = path.size() > 2;
        return switch (path.get(0)) {
            case "site" -> "Site";
            case "documents" -> inList ? "Document " + path.get(1) : "Documents";
            case "places" -> inList ? "Place " + path.get(1) : "Places";
            case "schemes" -> inList ? inScheme(path, schemeName(path.get(1), project)) : "Schemes";
            default -> "Project";
        };
    }

    private static String inScheme(List<String> path, String scheme) {
        boolean inList = path.size() > 4;
        return switch (path.get(2)) {
            case "types" -> (inList ? "Type " + path.get(3) : "Types") + ", " + scheme;
            case "placements" -> (inList ? "Light " + path.get(3) : "Lights") + ", " + scheme;
            default -> "Scheme " + scheme;
        };
    }

    private static String schemeName(String mark, Project project) {
        return project.scheme(mark)
                .map(Scheme::name)
                .filter(name -> !name.isBlank())
                .orElse(mark);
    }

    private static String what(List<String> path) {
        String last = path.get(path.size() - 1);
        Field.Subject subject = switch (path.get(0)) {
            case "site" -> Field.Subject.SITE;
            case "places" -> Field.Subject.PLACE;
            case "schemes" -> path.contains("types") ? Field.Subject.TYPE : Field.Subject.LIGHT;
            default -> null;
        };
        boolean isField = subject == Field.Subject.SITE || path.contains("values");
        return subject != null && isField
                ? Fields.find(subject, last).map(Field::label).orElse(last)
                : MEMBERS.getOrDefault(last, last);
    }
}
