package skytally.project.shelf;

import com.github.benmanes.caffeine.cache.Cache;
import com.github.benmanes.caffeine.cache.Caffeine;
import java.time.Duration;
import java.util.Optional;
import java.util.UUID;
import org.springframework.stereotype.Component;
import skytally.project.WholeProject;
import skytally.project.transfer.ProjectFile;
import skytally.project.transfer.ProjectFileException;

/**
 * Opened files that wait for an answer: replace what is kept, or keep both. Held in memory for half an hour and within
 * a bound; whoever answers later chooses the file again.
 */
@Component
class WaitingFiles {

    private static final Duration PATIENCE = Duration.ofMinutes(30);
    private static final long MOST_BYTES = 4L * ProjectFile.LARGEST_BYTES;

    private final Cache<String, byte[]> waiting = Caffeine.newBuilder()
            .maximumWeight(MOST_BYTES)
            .weigher((String token, byte[] file) -> file.length)
            .expireAfterWrite(PATIENCE)
            .build();

    /** Holds a project back, and gives the name to ask for it by. */
    String hold(WholeProject project) {
        String token = UUID.randomUUID().toString();
        waiting.put(token, ProjectFile.write(project));
        return token;
    }

    Optional<WholeProject> find(String token) {
        byte[] file = waiting.getIfPresent(token);
        if (file == null) {
            return Optional.empty();
        }
        try {
            return Optional.of(ProjectFile.open(file));
        } catch (ProjectFileException broken) {
            throw new IllegalStateException("A project does not open from its own file", broken);
        }
    }

    void letGo(String token) {
        waiting.invalidate(token);
    }
}
