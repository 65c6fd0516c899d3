package skytally.review;

import java.util.LinkedHashMap;
import java.util.Map;
import skytally.project.LuminaireType;
import skytally.project.Project;
import skytally.project.Scheme;

/** What the types of a scene are called: those of the scheme, and those that are there now and stay. */
public final class TypeNames {

    /** Before the mark of a type that is there now, in a scene of another scheme. */
    private static final String THERE_NOW = "existing-";

    private static final int LONGEST = 44;

    private final Map<String, Name> names = new LinkedHashMap<>();

    /**
     * A type in words.
     *
     * @param mark as in its schedule
     * @param use  what it is for; empty where nobody said
     */
    public record Name(String mark, String use) {

        /** Both in one. */
        public String full() {
            return use.isEmpty() ? mark : mark + " " + use;
        }

        /** As it stands on a picture, where room is scarce. */
        public String onPicture(int letters) {
            String full = full();
            return full.length() <= letters
                    ? full
                    : full.substring(0, letters - 1).strip() + "…";
        }
    }

    private TypeNames() {}

    public static TypeNames of(Project project, Scheme scheme) {
        TypeNames names = new TypeNames();
        scheme.types().forEach(type -> names.names.put(type.mark(), new Name(type.mark(), use(type))));
        project.schemes().stream()
                .filter(other -> other.kind() == Scheme.Kind.EXISTING && !other.equals(scheme))
                .flatMap(other -> other.types().stream())
                .forEach(type -> names.names.put(THERE_NOW + type.mark(), thereNow(type)));
        return names;
    }

    private static String use(LuminaireType type) {
        return PlaceFrame.shortened(type.values().text("use").strip(), LONGEST);
    }

    private static Name thereNow(LuminaireType type) {
        String use = use(type);
        return new Name(type.mark(), use.isEmpty() ? "there now" : use + ", there now");
    }

    /** By the mark the type has in the scene. */
    public Name of(String typeInScene) {
        return names.getOrDefault(typeInScene, new Name(typeInScene, ""));
    }
}
