package skytally.project;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Function;
import java.util.regex.Pattern;

/** The short names by which documents, types, lights and places are known: letters, digits, hyphen and point. */
public final class Mark {

    private static final Pattern FORM = Pattern.compile("[A-Za-z0-9][A-Za-z0-9.-]{0,39}");

    private Mark() {}

    /**
     * The mark itself, when it is one.
     *
     * @throws IllegalArgumentException with what a mark may be
     */
    public static String require(String mark) {
        if (!FORM.matcher(mark).matches()) {
            throw new IllegalArgumentException("A mark has 1 to 40 letters, digits, hyphens or points and begins with a"
                    + " letter or digit, such as A1 or VA8; not “"
                    + (mark.length() > 40 ? mark.substring(0, 40) + "…" : mark)
                    + "”");
        }
        return mark;
    }

    /** Refuses a mark that two things of a list share. */
    static <T> void requireUnique(String things, List<T> list, Function<T, String> markOf) {
        Set<String> seen = new HashSet<>();
        for (T one : list) {
            if (!seen.add(markOf.apply(one))) {
                throw new IllegalArgumentException("Two " + things + " have the mark " + markOf.apply(one));
            }
        }
    }
}
