package skytally.project;

import java.util.Collections;
import java.util.Map;
import java.util.TreeMap;

/**
 * What was said about one thing, by the name of the field. A field nobody spoke of is not in it and reads as not known.
 *
 * @param byField in the order of their names
 */
public record Values(Map<String, Stated> byField) {

    public static final Values NONE = new Values(Map.of());

    public Values {
        byField = Collections.unmodifiableMap(new TreeMap<>(byField));
    }

    public Stated get(String field) {
        return byField.getOrDefault(field, Stated.NOTHING);
    }

    /** The value in use as typed, or empty. */
    public String text(String field) {
        return get(field).inUse().value();
    }

    /** The same with one field replaced; what says nothing is left out. */
    public Values with(String field, Stated stated) {
        Map<String, Stated> changed = new TreeMap<>(byField);
        if (stated.equals(Stated.NOTHING)) {
            changed.remove(field);
        } else {
            changed.put(field, stated);
        }
        return new Values(changed);
    }
}
