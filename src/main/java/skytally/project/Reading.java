package skytally.project;

import java.math.BigDecimal;
import java.util.Optional;
import skytally.notation.NumberReader;
import skytally.project.Field.Subject;
import skytally.scene.Known;
import skytally.scene.State;

/**
 * A value as the scene takes it: the claim in use in the field's first unit, or what stands in for it.
 *
 * @param text  the word, or the number in plain notation and the first unit
 * @param known how well, and from where
 */
record Reading(String text, Known known) {

    /** The value of a field, its claim first, its stand-in after; nothing where it has neither. */
    static Optional<Reading> of(Subject subject, String name, Values values) {
        Field field = Fields.find(subject, name)
                .orElseThrow(() -> new IllegalArgumentException("No field of a " + subject + " is called " + name));
        Claim claim = values.get(name).inUse();
        if (claim.state() != State.NOT_KNOWN) {
            return Optional.of(new Reading(inFirstUnit(field, claim), new Known(claim.state(), from(claim))));
        }
        return field.standIn().map(standIn -> new Reading(standIn.likely(), new Known(State.NOT_KNOWN, standIn.why())));
    }

    private static String inFirstUnit(Field field, Claim claim) {
        if (!field.kind().isNumber()) {
            return claim.value();
        }
        NumberReader.Reading read = NumberReader.read(claim.value(), field.kind() == Field.Kind.WHOLE);
        if (read instanceof NumberReader.Number number) {
            return Units.inFirst(number.value(), claim.unit()).toPlainString();
        }
        throw new IllegalStateException(field.label() + ": “" + claim.value() + "” is no number");
    }

    private static String from(Claim claim) {
        Source source = claim.source();
        if (!source.document().isEmpty()) {
            return source.place().isEmpty() ? source.document() : source.document() + ", " + source.place();
        }
        return source.reason().isEmpty() ? claim.party().words() : source.reason();
    }

    double number() {
        return new BigDecimal(text).doubleValue();
    }
}
