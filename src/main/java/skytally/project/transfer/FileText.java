package skytally.project.transfer;

import java.util.Iterator;
import java.util.Map;
import java.util.Set;
import tools.jackson.databind.JsonNode;

/**
 * The one text of a tree: two spaces a level, but a value with all its claims on one line, and a direction or a point on
 * one. So a line that differs is a value that differs, and the largest project still fits into a file.
 */
final class FileText {

    /** An object with one of these stands on one line. */
    private static final Set<String> ON_ONE_LINE = Set.of("claims", "bearingDeg", "distanceM");

    private final StringBuilder text = new StringBuilder();

    private FileText() {}

    static String of(JsonNode tree) {
        FileText written = new FileText();
        written.write(tree, "\n");
        return written.text.append('\n').toString();
    }

    /**
     * @param newLine what begins a line of the object that this stands in, or a space where all stands on one
     */
    private void write(JsonNode node, String newLine) {
        if (node.isObject()) {
            boolean onOneLine = newLine.equals(" ") || ON_ONE_LINE.stream().anyMatch(node::has);
            writeObject(node, onOneLine ? " " : newLine);
        } else if (node.isArray()) {
            writeList(node, newLine);
        } else {
            text.append(node);
        }
    }

    private void writeObject(JsonNode node, String newLine) {
        String inside = newLine.equals(" ") ? " " : newLine + "  ";
        text.append('{');
        Iterator<Map.Entry<String, JsonNode>> members = node.properties().iterator();
        while (members.hasNext()) {
            Map.Entry<String, JsonNode> member = members.next();
            text.append(inside).append('"').append(member.getKey()).append("\" : ");
            write(member.getValue(), inside);
            text.append(members.hasNext() ? "," : "");
        }
        text.append(newLine).append('}');
    }

    private void writeList(JsonNode list, String newLine) {
        text.append("[ ");
        for (int i = 0; i < list.size(); i++) {
            text.append(i == 0 ? "" : ", ");
            write(list.get(i), newLine);
        }
        text.append(list.isEmpty() ? "]" : " ]");
    }
}
