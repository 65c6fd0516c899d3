/**
 * Knows the papers a project rests on, and how many of its values rest on each.
 * Does not know what stands in them.
 * Values stand in the unit they were typed in.
 */
@NullMarked
package skytally.project.documents;

import org.jspecify.annotations.NullMarked;
