package skytally.project.completeness;

/** The ten questions, in the order a reviewer asks them. */
public enum Question {
    WINDOW("window"),
    COUNTS("counts"),
    TILT("tilt"),
    UPWARD("upward"),
    INITIAL("initial"),
    ZONE("zone"),
    LATE("late"),
    READING("reading"),
    OBSERVATORY("observatory"),
    SHIELDS("shields");

    private final String id;

    Question(String id) {
        this.id = id;
    }

    /** Its name in messages: {@code complete.window}. */
    public String id() {
        return id;
    }
}
