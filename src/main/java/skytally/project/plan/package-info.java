/**
 * Knows where everything of a project stands: the plan of the site, the plan of all places, and the same as tables.
 * Does not know what the light does.
 * Metres from the reference point; shown in the units of the page.
 */
@NullMarked
package skytally.project.plan;

import org.jspecify.annotations.NullMarked;
