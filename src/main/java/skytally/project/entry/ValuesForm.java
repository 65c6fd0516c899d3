package skytally.project.entry;

import java.util.ArrayList;
import java.util.List;
import skytally.web.InvalidInputException.Fault;

/**
 * A form in which values are stated.
 *
 * @param version   of the project it starts from
 * @param heading   what holds for all of it
 * @param documents of the project, to name one
 * @param parties   to say whose it is
 * @param rows      the values
 * @param faults    everything wrong with it, each with the id of its field
 */
public record ValuesForm(
        long version,
        Heading heading,
        List<Option> documents,
        List<Option> parties,
        List<ValueRow> rows,
        List<Fault> faults) {

    /** Rows that stand under one heading. */
    public record Part(ValueRow.Group group, List<ValueRow> rows) {}

    /** The rows under their headings. */
    public List<Part> parts() {
        List<Part> parts = new ArrayList<>();
        for (ValueRow row : rows) {
            if (parts.isEmpty() || !parts.get(parts.size() - 1).group().equals(row.group())) {
                parts.add(new Part(row.group(), new ArrayList<>()));
            }
            parts.get(parts.size() - 1).rows().add(row);
        }
        return parts;
    }
}
