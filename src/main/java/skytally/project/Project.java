package skytally.project;

import java.util.List;
import java.util.Optional;
import java.util.UUID;

/**
 * Everything people said about a proposal, immutable: a change makes another.
 *
 * @param id        the same in addresses and in its file
 * @param title     in words
 * @param documents the papers it rests on
 * @param site      what was said of the site
 * @param schemes   the existing lights, the proposal, and its options
 * @param places    where people look from
 */
public record Project(
        UUID id, String title, List<Document> documents, Values site, List<Scheme> schemes, List<Place> places) {

    public Project {
        documents = List.copyOf(documents);
        schemes = List.copyOf(schemes);
        places = List.copyOf(places);
        Bounds.require(documents.size(), Bounds.DOCUMENTS, "documents in a project");
        Bounds.require(schemes.size(), Bounds.SCHEMES, "schemes in a project");
        Bounds.require(places.size(), Bounds.PLACES, "places in a project");
        Mark.requireUnique("documents", documents, Document::mark);
        Mark.requireUnique("schemes", schemes, Scheme::mark);
        Mark.requireUnique("places", places, Place::mark);
    }

    /** A new one with an empty plan of what is there and of what is proposed. */
    public static Project named(UUID id, String title) {
        return new Project(
                id,
                title,
                List.of(),
                Values.NONE,
                List.of(
                        new Scheme("existing", Scheme.Kind.EXISTING, "What is there", List.of(), List.of()),
                        new Scheme("proposed", Scheme.Kind.PROPOSED, "What is proposed", List.of(), List.of())),
                List.of());
    }

    public Optional<Scheme> scheme(String mark) {
        return schemes.stream().filter(scheme -> scheme.mark().equals(mark)).findFirst();
    }

    public Optional<Place> place(String mark) {
        return places.stream().filter(place -> place.mark().equals(mark)).findFirst();
    }

    public Optional<Document> document(String mark) {
        return documents.stream()
                .filter(document -> document.mark().equals(mark))
                .findFirst();
    }

    public Project withDocuments(List<Document> others) {
        return new Project(id, title, others, site, schemes, places);
    }

    public Project withSite(Values other) {
        return new Project(id, title, documents, other, schemes, places);
    }

    public Project withPlaces(List<Place> others) {
        return new Project(id, title, documents, site, schemes, others);
    }

    /** The same with the scheme of that mark replaced. */
    public Project withScheme(Scheme other) {
        return new Project(
                id,
                title,
                documents,
                site,
                schemes.stream()
                        .map(scheme -> scheme.mark().equals(other.mark()) ? other : scheme)
                        .toList(),
                places);
    }
}
