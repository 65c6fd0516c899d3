package skytally.project.entry;

import java.util.ArrayList;
import java.util.List;
import org.springframework.stereotype.Component;
import skytally.luminaire.Shape;
import skytally.luminaire.Shapes;
import skytally.notation.NumberReader;
import skytally.notation.QuantityFormat;
import skytally.project.Claim;
import skytally.project.Field;
import skytally.project.Project;
import skytally.project.Source;
import skytally.project.Stated;
import skytally.scene.State;
import skytally.spectrum.SpectralClass;
import skytally.spectrum.SpectralClasses;

/** How a value, its stand-in and its source are written for people. */
@Component
public class ValueWords {

    private final Words words;

    ValueWords(Words words) {
        this.words = words;
    }

    /** A choice in words; one that is not in the catalogue stands as it was typed. */
    public String choice(Field field, String value) {
        return switch (field.name()) {
            case "shape" -> Shapes.byId(value).map(Shape::words).orElse(value);
            case "spectralClass" ->
                SpectralClasses.byId(value).map(SpectralClass::label).orElse(value);
            default -> words.find("choice." + field.name() + "." + value).orElse(value);
        };
    }

    /** As typed, with its unit; empty where it is not known. */
    public String value(Field field, Claim claim) {
        return amount(field, claim.value(), claim.unit().isEmpty() ? field.firstUnit() : claim.unit());
    }

    /** The range of a claim, or empty. */
    public String range(Claim claim) {
        if (claim.low().isEmpty() && claim.high().isEmpty()) {
            return "";
        }
        return words.say(
                "entry.range",
                claim.low().isEmpty() ? words.say("entry.range.open") : claim.low(),
                claim.high().isEmpty() ? words.say("entry.range.open") : claim.high());
    }

    /** What stands in while the value is not known, with its range and why. */
    public String standIn(Field field) {
        return field.standIn()
                .map(standIn -> standIn.low().equals(standIn.high())
                        ? words.say("entry.stand-in.one", amount(field, standIn.likely()), standIn.why())
                        : words.say(
                                "entry.stand-in",
                                amount(field, standIn.likely()),
                                bare(field, standIn.low()),
                                bare(field, standIn.high()),
                                standIn.why()))
                .orElseGet(() -> words.say("entry.stand-in.none"));
    }

    /** What stands in, in few words for a table; empty where nothing does. */
    public String standInBriefly(Field field) {
        return field.standIn()
                .map(standIn -> words.say("entry.stand-in.brief", amount(field, standIn.likely())))
                .orElse("");
    }

    /** A value as it stands in a table: a number is grouped as this house writes numbers, however it was typed. */
    public Cell cell(String label, Field field, Stated stated) {
        Claim inUse = stated.inUse();
        String written = inUse.state() == State.NOT_KNOWN ? standInBriefly(field) : inTable(field, inUse);
        return new Cell(label, written.isEmpty() ? "–" : written, inUse.state(), false);
    }

    private String inTable(Field field, Claim claim) {
        if (field.kind().isNumber()
                && NumberReader.read(claim.value(), field.kind() == Field.Kind.WHOLE)
                        instanceof NumberReader.Number number) {
            String unit = claim.unit().isEmpty() ? field.firstUnit() : claim.unit();
            return amount(field, QuantityFormat.asTyped(number.value()).plain(), unit);
        }
        return value(field, claim);
    }

    /** Where a claim comes from. */
    public String source(Project project, Claim claim) {
        Source source = claim.source();
        List<String> parts = new ArrayList<>();
        if (!source.document().isEmpty()) {
            parts.add(project.document(source.document())
                    .map(document -> document.mark() + " " + document.title())
                    .orElse(source.document()));
        }
        if (!source.place().isEmpty()) {
            parts.add(source.place());
        }
        if (!source.reason().isEmpty()) {
            parts.add(source.reason());
        }
        return parts.isEmpty() ? words.say("entry.source.none") : String.join(", ", parts);
    }

    private String amount(Field field, String value) {
        return amount(field, value, field.firstUnit());
    }

    private String amount(Field field, String value, String unit) {
        if (value.isEmpty()) {
            return "";
        }
        String written = bare(field, value);
        return unit.isEmpty() || !field.kind().hasUnit()
                ? written
                : written + (unit.equals("°") ? "" : "\u00a0") + unit;
    }

    private String bare(Field field, String value) {
        return field.kind() == Field.Kind.CHOICE ? choice(field, value) : value;
    }
}
