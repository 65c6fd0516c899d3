package skytally.project;

/**
 * A row of the lighting schedule.
 *
 * @param mark   unique in its scheme; types of different schemes match by it
 * @param values what was said of it
 */
public record LuminaireType(String mark, Values values) {

    public LuminaireType {
        Mark.require(mark);
    }
}
