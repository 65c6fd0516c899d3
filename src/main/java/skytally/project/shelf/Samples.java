package skytally.project.shelf;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import skytally.project.Project;
import skytally.project.transfer.ProjectFile;
import skytally.project.transfer.ProjectFileException;

/** The worked samples that come with the tool. All of them are invented. */
final class Samples {

    /**
     * One sample.
     *
     * @param name    in addresses and of its file
     * @param project as its file has it
     */
    record Sample(String name, Project project) {}

    private static final List<Sample> ALL = List.of(read("ferrin-lane"), read("sillow-gateway"), read("ostrel-valley"));

    private Samples() {}

    static List<Sample> all() {
        return ALL;
    }

    static Optional<Project> byName(String name) {
        return ALL.stream()
                .filter(sample -> sample.name().equals(name))
                .map(Sample::project)
                .findFirst();
    }

    private static Sample read(String name) {
        String file = "/sample-projects/" + name + ".skytally.json";
        try (InputStream bytes = Objects.requireNonNull(Samples.class.getResourceAsStream(file), file)) {
            return new Sample(name, ProjectFile.read(bytes.readAllBytes()));
        } catch (IOException cannot) {
            throw new UncheckedIOException(cannot);
        } catch (ProjectFileException broken) {
            throw new IllegalStateException("The sample " + file + " is not whole", broken);
        }
    }
}
