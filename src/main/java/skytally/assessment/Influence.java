package skytally.assessment;

/**
 * What one guess does to one figure when it goes from its low end to its high end and nothing else moves.
 *
 * @param guess   its name
 * @param figure  key of the figure
 * @param atLow   the figure with the guess at its low end; not a number where it has no value there
 * @param atHigh  the figure with the guess at its high end
 * @param strength how far it moves the figure: the larger over the smaller in magnitudes of ratio for linear units,
 *     the difference for magnitudes; infinite where one end is nothing
 */
public record Influence(String guess, String figure, double atLow, double atHigh, double strength) {}
