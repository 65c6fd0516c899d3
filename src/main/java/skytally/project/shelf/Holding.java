package skytally.project.shelf;

import java.util.List;
import skytally.project.Document;
import skytally.project.Project;
import skytally.project.Scheme;

/**
 * What a project holds, counted.
 *
 * @param title     of the project
 * @param schemes   each with its counts
 * @param places    how many
 * @param documents the papers, each in one line
 * @param said      of how many fields of the site something was said
 */
public record Holding(String title, List<SchemeLine> schemes, int places, List<String> documents, int said) {

    /** A scheme in one line. */
    public record SchemeLine(String mark, String name, String kind, int types, int lights) {}

    static Holding of(Project project) {
        return new Holding(
                project.title(),
                project.schemes().stream().map(Holding::line).toList(),
                project.places().size(),
                project.documents().stream().map(Holding::line).toList(),
                project.site().byField().size());
    }

    private static SchemeLine line(Scheme scheme) {
        return new SchemeLine(
                scheme.mark(),
                scheme.name(),
                scheme.kind().id(),
                scheme.types().size(),
                scheme.placements().size());
    }

    private static String line(Document document) {
        StringBuilder line = new StringBuilder(document.mark()).append(": ").append(document.title());
        append(line, ", revision ", document.revision());
        append(line, ", ", document.date());
        append(line, ", from ", document.from());
        return line.toString();
    }

    private static void append(StringBuilder line, String before, String text) {
        if (!text.isEmpty()) {
            line.append(before).append(text);
        }
    }
}
