package skytally.project.samples;

import java.math.BigDecimal;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import org.apache.commons.csv.CSVRecord;
import skytally.project.Claim;
import skytally.project.LuminaireType;
import skytally.project.Party;
import skytally.project.ShapeFromWords;
import skytally.project.Source;
import skytally.project.Stated;
import skytally.project.Values;
import skytally.scene.State;

/**
 * A row of a schedule as a luminaire type: what the schedule lists is given in it, what describes the light is given in
 * the paper the row names, and what rests on a guess, a photograph or nothing is assumed and says why.
 */
final class TypeClaims {

    private static final Set<String> NO_PAPER = Set.of("guess", "unknown");

    private static final List<Integer> WHITE_CLASSES = List.of(2200, 2700, 3000, 4000, 5000, 6500);

    /** Hours that run past the curfew although the schedule claims another late output: the worst moment, in percent. */
    private static final Map<String, String> LATE_BY_HOURS = Map.ofEntries(
            Map.entry("A5", "the hours keep full output to 23:00, after the curfew at 22:00"),
            Map.entry("A6", "the hours run to 22:30, after the curfew at 22:00"),
            Map.entry("A7", "the sensor brings it to full output at any hour"),
            Map.entry("A8", "the hours run to 22:30, after the curfew at 22:00"),
            Map.entry("B9", "the hours run to midnight, after the curfew at 23:00"),
            Map.entry("B10", "the hours run to midnight, after the curfew at 23:00"),
            Map.entry("B12", "the hours run to midnight, after the curfew at 23:00"));

    private final CSVRecord row;
    private final Papers papers;
    private final String schedule;
    private final Map<String, Stated> fields = new TreeMap<>();

    private TypeClaims(CSVRecord row, Papers papers, String schedule) {
        this.row = row;
        this.papers = papers;
        this.schedule = schedule;
    }

    static LuminaireType type(CSVRecord row, Papers papers, String schedule) {
        TypeClaims claims = new TypeClaims(row, papers, schedule);
        claims.readSchedule();
        claims.readLight();
        claims.readPlanted();
        return new LuminaireType(row.get("ref"), new Values(claims.fields));
    }

    /** The same row after a change we suggest: what differs is ours, the rest stands as it was. */
    static LuminaireType mended(CSVRecord before, CSVRecord after, Papers papers, String schedule) {
        LuminaireType original = type(before, papers, schedule);
        Map<String, Stated> changed = new TreeMap<>(original.values().byField());
        Source ours = Source.reason("a change suggested in the mended scheme");
        for (Map.Entry<String, Column> one : COLUMNS.entrySet()) {
            String cell = after.get(one.getValue().name());
            if (!cell.equals(before.get(one.getValue().name()))) {
                Claim claim = Claim.given(cell, one.getValue().unit(), ours, Party.OURS);
                changed.put(one.getKey(), Stated.of(claim));
            }
        }
        changed.remove("note");
        if (!after.get("note").isEmpty()) {
            changed.put("note", Stated.of(Claim.given(after.get("note"), "", ours, Party.OURS)));
        }
        TypeClaims light = new TypeClaims(after, papers, schedule);
        light.readKind();
        for (String derived : List.of("shape", "spectralClass")) {
            Stated now = light.fields.get(derived);
            if (now != null) {
                changed.put(derived, now);
            }
        }
        return new LuminaireType(original.mark(), new Values(changed));
    }

    private record Column(String name, String unit) {}

    private static final Map<String, Column> COLUMNS = Map.ofEntries(
            Map.entry("use", new Column("use", "")),
            Map.entry("count", new Column("qty", "")),
            Map.entry("lumens", new Column("lm", "lm")),
            Map.entry("watts", new Column("w", "W")),
            Map.entry("sourceWords", new Column("source", "")),
            Map.entry("cct", new Column("cct", "K")),
            Map.entry("shapeWords", new Column("shape_words", "")),
            Map.entry("upwardShare", new Column("ulr", "%")),
            Map.entry("tilt", new Column("tilt", "°")),
            Map.entry("mountingHeight", new Column("height_m", "m")),
            Map.entry("shield", new Column("shield", "")),
            Map.entry("hours", new Column("control", "")),
            Map.entry("earlyOutput", new Column("early_pct", "%")),
            Map.entry("lateOutput", new Column("late_pct", "%")));

    private void readSchedule() {
        for (String field : List.of(
                "use",
                "count",
                "shapeWords",
                "tilt",
                "mountingHeight",
                "shield",
                "hours",
                "earlyOutput",
                "lateOutput")) {
            given(field, schedule);
        }
        if (!row.get("note").isEmpty()) {
            put("note", papers.given(row.get("note"), "", schedule, place()));
        }
    }

    private void given(String field, String paper) {
        Column column = COLUMNS.get(field);
        String cell = row.get(column.name());
        if (!cell.isEmpty()) {
            put(field, papers.given(cell, column.unit(), paper, place()));
        }
    }

    private void readLight() {
        String from = row.get("data_from");
        for (String field : List.of("lumens", "watts", "sourceWords", "cct", "upwardShare")) {
            if (NO_PAPER.contains(from)) {
                assume(field, "", "", from.equals("guess") ? "a guess: no paper describes it" : "no data given");
            } else {
                given(field, from);
            }
        }
        Claim basis = NO_PAPER.contains(from)
                ? assumed("luminaire-initial", "", "", "", "the schedule's column says so, no paper does")
                : papers.given("luminaire-initial", "", from, place());
        put("lumensBasis", basis);
        readKind();
    }

    private void readKind() {
        String words = row.get("shape_words");
        put(
                "shape",
                ShapeFromWords.of(words)
                        .orElseThrow(() -> new IllegalArgumentException("No shape answers to “" + words + "”")));
        readSpectralClass();
    }

    private void readSpectralClass() {
        switch (row.get("source")) {
            case "high-pressure sodium" -> putWorkedOut("spectralClass", "hps", "high-pressure sodium, by its name");
            case "metal halide" ->
                putWorkedOut("spectralClass", "mh4000", "metal halide of " + row.get("cct") + " K: nearest is 4000 K");
            case "colour LED panel" ->
                putWorkedOut("spectralClass", "rgb6500", "a colour panel makes its white of red, green and blue");
            case "warm LED, blue-filtered" ->
                put(
                        "spectralClass",
                        assumed(
                                "led2200",
                                "",
                                "",
                                "",
                                "no class has a blue filter; the plain LED of 2200 K has more blue, so the sky is"
                                        + " not made to look better"));
            case "white LED", "white LED sign" -> nearestWhite(row.get("cct"));
            case "none" -> {
                // nothing there shines
            }
            default -> throw new IllegalArgumentException("No class answers to " + row.get("source"));
        }
    }

    /** Steps of colour look equal in 10⁶/T, not in kelvin, so that decides which class is nearest. */
    private void nearestWhite(String cct) {
        double wanted = 1e6 / Double.parseDouble(cct);
        int nearest = WHITE_CLASSES.stream()
                .min(Comparator.comparingDouble(each -> Math.abs(1e6 / each - wanted)))
                .orElseThrow();
        String how = String.format(
                Locale.ROOT,
                "white LED of %s K: of the classes, %d K is nearest in 10⁶/T (%.0f against %.0f)",
                cct,
                nearest,
                1e6 / nearest,
                wanted);
        String id = "led" + nearest;
        if (NO_PAPER.contains(row.get("data_from"))) {
            put("spectralClass", assumed(id, "", "", "", how + "; the temperature itself is assumed"));
        } else {
            putWorkedOut("spectralClass", id, how);
        }
    }

    /** What the samples are meant to teach: unknowns, guesses and papers that disagree. */
    private void readPlanted() {
        switch (row.get("ref") + " " + row.get("data_from")) {
            case "A3 data sheet" ->
                put(
                        "tilt",
                        assumed(
                                "75",
                                "°",
                                "65",
                                "80",
                                "set on site to reach the far corner; no paper gives it, so 65 to 80"));
            case "A7 photograph of the label only" -> {
                assume("lumens", "10500", "24000", "150 W at 120 lm/W, from 70 to 160 lm/W");
                assume("upwardShare", "10", "30", "the label does not say; a wide floodlight on a tilted bracket");
            }
            case "A8 guess" -> {
                put("count", papers.given(row.get("qty"), "", "elevation drawing", place()));
                assume("lumens", "600", "2400", "a guess, from half to twice");
                assume("tilt", "160", "180", "a guess: aimed up from the ground");
            }
            case "A9 maker letter" -> {
                put("lumens", workedOutFrom("maker letter", "6500", "lm", "π × 9 m² × about 230 cd/m²"));
                fields.put(
                        "lateOutput",
                        fields.get("lateOutput")
                                .claimed(assumed("0", "%", "0", "100", "use after matches is not stated")));
            }
            case "B3 data sheet" -> {
                Claim ordered = papers.given("none stated", "", "data sheet", place());
                Claim drawn = papers.given("type 4 with house-side shield", "", "site plan", place());
                fields.put("shield", Stated.of(ordered).claimed(drawn).using(0));
            }
            case "B9 photograph" -> {
                assume("lumens", "2500", "4000", "read in a web shop by the look of the photograph");
                assume("upwardShare", "45", "60", "a clear globe, as in the photograph");
            }
            case "B10 guess" -> assume("lumens", "2700", "10800", "face area × assumed luminance; from half to twice");
            case "B12 unknown" -> assume("lumens", "1050", "4200", "no data given; assumed by us, from half to twice");
            case "C1 asset list" -> {
                put("lumens", workedOutFrom("asset list", "20200", "lm", "lamp 28 000 lm × 0.72 = 20 160 lm"));
                put("lightOutputRatio", papers.given("0.72", "", "asset list", place()));
            }
            case "C4 night survey" -> {
                Claim listed = papers.given("12", "", "asset list", place());
                Claim lit = papers.given("10", "", "night survey", "two of twelve not working at the survey");
                fields.put("count", Stated.of(listed).claimed(lit).using(0));
            }
            default -> {
                // this row says all it has to say
            }
        }
        String hours = LATE_BY_HOURS.get(row.get("ref"));
        if (hours != null) {
            Claim byHours = workedOut("100", "%", hours);
            fields.put("lateOutput", fields.get("lateOutput").claimed(byHours).using(0));
        }
        boolean sensed = row.get("control").startsWith("full only when a vehicle");
        if (sensed) {
            Claim byHours = workedOut("100", "%", "a vehicle brings it to full output at any hour");
            fields.put("lateOutput", fields.get("lateOutput").claimed(byHours).using(0));
        }
    }

    private void assume(String field, String low, String high, String why) {
        Column column = COLUMNS.get(field);
        put(field, assumed(row.get(column.name()), column.unit(), low, high, why));
    }

    static Claim assumed(String value, String unit, String low, String high, String why) {
        return new Claim(value, unit, State.ASSUMED, low, high, Source.reason(why), Party.OURS, "", "");
    }

    private void putWorkedOut(String field, String value, String how) {
        put(field, workedOut(value, "", how));
    }

    static Claim workedOut(String value, String unit, String how) {
        return new Claim(value, unit, State.WORKED_OUT, "", "", Source.reason(how), Party.OURS, "", "");
    }

    private Claim workedOutFrom(String paper, String value, String unit, String how) {
        Claim given = papers.given(value, unit, paper, place());
        Source source = new Source(given.source().document(), place(), how);
        return new Claim(value, unit, State.WORKED_OUT, "", "", source, given.party(), "", "");
    }

    private String place() {
        return "row " + row.get("ref");
    }

    private void put(String field, Claim claim) {
        fields.put(field, Stated.of(claim));
    }

    /** Whether two cells say the same number. */
    static boolean same(String one, String other) {
        return !one.isEmpty() && !other.isEmpty() && new BigDecimal(one).compareTo(new BigDecimal(other)) == 0;
    }
}
