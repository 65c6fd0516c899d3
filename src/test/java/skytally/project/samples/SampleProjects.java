package skytally.project.samples;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.UUID;
import java.util.stream.Collectors;
import org.apache.commons.csv.CSVRecord;
import skytally.project.Claim;
import skytally.project.LuminaireType;
import skytally.project.Party;
import skytally.project.Place;
import skytally.project.Placement;
import skytally.project.Project;
import skytally.project.Scheme;
import skytally.project.Source;
import skytally.project.Stated;
import skytally.project.Values;
import skytally.project.transfer.ProjectFile;
import skytally.scene.State;

/**
 * Makes the three sample projects from the tables in {@code src/test/resources/samples}, all of them invented. Run it
 * after a change to a table or to the form of the file:
 *
 * <pre>
 * mvn test-compile exec:java -Dexec.classpathScope=test -Dexec.mainClass=skytally.project.samples.SampleProjects
 * </pre>
 */
public final class SampleProjects {

    static final Path DIRECTORY = Path.of("sample-projects");

    private SampleProjects() {}

    public static void main(String[] args) throws IOException {
        Files.createDirectories(DIRECTORY);
        for (Map.Entry<String, Project> sample : all().entrySet()) {
            Files.write(file(sample.getKey()), ProjectFile.write(sample.getValue()));
        }
    }

    static Path file(String name) {
        return DIRECTORY.resolve(name + ".skytally.json");
    }

    /** By the name of their files. */
    static Map<String, Project> all() {
        Map<String, Project> all = new LinkedHashMap<>();
        all.put("ferrin-lane", ferrinLane());
        all.put("sillow-gateway", sillowGateway());
        all.put("ostrel-valley", ostrelValley());
        return all;
    }

    private static Project ferrinLane() {
        Papers papers = new Papers()
                .with("Application form", "", "the applicant", Party.APPLICANT, "application form")
                .with("Application drawing 3", "B", "the applicant", Party.APPLICANT, "site plan")
                .with("Luminaire schedule", "A", "the applicant", Party.APPLICANT, "schedule")
                .with("Data sheets", "", "the applicant", Party.APPLICANT, "data sheet")
                .with("Catalogue page", "", "the applicant", Party.APPLICANT, "catalogue page")
                .with("Photometric file", "", "the applicant", Party.APPLICANT, "photometric file")
                .with("Photograph of a label", "", "the applicant", Party.APPLICANT, "photograph of the label only")
                .with("Maker letter", "", "the applicant", Party.APPLICANT, "maker letter")
                .with("Elevation drawing", "", "the applicant", Party.APPLICANT, "elevation drawing")
                .with("Note of the officer", "", "the authority", Party.AUTHORITY, "officer")
                .with("Reading of the sky", "", "the society", Party.OBJECTOR, "one reading, one person, one night");
        Plan plan = new Plan("A", papers, "schedule", "site plan");
        Scheme proposed = plan.scheme("proposed", Scheme.Kind.PROPOSED, "What is proposed", plan.types("A_types"));
        return plan.project(
                UUID.fromString("5b0a7a1e-62c7-4f0d-9c1b-a3f5d0c1e001"),
                List.of(
                        empty(),
                        proposed,
                        plan.scheme("mended", Scheme.Kind.OPTION, "Mended", plan.mended("A_types"))));
    }

    private static Project sillowGateway() {
        Papers papers = new Papers()
                .with("Application form", "", "the applicant", Party.APPLICANT, "application form")
                .with("Site lighting plan E-101", "2", "the applicant", Party.APPLICANT, "site plan")
                .with("Luminaire schedule on E-101", "2", "the applicant", Party.APPLICANT, "schedule")
                .with("Cut sheets", "", "the applicant", Party.APPLICANT, "data sheet")
                .with("Photometric files for B1, B2", "", "the applicant", Party.APPLICANT, "photometric file")
                .with("Catalogue page", "", "the applicant", Party.APPLICANT, "catalogue page")
                .with("Photograph", "", "the applicant", Party.APPLICANT, "photograph")
                .with("Lighting ordinance", "", "the authority", Party.AUTHORITY, "ordinance");
        Plan plan = new Plan("B", papers, "schedule", "site plan");
        Scheme proposed = plan.scheme("proposed", Scheme.Kind.PROPOSED, "What is proposed", plan.types("B_types"));
        return plan.project(
                UUID.fromString("8d41c6f2-0f9e-4b57-8a36-b2e4c7d9e002"),
                List.of(
                        empty(),
                        proposed,
                        plan.scheme("mended", Scheme.Kind.OPTION, "Mended", plan.mended("B_types"))));
    }

    /**
     * The road authority offers two options and has not chosen. Option 1 stands as the proposal, because it is what the
     * authority says it means to build, and because a project whose proposal is empty would show nothing at first.
     */
    private static Project ostrelValley() {
        Papers papers = new Papers()
                .with("Client brief", "", "the road authority", Party.APPLICANT, "client brief")
                .with("Asset list", "", "the road authority", Party.APPLICANT, "asset list")
                .with("Night survey", "", "the road authority", Party.APPLICANT, "night survey")
                .with("Option 1 schedule", "", "the road authority", Party.APPLICANT, "option 1 schedule")
                .with("Option 2 schedule", "", "the road authority", Party.APPLICANT, "option 2 schedule")
                .with("Photometric files for C1, C2", "", "the road authority", Party.APPLICANT, "photometric file")
                .with("Data sheets", "", "the road authority", Party.APPLICANT, "data sheet")
                .with("Drawing of the signs", "", "the road authority", Party.APPLICANT, "drawing")
                .with("Survey", "", "the road authority", Party.APPLICANT, "survey")
                .with("Letter of the weighbridge operator", "", "the operator", Party.APPLICANT, "operator")
                .with("Reserve rule", "", "the reserve", Party.AUTHORITY, "reserve rule")
                .with("Regional plan", "", "the region", Party.AUTHORITY, "regional plan");
        Plan before = new Plan("C", papers, "asset list", "survey");
        Plan first = new Plan("C", papers, "option 1 schedule", "survey");
        Plan second = new Plan("C", papers, "option 2 schedule", "survey");
        List<LuminaireType> old = before.types("C_types_before").stream()
                .map(type -> new LuminaireType(
                        type.mark(),
                        type.values()
                                .with(
                                        "fate",
                                        Stated.of(papers.given(
                                                "removed", "", "client brief", "98 fittings are replaced")))))
                .toList();
        return before.project(
                UUID.fromString("c27e9b54-7d13-4e6a-b0f8-d6a1f3b5e003"),
                List.of(
                        before.scheme("existing", Scheme.Kind.EXISTING, "What is there", old),
                        first.scheme(
                                "proposed",
                                Scheme.Kind.PROPOSED,
                                "Option 1: white, flat, full all night",
                                first.types("C_types_option1")),
                        second.scheme(
                                "option-2",
                                Scheme.Kind.OPTION,
                                "Option 2: warm, filtered, dimmed late",
                                second.types("C_types_option2"))));
    }

    private static Scheme empty() {
        return new Scheme("existing", Scheme.Kind.EXISTING, "What is there", List.of(), List.of());
    }

    /** The tables of one sample, read with its papers. */
    private static final class Plan {

        private static final Map<String, String> KINDS = Map.of(
                "home window", "home-window",
                "garden", "garden",
                "road user", "road-user",
                "public path", "public-path",
                "public place", "public-place",
                "viewing place", "viewing-place",
                "public viewpoint", "viewing-place",
                "observatory", "observatory",
                "reserve boundary", "reserve-boundary",
                "wildlife place", "wildlife-place");

        private static final Map<String, String> SITE = Map.ofEntries(
                Map.entry("latitude", "latitude"),
                Map.entry("longitude", "longitude"),
                Map.entry("ground_height", "groundHeight"),
                Map.entry("time_zone", "timeZone"),
                Map.entry("curfew", "curfew"),
                Map.entry("environmental_zone", "zone"),
                Map.entry("lighting_zone", "lightingZone"),
                Map.entry("air", "air"),
                Map.entry("ground_reflectance", "groundReflectance"),
                Map.entry("gross_area", "grossArea"),
                Map.entry("lit_area", "litArea"),
                Map.entry("hardscape_area", "hardscape"),
                Map.entry("building_area", "buildings"),
                Map.entry("parking_spaces", "parkingSpaces"),
                Map.entry("site_drives_to_public_road", "drives"),
                Map.entry("site_outline", "outline"),
                Map.entry("existing_zenith_brightness", "existingZenithBrightness"));

        private static final Map<String, String> UNITS =
                Map.of("deg", "°", "mag/arcsec2", "mag/arcsec²", "clock", "", "ft east,north", "ft");

        /** Its note says where the dome looks, and not how high: 30° is the low sky of the other directions. */
        private static final Place.NamedLook SOUTH_WEST = new Place.NamedLook("south-west, as the dome looks", 225, 30);

        private final String letter;
        private final Papers papers;
        private final String schedule;
        private final String drawing;

        Plan(String letter, Papers papers, String schedule, String drawing) {
            this.letter = letter;
            this.papers = papers;
            this.schedule = schedule;
            this.drawing = drawing;
        }

        List<LuminaireType> types(String table) {
            return Table.read(table).stream()
                    .map(row -> TypeClaims.type(row, papers, schedule))
                    .toList();
        }

        List<LuminaireType> mended(String table) {
            List<CSVRecord> before = Table.read(table);
            List<CSVRecord> after = Table.read(table + "_mended");
            List<LuminaireType> types = new ArrayList<>();
            for (int i = 0; i < before.size(); i++) {
                types.add(TypeClaims.mended(before.get(i), after.get(i), papers, schedule));
            }
            return types;
        }

        /** The types at their positions; a light of a type of none is left out. */
        Scheme scheme(String mark, Scheme.Kind kind, String name, List<LuminaireType> types) {
            Map<String, Values> byMark =
                    types.stream().collect(Collectors.toMap(LuminaireType::mark, LuminaireType::values));
            List<Placement> placements = Table.read(letter + "_positions").stream()
                    .filter(row -> !byMark.get(row.get("ref")).text("count").equals("0"))
                    .map(row -> placement(row, byMark.get(row.get("ref"))))
                    .toList();
            return new Scheme(mark, kind, name, types, placements);
        }

        private Placement placement(CSVRecord row, Values type) {
            Map<String, Stated> values = new TreeMap<>();
            given(values, "east", row.get("E"), "m", row.get("tag"));
            given(values, "north", row.get("N"), "m", row.get("tag"));
            given(values, "groundHeight", row.get("z"), "m", row.get("tag"));
            given(values, "bearing", row.get("aim"), "°", row.get("tag"));
            if (!TypeClaims.same(row.get("h"), type.text("mountingHeight"))) {
                given(values, "mountingHeight", row.get("h"), "m", row.get("tag"));
            }
            // A type whose tilt we changed is hung as we changed it.
            boolean ours = type.get("tilt").inUse().source().reason().contains("mended scheme");
            if (!ours && !TypeClaims.same(row.get("tilt"), type.text("tilt"))) {
                given(values, "tilt", row.get("tilt"), "°", row.get("tag"));
            }
            return new Placement(row.get("tag"), row.get("ref"), new Values(values));
        }

        private void given(Map<String, Stated> values, String field, String value, String unit, String place) {
            if (!value.isEmpty()) {
                values.put(field, Stated.of(papers.given(value, unit, drawing, place)));
            }
        }

        Project project(UUID id, List<Scheme> schemes) {
            String title = "";
            Map<String, Stated> site = new TreeMap<>();
            Map<String, Stated> roadClasses = new TreeMap<>();
            for (CSVRecord row : Table.read(letter + "_project")) {
                String field = row.get("field");
                if (field.equals("name")) {
                    title = row.get("value");
                } else if (field.startsWith("road_class_")) {
                    roadClasses.put(field.substring("road_class_".length()), stated(row));
                } else if (!field.equals("documents")) {
                    site.put(SITE.get(field), stated(row));
                }
            }
            List<Place> places = Table.read(letter + "_viewpoints").stream()
                    .map(row -> place(row, roadClasses))
                    .toList();
            return new Project(id, title, papers.documents(), new Values(site), schemes, places);
        }

        private Stated stated(CSVRecord row) {
            String unit = UNITS.getOrDefault(row.get("unit"), row.get("unit"));
            String source = row.get("source");
            return switch (row.get("state")) {
                case "given" ->
                    Stated.of(ranged(
                            papers.given(row.get("value"), unit, source, source.contains("reading") ? source : ""),
                            row));
                case "worked out" -> Stated.of(TypeClaims.workedOut(row.get("value"), unit, source));
                case "assumed" ->
                    zone(row, TypeClaims.assumed(row.get("value"), unit, row.get("low"), row.get("high"), source));
                case "not known" -> notKnown(row, unit);
                default -> throw new IllegalArgumentException("No state is called " + row.get("state"));
            };
        }

        private static Claim ranged(Claim claim, CSVRecord row) {
            return new Claim(
                    claim.value(),
                    claim.unit(),
                    claim.state(),
                    row.get("low"),
                    row.get("high"),
                    claim.source(),
                    claim.party(),
                    "",
                    "");
        }

        /** Zones are argued about: ours is used, the other party's stands beside it. */
        private static Stated zone(CSVRecord row, Claim ours) {
            return switch (row.get("source")) {
                case "village edge; E1 argued by the society" ->
                    Stated.of(ours)
                            .claimed(argued("E1", "argued by the society", Party.OBJECTOR))
                            .using(0);
                case "argued by the applicant as LZ3" ->
                    Stated.of(ours)
                            .claimed(argued("LZ3", "argued by the applicant", Party.APPLICANT))
                            .using(0);
                default -> Stated.of(ours);
            };
        }

        private static Claim argued(String value, String why, Party party) {
            return new Claim(value, "", State.ASSUMED, "", "", Source.reason(why), party, "", "");
        }

        /** Not known is used; the table's value stands beside it until a person accepts it. */
        private static Stated notKnown(CSVRecord row, String unit) {
            Claim open =
                    new Claim("", "", State.NOT_KNOWN, "", "", Source.reason(row.get("source")), Party.OURS, "", "");
            return Stated.of(open)
                    .claimed(TypeClaims.assumed(
                            row.get("value"), unit, row.get("low"), row.get("high"), row.get("source")))
                    .using(0);
        }

        private Place place(CSVRecord row, Map<String, Stated> roadClasses) {
            String mark = row.get("ref");
            Map<String, Stated> values = new TreeMap<>();
            given(values, "what", row.get("what"), "", mark);
            String kind = row.get("kind");
            given(values, "kind", KINDS.getOrDefault(kind, kind.replace(' ', '-')), "", mark);
            given(values, "east", row.get("E"), "m", mark);
            given(values, "north", row.get("N"), "m", mark);
            given(values, "groundHeight", row.get("z"), "m", mark);
            given(values, "eyeHeight", row.get("eye"), "m", mark);
            given(values, "facing", row.get("faces"), "°", mark);
            given(values, "note", row.get("note"), "", mark);
            Stated roadClass = roadClasses.get(mark);
            if (roadClass != null) {
                values.put("roadClass", roadClass);
            }
            return mark.equals("VA8")
                    ? new Place(mark, new Values(values), List.of(SOUTH_WEST), horizon(), ground())
                    : new Place(mark, new Values(values), List.of(), List.of());
        }

        private static List<Place.GroundPoint> ground() {
            return Table.read("A_ground").stream()
                    .map(row -> new Place.GroundPoint(
                            Double.parseDouble(row.get("distance")), Double.parseDouble(row.get("height"))))
                    .toList();
        }

        private static List<Place.HorizonPoint> horizon() {
            return Table.read("A_horizon").stream()
                    .map(row -> new Place.HorizonPoint(
                            Double.parseDouble(row.get("bearing")), Double.parseDouble(row.get("altitude"))))
                    .toList();
        }
    }
}
