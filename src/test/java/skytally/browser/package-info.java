/**
 * Knows how to drive a real browser over the pages, for the tests that need eyes.
 * Does not know any page.
 * Units: CSS pixels for widths.
 */
@NullMarked
package skytally.browser;

import org.jspecify.annotations.NullMarked;
