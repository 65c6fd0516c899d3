/**
 * Knows every number a scene gives: what each place sees, how it dazzles, what the sky becomes, with the range, the
 * working and the source of each.
 * Does not know who asks, how it is printed, or what is allowed.
 * Units stand with every figure; the second doorway of the house is {@link skytally.assessment.Assessment}.
 */
@NullMarked
package skytally.assessment;

import org.jspecify.annotations.NullMarked;
