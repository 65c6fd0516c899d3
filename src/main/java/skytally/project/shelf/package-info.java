/**
 * Knows the list of projects and what is done to a whole one: made, opened from a file, taken out as a file, copied,
 * renamed, let go of, and taken back step by step.
 * Does not know what a value means, or what the light does.
 * Times are UTC.
 */
@NullMarked
package skytally.project.shelf;

import org.jspecify.annotations.NullMarked;
