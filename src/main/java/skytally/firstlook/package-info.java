/**
 * Knows the first answer: one sentence about a lighting proposal in, what it does to one place out, nothing kept unless
 * somebody asks for a project of it.
 * Does not know what becomes of that project, rules, or how anything is worked out.
 * Metres, lumens, degrees as typed; feet are turned into metres at the door.
 */
@NullMarked
package skytally.firstlook;

import org.jspecify.annotations.NullMarked;
