/**
 * Knows the page on which the site is described.
 * Does not know how a value is asked for and read.
 * Values stand in the unit they were typed in.
 */
@NullMarked
package skytally.project.site;

import org.jspecify.annotations.NullMarked;
