package skytally.project.entry;

import skytally.project.Values;

/**
 * What came of reading a form.
 *
 * @param values with what was stated; as they were if anything is wrong
 * @param form   as it was sent, with what is wrong
 */
public record Reading(Values values, ValuesForm form) {

    public boolean isValid() {
        return form.faults().isEmpty();
    }
}
