package skytally.review;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.UUID;
import skytally.project.Claim;
import skytally.project.Party;
import skytally.project.Place;
import skytally.project.Project;
import skytally.project.Projects;
import skytally.project.Saving;
import skytally.project.Source;
import skytally.project.Stated;
import skytally.project.Values;
import skytally.project.transfer.ProjectFile;
import skytally.project.transfer.ProjectFileException;

/** Projects whose results are looked at. */
final class Reviewed {

    private Reviewed() {}

    /** A worked sample, kept as a project of its own. */
    static Project sample(Projects projects, String name) {
        return kept(projects, read(name));
    }

    static Project read(String name) {
        try {
            return ProjectFile.read(Files.readAllBytes(Path.of("sample-projects", name + ".skytally.json")));
        } catch (IOException | ProjectFileException broken) {
            throw new AssertionError(broken);
        }
    }

    static Project kept(Projects projects, Project project) {
        Project own = new Project(
                UUID.randomUUID(),
                project.title(),
                project.documents(),
                project.site(),
                project.schemes(),
                project.places());
        return projects.add(own, Saving.by("", "")).project();
    }

    /** With one more place, of which only the words are known. */
    static Project withUnplaced(Project project, String mark, String what) {
        List<Place> places = new ArrayList<>(project.places());
        places.add(new Place(mark, new Values(Map.of("what", said(what))), List.of(), List.of()));
        return project.withPlaces(places);
    }

    static Stated said(String value) {
        return Stated.of(Claim.given(value, "", Source.document("D1", ""), Party.APPLICANT));
    }
}
