/**
 * Knows when lights are on, and at what share of their output: schedules row by row, and the usual words for them.
 * Does not know which lights, or what they do.
 * Times are of the site's clock; shares in percent.
 */
@NullMarked
package skytally.project.hours;

import org.jspecify.annotations.NullMarked;
