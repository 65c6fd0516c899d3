package skytally.project.entry;

/** Something to choose, and its words. */
public record Option(String value, String words) {}
