package skytally.project.completeness;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Predicate;
import java.util.stream.Stream;
import skytally.notation.QuantityFormat;
import skytally.project.Claim;
import skytally.project.Field;
import skytally.project.Fields;
import skytally.project.LuminaireType;
import skytally.project.Placement;
import skytally.project.Project;
import skytally.project.Scheme;
import skytally.project.Stated;
import skytally.project.entry.Spot;
import skytally.scene.State;

/** What is asked of the schedule and the plan of one scheme. */
final class ScheduleQuestions {

    private static final double LEVEL_DEG = 90;
    private static final int LUMEN_FIGURES = 4;

    /** Words in the title of a paper that is about the product as it is sold, not about the drawing; a choice of ours. */
    private static final List<String> OF_THE_PRODUCT = List.of(
            "data sheet",
            "datasheet",
            "cut sheet",
            "catalogue",
            "catalog",
            "photometric",
            "maker",
            "manufacturer",
            "product",
            "order",
            "label",
            "specification");

    private final Project project;
    private final Scheme scheme;
    private final List<LuminaireType> types;

    ScheduleQuestions(Project project, Scheme scheme) {
        this.project = project;
        this.scheme = scheme;
        this.types = scheme.types().stream()
                .filter(type -> Told.number(type.values(), "count").orElse(1) > 0)
                .toList();
    }

    Answer counts() {
        if (types.isEmpty()) {
            return noTypes(Question.COUNTS);
        }
        String placed =
                Told.whole(scheme.types().stream().mapToLong(this::placed).sum());
        List<String> unknown = marks(type -> isOpen(type, "count"));
        List<String> differ = scheme.types().stream()
                .filter(type -> Told.number(type.values(), "count").orElse(placed(type)) != placed(type))
                .map(LuminaireType::mark)
                .toList();
        List<String> disputed = marks(type -> type.values().get("count").isDisputed());
        List<String> dark = marks(type -> Told.number(type.values(), "lumens").isEmpty() && !isOpen(type, "count"));
        String scheduled = Told.whole((long) types.stream()
                .mapToDouble(type -> Told.number(type.values(), "count").orElse(0))
                .sum());
        if (!differ.isEmpty()) {
            return positions(Reply.NO, "differ", placed, scheduled, Told.marks(differ));
        }
        if (!disputed.isEmpty()) {
            return type(Question.COUNTS, Reply.NO, "disputed", disputed.get(0), "count", placed, Told.marks(disputed));
        }
        if (!unknown.isEmpty()) {
            return type(
                    Question.COUNTS, Reply.NOT_KNOWN, "unknown", unknown.get(0), "count", placed, Told.marks(unknown));
        }
        if (!dark.isEmpty()) {
            return type(
                    Question.COUNTS,
                    Reply.NOT_KNOWN,
                    "no-lumens",
                    dark.get(0),
                    "lumens",
                    placed,
                    scheduled,
                    Told.marks(dark));
        }
        return positions(Reply.YES, "agree", placed, scheduled, lumens());
    }

    private long placed(LuminaireType type) {
        return scheme.placementsOf(type.mark()).stream()
                .filter(light -> Spot.of(light.values()).isPresent())
                .count();
    }

    private String lumens() {
        double total = types.stream()
                .mapToDouble(type -> Told.number(type.values(), "count").orElse(0)
                        * Told.number(type.values(), "lumens").orElse(0))
                .sum();
        return QuantityFormat.atMost(total, LUMEN_FIGURES).plain();
    }

    private Answer positions(Reply reply, String says, Object... with) {
        return new Answer(
                Question.COUNTS, reply, says, List.of(with), "lights/" + scheme.mark() + "/positions", "positions", "");
    }

    Answer tilt() {
        if (types.isEmpty()) {
            return noTypes(Question.TILT);
        }
        List<String> above = marks(type -> steepest(type).orElse(0) > LEVEL_DEG);
        List<String> unsaid = marks(type -> !isTiltSaid(type));
        if (!above.isEmpty()) {
            return type(
                    Question.TILT,
                    Reply.NO,
                    unsaid.isEmpty() ? "above" : "above-and-unsaid",
                    above.get(0),
                    "tilt",
                    Told.marks(above),
                    Told.marks(unsaid));
        }
        if (!unsaid.isEmpty()) {
            return type(
                    Question.TILT, Reply.NOT_KNOWN, "unsaid", unsaid.get(0), "tilt", types.size(), Told.marks(unsaid));
        }
        LuminaireType most = types.stream()
                .max(Comparator.comparingDouble(type -> steepest(type).orElse(0)))
                .orElseThrow();
        return type(
                Question.TILT,
                Reply.YES,
                "said",
                most.mark(),
                "tilt",
                types.size(),
                most.mark(),
                QuantityFormat.atMost(steepest(most).orElse(0), 3).plain());
    }

    /** The greatest tilt of a type and of its lights, in degrees. */
    private OptionalDouble steepest(LuminaireType type) {
        return Stream.concat(
                        Stream.of(type.values()),
                        scheme.placementsOf(type.mark()).stream().map(Placement::values))
                .flatMapToDouble(values -> Told.number(values, "tilt").stream())
                .max();
    }

    /** Of the type, or of each of its lights by itself. */
    private boolean isTiltSaid(LuminaireType type) {
        List<Placement> lights = scheme.placementsOf(type.mark());
        return Told.isSaid(type.values().get("tilt").inUse())
                || (!lights.isEmpty()
                        && lights.stream()
                                .allMatch(light ->
                                        Told.isSaid(light.values().get("tilt").inUse())));
    }

    Answer upward() {
        if (types.isEmpty()) {
            return noTypes(Question.UPWARD);
        }
        List<String> said =
                marks(type -> Told.isSaid(type.values().get("upwardShare").inUse()));
        List<String> lacking =
                marks(type -> isOpen(type, "upwardShare") && (isOpen(type, "shape") || isOpen(type, "tilt")));
        List<String> workedOut = marks(type -> isOpen(type, "upwardShare")
                && Told.isSaid(type.values().get("shape").inUse())
                && isTiltSaid(type));
        List<String> assumed = marks(type ->
                !said.contains(type.mark()) && !lacking.contains(type.mark()) && !workedOut.contains(type.mark()));
        if (!lacking.isEmpty()) {
            return type(
                    Question.UPWARD,
                    Reply.NO,
                    "lacking",
                    lacking.get(0),
                    "upwardShare",
                    said.size() + workedOut.size(),
                    types.size(),
                    Told.marks(lacking));
        }
        if (!assumed.isEmpty()) {
            return type(
                    Question.UPWARD,
                    Reply.NOT_KNOWN,
                    "assumed",
                    assumed.get(0),
                    "upwardShare",
                    said.size() + workedOut.size(),
                    types.size(),
                    Told.marks(assumed));
        }
        return lights(Question.UPWARD, Reply.YES, "said", said.size(), workedOut.size());
    }

    Answer initial() {
        if (types.isEmpty()) {
            return noTypes(Question.INITIAL);
        }
        List<String> aged = marks(type -> type.values().text("lumensBasis").equals("luminaire-maintained"));
        List<String> unsaid =
                marks(type -> !Told.isSaid(type.values().get("lumensBasis").inUse()));
        if (!aged.isEmpty()) {
            return type(Question.INITIAL, Reply.NO, "aged", aged.get(0), "lumensBasis", Told.marks(aged));
        }
        return unsaid.isEmpty()
                ? lights(Question.INITIAL, Reply.YES, "said", types.size())
                : type(
                        Question.INITIAL,
                        Reply.NOT_KNOWN,
                        "unsaid",
                        unsaid.get(0),
                        "lumensBasis",
                        types.size(),
                        Told.marks(unsaid));
    }

    Answer late() {
        if (types.isEmpty()) {
            return noTypes(Question.LATE);
        }
        List<String> lacking = marks(type -> isOpen(type, "lateOutput") && isOpen(type, "hours"));
        List<String> disputed = marks(type -> type.values().get("lateOutput").isDisputed());
        List<String> assumed =
                marks(type -> type.values().get("lateOutput").inUse().state() == State.ASSUMED);
        if (!lacking.isEmpty()) {
            return type(
                    Question.LATE,
                    Reply.NO,
                    "lacking",
                    lacking.get(0),
                    "lateOutput",
                    types.size(),
                    Told.marks(lacking));
        }
        List<String> unsure =
                Stream.concat(disputed.stream(), assumed.stream()).distinct().toList();
        if (!unsure.isEmpty()) {
            return type(
                    Question.LATE,
                    Reply.NOT_KNOWN,
                    disputed.isEmpty() ? "assumed" : assumed.isEmpty() ? "disputed" : "disputed-and-assumed",
                    unsure.get(0),
                    "lateOutput",
                    Told.marks(disputed),
                    Told.marks(assumed));
        }
        return lights(Question.LATE, Reply.YES, "said", types.size(), curfew());
    }

    /** As stated, or what stands in for it. */
    private String curfew() {
        String stated = project.site().text("curfew");
        return stated.isEmpty()
                ? Fields.find(Field.Subject.SITE, "curfew")
                        .flatMap(Field::standIn)
                        .map(Field.StandIn::likely)
                        .orElseThrow()
                : stated;
    }

    Answer shields() {
        if (types.isEmpty()) {
            return noTypes(Question.SHIELDS);
        }
        Optional<LuminaireType> disputed = types.stream()
                .filter(type -> type.values().get("shield").isDisputed())
                .findFirst();
        if (disputed.isPresent()) {
            return disputedShield(disputed.get());
        }
        List<String> unsaid = marks(type -> isOpen(type, "shield"));
        List<LuminaireType> shielded = types.stream()
                .filter(type -> !isOpen(type, "shield") && !isNone(type.values().text("shield")))
                .toList();
        List<String> unordered = shielded.stream()
                .filter(type -> !isOfTheProduct(type.values().get("shield").inUse()))
                .map(LuminaireType::mark)
                .toList();
        if (!unordered.isEmpty()) {
            return type(
                    Question.SHIELDS,
                    Reply.NOT_KNOWN,
                    "unordered",
                    unordered.get(0),
                    "shield",
                    shielded.size(),
                    types.size(),
                    Told.marks(unordered));
        }
        if (!unsaid.isEmpty()) {
            return type(
                    Question.SHIELDS,
                    Reply.NOT_KNOWN,
                    "unsaid",
                    unsaid.get(0),
                    "shield",
                    types.size(),
                    Told.marks(unsaid));
        }
        return lights(
                Question.SHIELDS,
                Reply.YES,
                shielded.isEmpty() ? "none" : "ordered",
                types.size(),
                Told.marks(shielded.stream().map(LuminaireType::mark).toList()));
    }

    private Answer disputedShield(LuminaireType type) {
        Stated shield = type.values().get("shield");
        Claim used = shield.inUse();
        Claim other = shield.claims().stream()
                .filter(claim -> !claim.value().isEmpty() && !Told.typed(claim).equals(Told.typed(used)))
                .findFirst()
                .orElseThrow();
        return type(
                Question.SHIELDS,
                Reply.NO,
                "disputed",
                type.mark(),
                "shield",
                type.mark(),
                used.value(),
                from(used),
                other.value(),
                from(other));
    }

    private String from(Claim claim) {
        String source = claim.source().document().isEmpty()
                ? claim.source().reason()
                : Told.document(project, claim.source().document());
        return source.isEmpty() ? claim.party().words() : source;
    }

    private static boolean isNone(String shield) {
        String words = shield.toLowerCase(Locale.ROOT);
        return words.equals("none") || words.equals("none stated") || words.equals("no");
    }

    private boolean isOfTheProduct(Claim claim) {
        return project.document(claim.source().document())
                .map(document -> document.title().toLowerCase(Locale.ROOT))
                .filter(title -> OF_THE_PRODUCT.stream().anyMatch(title::contains))
                .isPresent();
    }

    private List<String> marks(Predicate<LuminaireType> which) {
        List<String> marks = new ArrayList<>();
        types.stream().filter(which).forEach(type -> marks.add(type.mark()));
        return marks;
    }

    private static boolean isOpen(LuminaireType type, String field) {
        return type.values().get(field).inUse().state() == State.NOT_KNOWN;
    }

    private Answer noTypes(Question question) {
        return lights(question, Reply.NOT_KNOWN, "no-types");
    }

    private static Answer lights(Question question, Reply reply, String says, Object... with) {
        return new Answer(question, reply, says, List.of(with), "lights", "lights", "");
    }

    private Answer type(Question question, Reply reply, String says, String mark, String field, Object... with) {
        return new Answer(
                question,
                reply,
                says,
                List.of(with),
                "lights/" + scheme.mark() + "/types/" + mark + "#" + field,
                "type",
                mark);
    }
}
