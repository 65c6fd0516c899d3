package skytally.project.transfer;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import skytally.project.Bounds;
import tools.jackson.databind.JsonNode;

/** One JSON object being read, member by member; what nobody asked for is refused with its path. */
final class FileObject {

    /** Makes a thing of one object of the file. */
    interface Maker<T> {
        T make(FileObject object) throws ProjectFileException;
    }

    private final JsonNode node;
    private final String path;
    private final Set<String> asked = new HashSet<>();

    FileObject(JsonNode node, String path) throws ProjectFileException {
        if (!node.isObject()) {
            throw new ProjectFileException(path, "must be an object in braces, not " + kind(node) + ".");
        }
        this.node = node;
        this.path = path;
    }

    String path() {
        return path;
    }

    /** A text that must be there. */
    String text(String member) throws ProjectFileException {
        JsonNode found = member(member);
        if (found.isMissingNode()) {
            throw new ProjectFileException(path + "/" + member, "is missing.");
        }
        return text(found, path + "/" + member);
    }

    /** A text that must be there and may be longer than what a person types. */
    String longText(String member, int longest) throws ProjectFileException {
        JsonNode found = member(member);
        if (found.isMissingNode()) {
            throw new ProjectFileException(path + "/" + member, "is missing.");
        }
        return text(found, path + "/" + member, longest);
    }

    /** A text that may be left out, and is empty then. */
    String textOrEmpty(String member) throws ProjectFileException {
        JsonNode found = member(member);
        return found.isMissingNode() ? "" : text(found, path + "/" + member);
    }

    private static String text(JsonNode found, String path) throws ProjectFileException {
        return text(found, path, Bounds.TEXT);
    }

    private static String text(JsonNode found, String path, int longest) throws ProjectFileException {
        if (!found.isString()) {
            throw new ProjectFileException(path, "must be a text in quotation marks, not " + kind(found) + ".");
        }
        String text = found.stringValue();
        if (text.length() > longest) {
            throw new ProjectFileException(path, "is longer than " + longest + " characters.");
        }
        return text;
    }

    int wholeOr(String member, int otherwise) throws ProjectFileException {
        JsonNode found = member(member);
        if (found.isMissingNode()) {
            return otherwise;
        }
        if (!found.isIntegralNumber() || !found.canConvertToInt()) {
            throw new ProjectFileException(path + "/" + member, "must be a whole number, not " + kind(found) + ".");
        }
        return found.intValue();
    }

    /** The things of a list; an absent list is empty. */
    <T> List<T> list(String member, Maker<T> maker) throws ProjectFileException {
        JsonNode found = member(member);
        String at = path + "/" + member;
        if (found.isMissingNode()) {
            return List.of();
        }
        if (!found.isArray()) {
            throw new ProjectFileException(at, "must be a list in brackets, not " + kind(found) + ".");
        }
        List<T> things = new ArrayList<>();
        for (int i = 0; i < found.size(); i++) {
            things.add(made(new FileObject(found.get(i), at + "/" + i), maker));
        }
        return things;
    }

    /** One object that may be left out. */
    <T> Optional<T> object(String member, Maker<T> maker) throws ProjectFileException {
        JsonNode found = member(member);
        return found.isMissingNode()
                ? Optional.empty()
                : Optional.of(made(new FileObject(found, path + "/" + member), maker));
    }

    /** The same with what it is when left out. */
    <T> T object(String member, Maker<T> maker, T otherwise) throws ProjectFileException {
        return object(member, maker).orElse(otherwise);
    }

    /** Every member of this object as a thing, by its name. */
    <T> Map<String, T> byName(Maker<T> maker) throws ProjectFileException {
        Map<String, T> things = new LinkedHashMap<>();
        for (Map.Entry<String, JsonNode> member : node.properties()) {
            asked.add(member.getKey());
            things.put(member.getKey(), made(new FileObject(member.getValue(), path + "/" + member.getKey()), maker));
        }
        return things;
    }

    /** Makes a thing, sees that nothing of the object was left over, and says where it refused itself. */
    static <T> T made(FileObject object, Maker<T> maker) throws ProjectFileException {
        T thing;
        try {
            thing = maker.make(object);
        } catch (IllegalArgumentException refused) {
            String reason = refused.getMessage();
            throw new ProjectFileException(object.path, reason == null ? "cannot be used." : reason + ".");
        }
        for (Map.Entry<String, JsonNode> member : object.node.properties()) {
            if (!object.asked.contains(member.getKey())) {
                throw new ProjectFileException(
                        object.path + "/" + member.getKey(),
                        "is not known to this version. Remove it, or open the file with the version that wrote it.");
            }
        }
        return thing;
    }

    private JsonNode member(String name) {
        asked.add(name);
        return node.path(name);
    }

    private static String kind(JsonNode node) {
        return switch (node.getNodeType()) {
            case ARRAY -> "a list";
            case OBJECT -> "an object";
            case STRING -> "a text";
            case NUMBER -> "a number";
            case BOOLEAN -> "true or false";
            case NULL -> "null";
            default -> "what is there";
        };
    }
}
