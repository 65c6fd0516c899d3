/**
 * Knows the pages of the places people look from.
 * Does not know what is seen there.
 * Values stand in the unit they were typed in; what is worked out is in metres and degrees.
 */
@NullMarked
package skytally.project.places;

import org.jspecify.annotations.NullMarked;
