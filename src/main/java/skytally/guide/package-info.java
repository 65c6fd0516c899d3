/**
 * Knows how to lay open what the tool rests on: the tables of words, shapes, stand-ins, spectra and sources, and what is
 * not assessed.
 * Does not know a project, and holds no number of its own: all is read from the tables the reckoning itself reads.
 * Units as the tables have them.
 */
@NullMarked
package skytally.guide;

import org.jspecify.annotations.NullMarked;
