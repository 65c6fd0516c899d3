/**
 * Knows what a human eye can make out at night: the faintest star, a lamp far off, the star a lamp equals, nature's own rungs.
 * Does not know where lamps are, nor how their light got to the eye; extinction and air mass are handed to it as numbers.
 * Light at the eye in lx, background in cd/m², distances in metres, extinction per metre or in mag per air mass.
 */
@NullMarked
package skytally.eye;

import org.jspecify.annotations.NullMarked;
