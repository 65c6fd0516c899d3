package skytally.project;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.UUID;
import skytally.scene.State;

/** Invented projects for tests. */
public final class Cases {

    public static final UUID ID = UUID.fromString("6f1d3c1e-3c4b-4a55-9d8e-0b9d2f6a7c11");

    private Cases() {}

    /** Two types, three lights, two places, a document, a disputed value and an unknown one. */
    public static Project aSportsGround() {
        Source schedule = Source.document("D1", "row A1");
        Stated lumens = Stated.of(Claim.given("96000", "lm", schedule, Party.APPLICANT))
                .claimed(Claim.given("92 000", "lm", Source.document("D1", "data sheet"), Party.OBJECTOR)
                        .typed("A. Neighbour", "2026-11-30"))
                .using(0);
        Stated tilt = Stated.of(new Claim(
                "66",
                "°",
                State.ASSUMED,
                "60",
                "70",
                Source.reason("drawn so"),
                Party.OURS,
                "2026-12-01",
                "A. Planner"));
        return new Project(
                ID,
                "Ground by the lane <b>",
                List.of(new Document("D1", "Luminaire schedule", "2026-10-01", "A", "the club")),
                new Values(Map.of("latitude", Stated.of(Claim.given("52.4", "°", Source.NONE, Party.APPLICANT)))),
                List.of(
                        new Scheme("existing", Scheme.Kind.EXISTING, "What is there", List.of(), List.of()),
                        new Scheme(
                                "proposed",
                                Scheme.Kind.PROPOSED,
                                "What is proposed",
                                List.of(
                                        new LuminaireType("A1", new Values(Map.of("lumens", lumens, "tilt", tilt))),
                                        new LuminaireType("A2", Values.NONE)),
                                List.of(
                                        new Placement("A1-01", "A1", grid("-36", "37")),
                                        new Placement("A1-02", "A1", grid("-36", "37")),
                                        new Placement("A2-01", "A2", grid("70", "-10"))))),
                List.of(
                        new Place(
                                "VA1",
                                grid("-12", "86"),
                                List.of(new Place.NamedLook("toward the pitch", 200, 12.5)),
                                List.of(new Place.HorizonPoint(0, 2), new Place.HorizonPoint(90, 3))),
                        new Place("VA8", grid("2816.8", "5297.7"), List.of(), List.of())));
    }

    /** Everything that was ever saved of a project, the first save first. */
    public static List<Step> history(Projects projects, UUID id) {
        List<Step> steps = new ArrayList<>(projects.history(id, Long.MAX_VALUE, Integer.MAX_VALUE, Integer.MAX_VALUE));
        Collections.reverse(steps);
        return steps;
    }

    private static Values grid(String east, String north) {
        return new Values(Map.of(
                "east", Stated.of(Claim.given(east, "m", Source.document("D1", "plan"), Party.APPLICANT)),
                "north", Stated.of(Claim.given(north, "m", Source.document("D1", "plan"), Party.APPLICANT))));
    }
}
