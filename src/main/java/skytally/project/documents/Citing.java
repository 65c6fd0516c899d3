package skytally.project.documents;

import java.util.List;
import java.util.Objects;
import java.util.function.UnaryOperator;
import java.util.stream.Stream;
import skytally.project.Claim;
import skytally.project.LuminaireType;
import skytally.project.Place;
import skytally.project.Placement;
import skytally.project.Project;
import skytally.project.Scheme;
import skytally.project.Source;
import skytally.project.Stated;
import skytally.project.Values;

/** The claims of a project that name a document. */
final class Citing {

    private Citing() {}

    /** How many there are, used or not. */
    static long count(Project project, String document) {
        return all(project)
                .flatMap(values -> values.byField().values().stream())
                .flatMap(stated -> stated.claims().stream())
                .filter(claim -> claim.source().document().equals(document))
                .count();
    }

    /** The project with every one of them naming the document by another mark. */
    static Project renamed(Project project, String from, String to) {
        UnaryOperator<Values> change = values -> renamed(values, from, to);
        return new Project(
                project.id(),
                project.title(),
                project.documents(),
                change.apply(project.site()),
                project.schemes().stream()
                        .map(scheme -> scheme.with(
                                scheme.types().stream()
                                        .map(type -> new LuminaireType(type.mark(), change.apply(type.values())))
                                        .toList(),
                                scheme.placements().stream()
                                        .map(light ->
                                                new Placement(light.mark(), light.type(), change.apply(light.values())))
                                        .toList()))
                        .toList(),
                project.places().stream()
                        .map(place -> place.with(change.apply(place.values())))
                        .toList());
    }

    private static Stream<Values> all(Project project) {
        return Stream.concat(
                Stream.of(project.site()),
                Stream.concat(
                        project.schemes().stream().flatMap(Citing::all),
                        project.places().stream().map(Place::values)));
    }

    private static Stream<Values> all(Scheme scheme) {
        return Stream.concat(
                scheme.types().stream().map(LuminaireType::values),
                scheme.placements().stream().map(Placement::values));
    }

    private static Values renamed(Values values, String from, String to) {
        Values changed = values;
        for (String field : values.byField().keySet()) {
            Stated stated = Objects.requireNonNull(values.byField().get(field));
            List<Claim> claims = stated.claims().stream()
                    .map(claim -> claim.source().document().equals(from) ? citing(claim, to) : claim)
                    .toList();
            changed = changed.with(field, new Stated(claims, stated.used()));
        }
        return changed;
    }

    private static Claim citing(Claim claim, String document) {
        return new Claim(
                claim.value(),
                claim.unit(),
                claim.state(),
                claim.low(),
                claim.high(),
                new Source(document, claim.source().place(), claim.source().reason()),
                claim.party(),
                claim.date(),
                claim.who());
    }
}
