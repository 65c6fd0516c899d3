package skytally.project.entry;

import java.math.BigDecimal;
import java.time.Clock;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.stereotype.Component;
import skytally.project.Claim;
import skytally.project.Field;
import skytally.project.KeptProject;
import skytally.project.Party;
import skytally.project.Project;
import skytally.project.Saving;
import skytally.project.Source;
import skytally.project.Stated;
import skytally.project.Values;
import skytally.project.hours.Hours;
import skytally.scene.State;
import skytally.web.InvalidInputException.Fault;

/**
 * Asks for the values of one thing, and reads what was typed. What was changed becomes one more claim: given, if it
 * comes from a document, else assumed by us with a reason. What was not changed makes none.
 */
@Component
public class ValuesEditor {

    private static final int LONGEST_REASON = 1000;

    private final Words words;
    private final ValueWords valueWords;
    private final CrossChecks crossChecks;
    private final Clock clock;

    @Autowired
    ValuesEditor(Words words, ValueWords valueWords) {
        this(words, valueWords, Clock.systemDefaultZone());
    }

    ValuesEditor(Words words, ValueWords valueWords, Clock clock) {
        this.words = words;
        this.valueWords = valueWords;
        this.crossChecks = new CrossChecks(words);
        this.clock = clock;
    }

    /** The form as it is opened. */
    public ValuesForm form(KeptProject kept, List<Field> fields, Values values, Heading heading) {
        List<ValueRow> rows = fields.stream()
                .map(field -> row(kept.project(), field, values, Asked.standing(field, values.get(field.name())), null))
                .toList();
        return form(kept, heading, rows, List.of());
    }

    /**
     * Reads a form that was sent.
     *
     * @param required names of the fields that may not stay empty
     */
    public Reading read(
            KeptProject kept, List<Field> fields, Values values, Typed typed, Heading heading, Set<String> required) {
        Project project = kept.project();
        List<Fault> faults = new ArrayList<>(headingFaults(project, heading));
        List<ValueRow> rows = new ArrayList<>();
        Values changed = values;
        for (Field field : fields) {
            Stated stated = values.get(field.name());
            Asked asked = Asked.sent(field, stated, typed);
            Optional<String> fault = fault(project, field, stated, asked, required.contains(field.name()));
            fault.ifPresent(wrong -> faults.add(new Fault(field.name(), wrong)));
            rows.add(row(project, field, values, asked, fault.orElse(null)));
            if (fault.isEmpty()) {
                if (isRestated(field, stated, asked)) {
                    Claim claim = claim(field, asked, heading);
                    if (claim.source().isNone()) {
                        wantReason(faults);
                    }
                    changed = changed.with(field.name(), stated.claimed(claim));
                } else {
                    changed = changed.with(field.name(), stated.using(Integer.parseInt(asked.used())));
                }
            }
        }
        return new Reading(faults.isEmpty() ? changed : values, form(kept, heading, rows, faults));
    }

    /** The same reading with one more fault. */
    public Reading refused(Reading reading, String field, String message) {
        List<Fault> faults = new ArrayList<>(reading.form().faults());
        faults.add(new Fault(field, message));
        ValuesForm form = reading.form();
        return new Reading(
                reading.values(),
                new ValuesForm(form.version(), form.heading(), form.documents(), form.parties(), form.rows(), faults));
    }

    /**
     * A claim worked out from another: worked out where that one was given, assumed where it was assumed.
     *
     * @param how it was worked out, with the numbers that were typed
     */
    public static Claim workedOut(Claim basis, String value, String unit, String how) {
        Source source = basis.source();
        return new Claim(
                value,
                unit,
                basis.state() == State.ASSUMED ? State.ASSUMED : State.WORKED_OUT,
                "",
                "",
                new Source(
                        source.document(),
                        source.place(),
                        source.reason().isEmpty() ? how : how + "; " + source.reason()),
                basis.party(),
                basis.date(),
                basis.who());
    }

    private List<Fault> headingFaults(Project project, Heading heading) {
        List<Fault> faults = new ArrayList<>();
        if (!heading.document().isEmpty()
                && project.document(heading.document()).isEmpty()) {
            faults.add(
                    new Fault("document", words.say("entry.fault.document", TypedValue.shortened(heading.document()))));
        }
        if (!heading.party().isEmpty() && Party.byId(heading.party()).isEmpty()) {
            faults.add(new Fault("party", words.say("entry.fault.party")));
        }
        if (heading.who().length() > Saving.LONGEST_WHO) {
            faults.add(new Fault(
                    "who", words.say("entry.fault.long", words.say("entry.who"), String.valueOf(Saving.LONGEST_WHO))));
        }
        if (heading.why().length() > LONGEST_REASON) {
            faults.add(new Fault(
                    "why", words.say("entry.fault.long", words.say("entry.why"), String.valueOf(LONGEST_REASON))));
        }
        return faults;
    }

    private void wantReason(List<Fault> faults) {
        if (faults.stream().noneMatch(fault -> fault.field().equals("why"))) {
            faults.add(new Fault("why", words.say("entry.fault.why")));
        }
    }

    /** Whether a claim is to be made, rather than one of those there used. */
    private static boolean isRestated(Field field, Stated stated, Asked asked) {
        boolean nothingEither =
                asked.value().isEmpty() && stated.inUse().value().isEmpty();
        return !nothingEither && (asked.again() || !asked.sameAs(field, stated));
    }

    private Optional<String> fault(Project project, Field field, Stated stated, Asked asked, boolean required) {
        if (!isIndex(asked.used(), stated)) {
            return Optional.of(words.say("entry.fault.used", field.label()));
        }
        if (required && asked.value().isEmpty()) {
            return Optional.of(words.say("entry.fault.missing", field.label()));
        }
        if (asked.value().isEmpty() && !(asked.low().isEmpty() && asked.high().isEmpty())) {
            boolean withdrawn = !stated.inUse().value().isEmpty()
                    && asked.low().equals(stated.inUse().low())
                    && asked.high().equals(stated.inUse().high());
            return withdrawn ? Optional.empty() : Optional.of(words.say("entry.fault.range.alone", field.label()));
        }
        if (!isRestated(field, stated, asked)) {
            return Optional.empty();
        }
        if (!asked.used().equals(String.valueOf(stated.used()))) {
            return Optional.of(words.say("entry.fault.both", field.label()));
        }
        if (asked.place().length() > LONGEST_REASON || asked.why().length() > LONGEST_REASON) {
            return Optional.of(words.say("entry.fault.long", field.label(), String.valueOf(LONGEST_REASON)));
        }
        if (!asked.own().isEmpty()
                && !asked.own().equals(Asked.NO_DOCUMENT)
                && project.document(asked.own()).isEmpty()) {
            return Optional.of(words.say("entry.fault.document", TypedValue.shortened(asked.own())));
        }
        if (asked.value().isEmpty()) {
            return Optional.empty();
        }
        return TypedValue.fault(words, field, asked.value(), asked.unit()).or(() -> rangeFault(field, asked));
    }

    private Optional<String> rangeFault(Field field, Asked asked) {
        if (!field.kind().isNumber()) {
            return Optional.empty();
        }
        for (String end : List.of(asked.low(), asked.high())) {
            Optional<String> fault =
                    end.isEmpty() ? Optional.empty() : TypedValue.fault(words, field, end, asked.unit());
            if (fault.isPresent()) {
                return fault;
            }
        }
        BigDecimal value = TypedValue.read(asked.value());
        boolean outside = (!asked.low().isEmpty()
                        && TypedValue.read(asked.low()).compareTo(value) > 0)
                || (!asked.high().isEmpty() && TypedValue.read(asked.high()).compareTo(value) < 0);
        return outside ? Optional.of(words.say("entry.fault.range", field.label())) : Optional.empty();
    }

    private static boolean isIndex(String used, Stated stated) {
        return IntStream.range(0, stated.claims().size()).anyMatch(index -> used.equals(String.valueOf(index)));
    }

    private Claim claim(Field field, Asked asked, Heading heading) {
        String document =
                asked.own().equals(Asked.NO_DOCUMENT) ? "" : asked.own().isEmpty() ? heading.document() : asked.own();
        String reason = asked.why().isEmpty() ? heading.why() : asked.why();
        Source source = new Source(document, document.isEmpty() ? "" : asked.place(), reason);
        Party party =
                document.isEmpty() ? Party.OURS : Party.byId(heading.party()).orElse(Party.APPLICANT);
        State state = asked.value().isEmpty() ? State.NOT_KNOWN : document.isEmpty() ? State.ASSUMED : State.GIVEN;
        boolean number = field.kind().isNumber() && !asked.value().isEmpty();
        return new Claim(
                inOneForm(field, asked.value()),
                field.kind().hasUnit() && !asked.value().isEmpty() ? asked.unit() : "",
                state,
                number ? asked.low() : "",
                number ? asked.high() : "",
                source,
                party,
                LocalDate.now(clock).toString(),
                heading.who());
    }

    /** Rows of hours have one form; all else stands as it was typed. */
    private static String inOneForm(Field field, String value) {
        return field.kind() == Field.Kind.SCHEDULE && !value.isEmpty()
                ? Hours.read(value).written()
                : value;
    }

    private ValuesForm form(KeptProject kept, Heading heading, List<ValueRow> rows, List<Fault> faults) {
        return new ValuesForm(
                kept.version(),
                heading,
                kept.project().documents().stream()
                        .map(document -> new Option(document.mark(), document.mark() + " " + document.title()))
                        .toList(),
                Arrays.stream(Party.values())
                        .map(party -> new Option(party.id(), party.words()))
                        .toList(),
                List.copyOf(rows),
                List.copyOf(faults));
    }

    private ValueRow row(Project project, Field field, Values values, Asked asked, @Nullable String fault) {
        Stated stated = values.get(field.name());
        Optional<CrossCheck> other = crossChecks.of(project, field, values);
        Claim inUse = stated.inUse();
        boolean known = inUse.state() != State.NOT_KNOWN;
        String from = known
                ? valueWords.source(project, inUse)
                : valueWords.standIn(field)
                        + (stated.equals(Stated.NOTHING) ? "" : " " + valueWords.source(project, inUse));
        return new ValueRow(
                field.name(),
                group(field),
                field.label(),
                input(field),
                hint(field),
                asked,
                unitsToChoose(field, asked),
                choices(field, asked),
                inUse.state(),
                from,
                claims(project, field, stated, asked),
                other.map(CrossCheck::words).orElse(""),
                stated.isDisputed() || other.map(CrossCheck::differs).orElse(false),
                fault,
                fault != null && asked.hasMore(stated));
    }

    private ValueRow.Group group(Field field) {
        if (field.group().isEmpty()) {
            return ValueRow.Group.NONE;
        }
        String key = "group." + field.subject().name().toLowerCase(Locale.ROOT) + "." + field.group();
        return new ValueRow.Group(words.say(key), words.find(key + ".hint").orElse(""));
    }

    private static String input(Field field) {
        return switch (field.kind()) {
            case CHOICE -> "choice";
            case WHOLE, NUMBER -> "number";
            case TEXT, ZONE, CLOCK -> "text";
            case NOTE, CORNERS, SCHEDULE -> "note";
        };
    }

    private String hint(Field field) {
        return words.find("entry.hint." + field.name()).orElse("");
    }

    private static List<String> unitsToChoose(Field field, Asked asked) {
        if (field.units().isEmpty() || field.units().contains(asked.unit())) {
            return field.units();
        }
        List<String> units = new ArrayList<>(field.units());
        units.add(asked.unit());
        return units;
    }

    private List<Option> choices(Field field, Asked asked) {
        if (field.kind() != Field.Kind.CHOICE) {
            return List.of();
        }
        List<Option> options = new ArrayList<>();
        options.add(new Option("", words.say("entry.choice.none")));
        field.choices().forEach(choice -> options.add(new Option(choice, valueWords.choice(field, choice))));
        if (options.stream().noneMatch(option -> option.value().equals(asked.value()))) {
            options.add(new Option(asked.value(), "“" + asked.value() + "”"));
        }
        return options;
    }

    private List<ClaimLine> claims(Project project, Field field, Stated stated, Asked asked) {
        if (stated.equals(Stated.NOTHING)) {
            return List.of();
        }
        List<ClaimLine> lines = new ArrayList<>();
        for (int i = 0; i < stated.claims().size(); i++) {
            Claim claim = stated.claims().get(i);
            String range = valueWords.range(claim);
            List<String> by = new ArrayList<>(List.of(claim.party().words()));
            for (String part : List.of(claim.who(), claim.date())) {
                if (!part.isEmpty()) {
                    by.add(part);
                }
            }
            lines.add(new ClaimLine(
                    i,
                    valueWords.value(field, claim) + (range.isEmpty() ? "" : ", " + range),
                    claim.state(),
                    valueWords.source(project, claim),
                    String.join(", ", by),
                    asked.used().equals(String.valueOf(i))));
        }
        return lines;
    }
}
