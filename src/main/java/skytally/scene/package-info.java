/**
 * Knows the case as physics sees it: which lamps stand where, who looks from where, through what air, over what
 * ground, and which of those are guesses.
 * Does not know what was typed, who typed it, or what will be computed.
 * Metres on the local grid, degrees for attitudes, lumens; nothing is read later from anywhere else.
 */
@NullMarked
package skytally.scene;

import org.jspecify.annotations.NullMarked;
