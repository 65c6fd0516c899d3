package skytally.project.transfer;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.TreeSet;
import org.jspecify.annotations.Nullable;
import skytally.project.Project;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.ObjectNode;

/**
 * What changed between two states of a project, key by key, so that it can be told, kept, and taken back.
 *
 * <p>A key is a path of names and marks, such as {@code schemes/proposed/types/A1/values/lumens}; what stands under it
 * is the JSON text of the value there. A list of marked things has one more key, {@code #order}, with its marks in
 * their order.
 */
public final class Difference {

    private static final String ORDER = "#order";

    /**
     * One key that changed.
     *
     * @param key    where
     * @param before JSON text, or nothing where there was none
     * @param after  JSON text, or nothing where there is none any more
     */
    public record Change(
            String key, @Nullable String before, @Nullable String after) {

        /** The change that takes this one back. */
        public Change reversed() {
            return new Change(key, after, before);
        }
    }

    private Difference() {}

    /** Everything that differs, by key. */
    public static List<Change> between(Project before, Project after) {
        Map<String, String> old = flat(before);
        Map<String, String> now = flat(after);
        TreeSet<String> keys = new TreeSet<>(old.keySet());
        keys.addAll(now.keySet());
        List<Change> changes = new ArrayList<>();
        for (String key : keys) {
            if (!Objects.equals(old.get(key), now.get(key))) {
                changes.add(new Change(key, old.get(key), now.get(key)));
            }
        }
        return changes;
    }

    /**
     * The project with changes made to it.
     *
     * @throws ProjectFileException if a key does not stand as the change found it, or the outcome is no project
     */
    public static Project applied(Project project, List<Change> changes) throws ProjectFileException {
        Map<String, String> flat = flat(project);
        for (Change change : changes) {
            if (!Objects.equals(flat.get(change.key()), change.before())) {
                throw new ProjectFileException(
                        "/" + change.key(), "has been changed again since, so it cannot be undone by itself.");
            }
            if (change.after() == null) {
                flat.remove(change.key());
            } else {
                flat.put(change.key(), change.after());
            }
        }
        return ProjectFile.read(ProjectFile.text(rebuilt(flat)));
    }

    private static Map<String, String> flat(Project project) {
        Map<String, String> flat = new LinkedHashMap<>();
        flatten("", ProjectFile.tree(project), flat);
        return flat;
    }

    private static void flatten(String path, JsonNode node, Map<String, String> flat) {
        if (isOpened(node)) {
            for (Map.Entry<String, JsonNode> member : node.properties()) {
                flatten(path.isEmpty() ? member.getKey() : path + "/" + member.getKey(), member.getValue(), flat);
            }
        } else if (isListOfMarked(node)) {
            ArrayNode order = ProjectFile.newList();
            for (JsonNode one : node) {
                String mark = one.path("mark").stringValue();
                order.add(mark);
                flatten(path + "/" + mark, one, flat);
            }
            flat.put(path + "/" + ORDER, order.toString());
        } else {
            flat.put(path, node.toString());
        }
    }

    /** Objects are opened, but for a stated value and the file of a document, which change as a whole. */
    private static boolean isOpened(JsonNode node) {
        return node.isObject() && !node.has("claims") && !node.has("sha256");
    }

    private static boolean isListOfMarked(JsonNode node) {
        return node.isArray() && (node.isEmpty() || node.get(0).has("mark"));
    }

    private static ObjectNode rebuilt(Map<String, String> flat) throws ProjectFileException {
        ObjectNode root = ProjectFile.newObject();
        for (Map.Entry<String, String> entry : flat.entrySet()) {
            String[] names = entry.getKey().split("/");
            ObjectNode at = root;
            for (int i = 0; i < names.length - 1; i++) {
                at = at.withObjectProperty(names[i]);
            }
            at.set(names[names.length - 1], ProjectFile.value(entry.getValue()));
        }
        return listed(root);
    }

    /** Turns every object that has an order back into its list. */
    private static ObjectNode listed(ObjectNode node) {
        for (String name : List.copyOf(node.propertyNames())) {
            JsonNode child = node.get(name);
            if (child instanceof ObjectNode object && isOpened(object)) {
                JsonNode order = object.get(ORDER);
                if (order == null) {
                    listed(object);
                } else {
                    ArrayNode list = ProjectFile.newList();
                    for (JsonNode mark : order) {
                        if (object.get(mark.stringValue()) instanceof ObjectNode one) {
                            list.add(listed(one));
                        }
                    }
                    node.set(name, list);
                }
            }
        }
        return node;
    }
}
