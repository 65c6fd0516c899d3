/**
 * Knows how every page is wrapped, guarded and refused: layout, switches, security, bounds, error pages.
 * Does not know what any page is about.
 * Units: bytes for bounds; what a person asks to read quantities in is a {@link skytally.web.Switches.Units}.
 */
@NullMarked
package skytally.web;

import org.jspecify.annotations.NullMarked;
