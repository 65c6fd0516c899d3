/**
 * Knows how the assessment of a scheme is shown place by place: what is asked for by switches, which assessments
 * answer it, and the words around their numbers.
 * Does not know how anything is worked out, and judges nothing by a rule.
 * Takes figures in the units of {@code assessment} and writes them in the units the reader asked for.
 */
@NullMarked
package skytally.review;

import org.jspecify.annotations.NullMarked;
