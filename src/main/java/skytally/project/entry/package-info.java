/**
 * Knows how what people say of a project is asked for and read: the rows of a form, who says it from where, and what
 * is left of it when two save at once.
 * Does not know which thing the values belong to.
 * Values stand in the unit they were typed in.
 */
@NullMarked
package skytally.project.entry;

import org.jspecify.annotations.NullMarked;
