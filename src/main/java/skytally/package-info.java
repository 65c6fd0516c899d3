/**
 * Knows how to start the tool, and nothing else.
 * Does not know any subject: every subject has a room of its own below this package.
 * Units: none.
 */
@NullMarked
package skytally;

import org.jspecify.annotations.NullMarked;
