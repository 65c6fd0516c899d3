package skytally.project;

/**
 * Where one luminaire hangs, and how where that differs from its type.
 *
 * @param mark   unique in its scheme
 * @param type   mark of its luminaire type
 * @param values what was said of it
 */
public record Placement(String mark, String type, Values values) {

    public Placement {
        Mark.require(mark);
        Mark.require(type);
    }
}
