package skytally.project.shelf;

import java.text.Normalizer;
import java.util.Locale;
import java.util.UUID;
import skytally.project.Project;
import skytally.project.Projects;

/** The same project under another id, title or file name. */
final class Copies {

    private static final int LONGEST_FILE_NAME = 60;

    private Copies() {}

    static Project withFreshId(Project project) {
        return new Project(
                UUID.randomUUID(),
                project.title(),
                project.documents(),
                project.site(),
                project.schemes(),
                project.places());
    }

    static Project titled(Project project, String title) {
        return new Project(
                project.id(), title, project.documents(), project.site(), project.schemes(), project.places());
    }

    /** A title that tells the copy from its original, and still fits. */
    static String copyTitle(String title) {
        String copy = "Copy of " + title;
        return copy.length() <= Projects.LONGEST_TITLE ? copy : copy.substring(0, Projects.LONGEST_TITLE - 1) + "…";
    }

    /** A file name that every computer takes: small letters, digits and hyphens. */
    static String fileName(String title) {
        String plain = Normalizer.normalize(title, Normalizer.Form.NFD)
                .replaceAll("\\p{M}+", "")
                .toLowerCase(Locale.ROOT)
                .replaceAll("[^a-z0-9]+", "-")
                .replaceAll("^-+", "");
        String shortened =
                plain.substring(0, Math.min(LONGEST_FILE_NAME, plain.length())).replaceAll("-+$", "");
        return (shortened.isEmpty() ? "project" : shortened) + ".skytally.json";
    }
}
