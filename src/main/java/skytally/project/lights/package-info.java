/**
 * Knows the pages of the lighting schedule and of the plan, and how rows and rings of lights are laid out.
 * Does not know what the lights do.
 * Values stand in the unit they were typed in; what is worked out is in metres and degrees.
 */
@NullMarked
package skytally.project.lights;

import org.jspecify.annotations.NullMarked;
