package skytally.project.entry;

import skytally.scene.State;

/**
 * One claim of a value, as a line to choose from.
 *
 * @param index in the list of claims
 * @param value with its unit and range, or empty
 * @param state how well it is known
 * @param from  where it comes from
 * @param by    whose it is, who typed it and when
 * @param used  whether it is the one in use
 */
public record ClaimLine(int index, String value, State state, String from, String by, boolean used) {}
