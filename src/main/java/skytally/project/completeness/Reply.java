package skytally.project.completeness;

/** What an answer comes to, the one to be read first first. */
public enum Reply {
    /** What was said shows that it is lacking, or wrong. */
    NO("no"),
    /** What was said does not tell. */
    NOT_KNOWN("not-known"),
    YES("yes");

    private final String id;

    Reply(String id) {
        this.id = id;
    }

    /** Its name in messages and style sheets. */
    public String id() {
        return id;
    }
}
