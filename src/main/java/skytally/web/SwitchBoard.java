package skytally.web;

import jakarta.servlet.http.HttpServletRequest;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.springframework.util.MultiValueMap;
import org.springframework.web.util.UriComponentsBuilder;
import skytally.web.Switches.Choice;

/**
 * The switches of one request, for a page that has more than units and theme: each a name in the address and the
 * choices it may have. A controller asks for it as an argument, chooses, and hands the rows to the page:
 *
 * <pre>{@code
 * Chosen<Hour> hour = board.choose("hour", Hour.values(), Hour.EARLY);
 * page.addObject("switchRows", board.rows(hour.row()));
 * }</pre>
 *
 * <p>A word that is no choice is passed over. Every choice is an address by itself, so that any view can be quoted.
 */
public final class SwitchBoard {

    private final String query;
    private final MultiValueMap<String, String> asked;
    private final Switches always;

    private SwitchBoard(String query, Switches always) {
        this.query = query;
        this.asked = UriComponentsBuilder.newInstance().query(query).build().getQueryParams();
        this.always = always;
    }

    static SwitchBoard of(HttpServletRequest request) {
        String query = request.getQueryString();
        return new SwitchBoard(query == null ? "" : query, Switches.of(request));
    }

    /**
     * A choice and the switch as it stands with it.
     *
     * @param choice in force
     * @param row    for the page
     */
    public record Chosen<T>(T choice, SwitchRow row) {}

    /** How units and theme stand. */
    public Switches always() {
        return always;
    }

    /**
     * A switch whose choices have their words in the message file: {@code switch.hour.early}.
     *
     * @param otherwise in force where the address names none
     */
    public <T extends Choice> Chosen<T> choose(String name, T[] choices, T otherwise) {
        return choose(name, choices, otherwise, "");
    }

    /**
     * The same for a part of a page further down.
     *
     * @param part id of the part, which its links lead back to
     */
    public <T extends Choice> Chosen<T> choose(String name, T[] choices, T otherwise, String part) {
        String word = asked.getFirst(name);
        T choice = Arrays.stream(choices)
                .filter(one -> one.word().equals(word))
                .findFirst()
                .orElse(otherwise);
        return new Chosen<>(choice, SwitchRow.of(name, choices, choice, query, part));
    }

    /**
     * A switch whose choices people named themselves.
     *
     * @param choices   words by the name in the address, in order
     * @param otherwise in force where the address names none
     */
    public Chosen<String> chooseNamed(String name, Map<String, String> choices, String otherwise) {
        @Nullable String word = asked.getFirst(name);
        String choice = word != null && choices.containsKey(word) ? word : otherwise;
        return new Chosen<>(choice, SwitchRow.named(name, new LinkedHashMap<>(choices), choice, query));
    }

    /** All switches of the page: units, the page's own, theme. */
    public List<SwitchRow> rows(SwitchRow... own) {
        List<SwitchRow> always = SwitchRow.of(this.always, query);
        List<SwitchRow> rows = new ArrayList<>(always.subList(0, 1));
        rows.addAll(Arrays.asList(own));
        rows.addAll(always.subList(1, always.size()));
        return rows;
    }

    /** The address of another page with everything switched as on this one. */
    public String address(String path) {
        return query.isEmpty() ? path : path + "?" + query;
    }

    /**
     * The same, at a part of that page.
     *
     * @param part id of the part; the whole page if empty
     */
    public String address(String path, String part) {
        return part.isEmpty() ? address(path) : address(path) + "#" + part;
    }

    /** The same with one switch set another way. */
    public String address(String path, String name, String word, String part) {
        return path + SwitchRow.address(query, name, word) + (part.isEmpty() ? "" : "#" + part);
    }
}
