package skytally.assessment;

import java.util.List;
import skytally.citation.Citation;
import skytally.scene.Known;

/**
 * How one figure was worked out, so that it can be done again by hand.
 *
 * @param formula     in symbols
 * @param substituted the same with the numbers in it and the result
 * @param inputs      what went in
 * @param sources     where the formula and its constants come from; at least one
 * @param notes       conventions, and where it ceases to hold
 */
public record Working(
        String formula, String substituted, List<Input> inputs, List<Citation> sources, List<String> notes) {

    public Working {
        inputs = List.copyOf(inputs);
        sources = List.copyOf(sources);
        notes = List.copyOf(notes);
        if (sources.isEmpty()) {
            throw new IllegalArgumentException("A working needs a source: " + formula);
        }
    }

    /**
     * One number that went in.
     *
     * @param name   in words
     * @param symbol in the formula
     * @param value  written out with its unit
     * @param known  how well, and from where
     */
    public record Input(String name, String symbol, String value, Known known) {}
}
