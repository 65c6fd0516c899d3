package skytally.project.entry;

import skytally.scene.State;

/**
 * A value in a table.
 *
 * @param label  of its column
 * @param value  with its unit; what it is taken from or what stands in where it is not known; or empty
 * @param state  how well it is known
 * @param inherited whether it is said of something else and only holds here, so that its state stands there
 */
public record Cell(String label, String value, State state, boolean inherited) {}
