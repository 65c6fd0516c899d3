package skytally.project.entry;

import java.util.List;
import org.springframework.http.HttpStatus;
import org.springframework.util.MultiValueMap;
import org.springframework.web.server.ResponseStatusException;

/** What came with a form or an address, by name, without the white space around it. */
public record Typed(MultiValueMap<String, String> sent) {

    /** The first of that name, or empty. */
    public String text(String name) {
        String first = sent.getFirst(name);
        return first == null ? "" : first.replace("\r\n", "\n").strip();
    }

    public List<String> all(String name) {
        return sent.getOrDefault(name, List.of());
    }

    public boolean has(String name) {
        return sent.containsKey(name);
    }

    /** The version of the project the form was filled in from; a form of ours always carries it. */
    public long version() {
        try {
            return Long.parseLong(text("version"));
        } catch (NumberFormatException none) {
            throw new ResponseStatusException(HttpStatus.BAD_REQUEST, "The form names no version", none);
        }
    }
}
