package skytally.project;

import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.Stream;

/** The bytes of files by their hash. They stand beside a project, which only describes them. */
public final class Attachments {

    public static final Attachments NONE = new Attachments(Map.of());

    private final Map<String, byte[]> byHash;

    private Attachments(Map<String, byte[]> byHash) {
        this.byHash = byHash;
    }

    /** These and one more. */
    public Attachments with(byte[] bytes) {
        Map<String, byte[]> more = new TreeMap<>(byHash);
        more.put(Attachment.sha256(bytes), bytes.clone());
        return new Attachments(more);
    }

    public Optional<byte[]> bytes(String sha256) {
        return Optional.ofNullable(byHash.get(sha256)).map(byte[]::clone);
    }

    public boolean has(String sha256) {
        return byHash.containsKey(sha256);
    }

    /** In their order. */
    public Stream<String> hashes() {
        return byHash.keySet().stream().sorted();
    }

    /** The hashes a project's documents name, each once, in their order. */
    public static Stream<String> namedBy(Project project) {
        return project.documents().stream()
                .map(Document::file)
                .flatMap(Stream::ofNullable)
                .map(Attachment::sha256)
                .distinct()
                .sorted();
    }
}
