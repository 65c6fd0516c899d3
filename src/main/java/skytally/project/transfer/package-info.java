/**
 * Knows the project file: one JSON text that holds a whole project and opens again to the same.
 * Does not know where a project is kept, or what its values mean.
 * Values as typed, numbers as text.
 */
@NullMarked
package skytally.project.transfer;

import org.jspecify.annotations.NullMarked;
