package skytally.project;

import java.math.BigDecimal;
import java.time.LocalTime;
import java.util.Optional;
import skytally.project.Field.Subject;
import skytally.project.hours.Hours;
import skytally.project.hours.HoursWords;
import skytally.scene.Known;
import skytally.scene.State;

/**
 * What the hours of a type give for its output before and after the curfew. It stands beside what is stated of the
 * output and never in its place: where the two differ, both are shown.
 *
 * @param hours  row by row
 * @param state  how well they are known: worked out, or assumed where something in them had to be
 * @param why    where the rows come from
 * @param curfew of the site
 */
public record OutputByHours(Hours hours, State state, String why, LocalTime curfew) {

    /** Of the rows in use, or of the schedule's own words where they have one reading; else nothing. */
    public static Optional<OutputByHours> of(Values type, Values site) {
        LocalTime curfew = LocalTime.parse(
                Reading.of(Subject.SITE, "curfew", site).orElseThrow().text());
        Claim rows = type.get("schedule").inUse();
        if (rows.state() != State.NOT_KNOWN) {
            State state = rows.state() == State.ASSUMED ? State.ASSUMED : State.WORKED_OUT;
            return Optional.of(new OutputByHours(Hours.read(rows.value()), state, "the hours row by row", curfew));
        }
        Claim words = type.get("hours").inUse();
        return HoursWords.read(words.value())
                .map(read -> new OutputByHours(
                        read.hours(),
                        read.assumed() || words.state() == State.ASSUMED ? State.ASSUMED : State.WORKED_OUT,
                        read.why(),
                        curfew));
    }

    /** The worst moment of the field {@code earlyOutput} or {@code lateOutput}; nothing if there is no such time. */
    public Optional<Hours.Worst> worst(String field) {
        return field.equals("earlyOutput") ? hours.early(curfew) : hours.late(curfew);
    }

    /** The claim that the hours make of {@code earlyOutput} or {@code lateOutput}. */
    public Optional<Claim> claim(String field) {
        return worst(field)
                .map(worst -> new Claim(
                        plain(worst.percent()), "%", state, "", "", Source.reason(reason(worst)), Party.OURS, "", ""));
    }

    private String reason(Hours.Worst worst) {
        return (worst.row().isEmpty() ? "off by its hours" : "“" + worst.row() + "”") + ", curfew at " + curfew + ", "
                + why;
    }

    private static String plain(BigDecimal percent) {
        return percent.signum() == 0 ? "0" : percent.stripTrailingZeros().toPlainString();
    }

    /** The output as the scene takes it: what is stated, else what the hours give, else what stands in. */
    static Reading reading(String field, Values type, Values site) {
        if (type.get(field).inUse().state() == State.NOT_KNOWN) {
            Optional<Claim> byHours = of(type, site).flatMap(hours -> hours.claim(field));
            if (byHours.isPresent()) {
                Claim claim = byHours.get();
                return new Reading(
                        claim.value(), new Known(claim.state(), claim.source().reason()));
            }
        }
        return Reading.of(Subject.TYPE, field, type).orElseThrow();
    }
}
