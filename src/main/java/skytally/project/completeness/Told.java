package skytally.project.completeness;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import skytally.notation.QuantityFormat;
import skytally.project.Claim;
import skytally.project.Project;
import skytally.project.Source;
import skytally.project.Values;
import skytally.project.entry.Amount;
import skytally.scene.State;

/** How values stand in a sentence of evidence. */
final class Told {

    private static final int MARKS = 6;
    private static final int FIGURES = 3;
    private static final double LARGEST = 1e12;

    private Told() {}

    /** As typed, with its unit. */
    static String typed(Claim claim) {
        return claim.unit().isEmpty() || claim.unit().equals("°")
                ? claim.value() + claim.unit()
                : claim.value() + "\u00a0" + claim.unit();
    }

    static String typed(Values values, String field) {
        return typed(values.get(field).inUse());
    }

    static String metres(double metres) {
        return QuantityFormat.atMost(metres, FIGURES).plain() + "\u00a0m";
    }

    static String whole(long count) {
        return QuantityFormat.asTyped(BigDecimal.valueOf(count)).plain();
    }

    /** A number in the first unit of its field, if it is known, and no larger than anything that can be meant. */
    static OptionalDouble number(Values values, String field) {
        return Amount.of(values.get(field).inUse()).stream()
                .mapToDouble(BigDecimal::doubleValue)
                .filter(number -> Math.abs(number) <= LARGEST)
                .findFirst();
    }

    /** Whether somebody's paper says it, or it was worked out from one. */
    static boolean isSaid(Claim claim) {
        return claim.state() == State.GIVEN || claim.state() == State.WORKED_OUT;
    }

    /** A few marks by name; of many, the first ones and how many there are. */
    static String marks(List<String> marks) {
        return marks.size() <= MARKS
                ? String.join(", ", marks)
                : String.join(", ", marks.subList(0, MARKS)) + " … (" + whole(marks.size()) + ")";
    }

    /** Where a claim comes from: the document by its mark and title, the place in it, the reason. */
    static String source(Project project, Claim claim) {
        Source source = claim.source();
        List<String> parts = new ArrayList<>();
        if (!source.document().isEmpty()) {
            parts.add(document(project, source.document()));
        }
        Stream.of(source.place(), source.reason())
                .filter(part -> !part.isEmpty())
                .forEach(parts::add);
        return String.join(", ", parts);
    }

    static String document(Project project, String mark) {
        return project.document(mark)
                .map(document -> document.mark() + " " + document.title())
                .orElse(mark);
    }
}
