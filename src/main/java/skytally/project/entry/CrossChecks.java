package skytally.project.entry;

import java.math.BigDecimal;
import java.util.Optional;
import skytally.notation.QuantityFormat;
import skytally.project.Claim;
import skytally.project.Field;
import skytally.project.Outline;
import skytally.project.OutputByHours;
import skytally.project.Project;
import skytally.project.Units;
import skytally.project.Values;
import skytally.project.hours.Hours;
import skytally.scene.State;

/** Values that can be worked out from others as well: both are shown, and neither takes the place of the other. */
final class CrossChecks {

    /** Two areas that differ by more are told to disagree. */
    private static final double AREA_SHARE = 0.01;

    private final Words words;

    CrossChecks(Words words) {
        this.words = words;
    }

    /** What the others give for a field of the site or of a type. */
    Optional<CrossCheck> of(Project project, Field field, Values values) {
        return switch (field.subject()) {
            case SITE -> ofSite(field, values);
            case TYPE -> ofType(project, field, values);
            case LIGHT, PLACE -> Optional.empty();
        };
    }

    private Optional<CrossCheck> ofSite(Field field, Values site) {
        return switch (field.name()) {
            case "outline" ->
                Outline.of(site)
                        .map(outline -> new CrossCheck(
                                words.say("check.outline", outline.corners().size(), area(outline)), false));
            case "grossArea" -> Outline.of(site).map(outline -> grossArea(outline, site));
            default -> Optional.empty();
        };
    }

    private CrossCheck grossArea(Outline outline, Values site) {
        Optional<BigDecimal> stated = Amount.of(site.get("grossArea").inUse());
        boolean differs =
                stated.isPresent() && Math.abs(outline.areaHa() / stated.get().doubleValue() - 1) > AREA_SHARE;
        return new CrossCheck(words.say(differs ? "check.area.differs" : "check.area", area(outline)), differs);
    }

    private static String area(Outline outline) {
        double acres = outline.areaHa() / Units.inFirst(BigDecimal.ONE, "acre").doubleValue();
        return QuantityFormat.atMost(outline.areaHa(), 4).plain() + "\u00a0ha, "
                + QuantityFormat.atMost(acres, 4).plain() + "\u00a0acres";
    }

    private Optional<CrossCheck> ofType(Project project, Field field, Values type) {
        return switch (field.name()) {
            case "schedule" ->
                type.get("schedule").inUse().state() == State.NOT_KNOWN
                        ? OutputByHours.of(type, project.site()).map(this::rows)
                        : Optional.empty();
            case "earlyOutput", "lateOutput" ->
                OutputByHours.of(type, project.site())
                        .flatMap(hours -> hours.claim(field.name()))
                        .map(byHours -> output(byHours, type.get(field.name()).inUse()));
            default -> Optional.empty();
        };
    }

    private CrossCheck rows(OutputByHours byHours) {
        Hours hours = byHours.hours();
        return new CrossCheck(
                words.say(
                        "check.schedule",
                        hours.written().replace("\n", "; "),
                        byHours.state().words(),
                        byHours.why()),
                false);
    }

    private CrossCheck output(Claim byHours, Claim stated) {
        boolean known = stated.state() != State.NOT_KNOWN;
        boolean differs = known
                && Amount.of(stated)
                        .filter(percent -> percent.compareTo(new BigDecimal(byHours.value())) != 0)
                        .isPresent();
        String key = known ? (differs ? "check.output.differs" : "check.output.same") : "check.output.used";
        return new CrossCheck(
                words.say(
                        key,
                        byHours.value(),
                        byHours.state().words(),
                        byHours.source().reason()),
                differs);
    }
}
