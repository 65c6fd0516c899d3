package skytally.project;

import java.util.Arrays;
import java.util.Optional;

/** Whose claim a value is. */
public enum Party {
    OURS("ours", "ours"),
    APPLICANT("applicant", "the applicant's"),
    AUTHORITY("authority", "the authority's"),
    OBJECTOR("objector", "an objector's");

    private final String id;
    private final String words;

    Party(String id, String words) {
        this.id = id;
        this.words = words;
    }

    public static Optional<Party> byId(String id) {
        return Arrays.stream(values()).filter(party -> party.id.equals(id)).findFirst();
    }

    /** Its name in files. */
    public String id() {
        return id;
    }

    public String words() {
        return words;
    }
}
