/**
 * Knows what people said about a proposal: its documents, lights, places and site, each value as typed, who said so and
 * what it was before.
 * Does not know what the light does, or what is allowed.
 * Values stand in the unit they were typed in; the scene drawn from them is in SI units.
 */
@NullMarked
package skytally.project;

import org.jspecify.annotations.NullMarked;
