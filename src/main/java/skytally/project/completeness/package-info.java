/**
 * Knows the questions a reviewer asks of a proposal first, and answers them from what was said of it.
 * Does not know what the light does, or whether a value is right.
 * Values stand in the unit they were typed in; distances in metres.
 */
@NullMarked
package skytally.project.completeness;

import org.jspecify.annotations.NullMarked;
