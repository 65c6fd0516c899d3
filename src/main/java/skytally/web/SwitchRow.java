package skytally.web;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.springframework.web.util.UriComponentsBuilder;

/**
 * One switch as it stands on a page: its choices side by side, each a link to the same page.
 *
 * @param name    as in an address, and in messages: {@code switch.units}
 * @param choices in the order they are shown
 */
public record SwitchRow(String name, List<Link> choices) {

    /**
     * @param word    the choice, as in an address and in messages: {@code switch.units.us}
     * @param href    the page's own address with this choice in place of the present one
     * @param current whether it is the one in force
     * @param said    the choice in words, where people named it themselves; else nothing
     */
    public record Link(
            String word,
            String href,
            boolean current,
            @Nullable String said) {}

    static List<SwitchRow> of(Switches inForce, String query) {
        return List.of(
                of("units", Switches.Units.values(), inForce.units(), query, ""),
                of("theme", Switches.Theme.values(), inForce.theme(), query, ""));
    }

    static SwitchRow of(String name, Switches.Choice[] choices, Switches.Choice inForce, String query, String part) {
        String end = part.isEmpty() ? "" : "#" + part;
        return new SwitchRow(
                name,
                Arrays.stream(choices)
                        .map(one ->
                                new Link(one.word(), address(query, name, one.word()) + end, one.equals(inForce), null))
                        .toList());
    }

    static SwitchRow named(String name, Map<String, String> choices, String inForce, String query) {
        return new SwitchRow(
                name,
                choices.entrySet().stream()
                        .map(one -> new Link(
                                one.getKey(),
                                address(query, name, one.getKey()),
                                one.getKey().equals(inForce),
                                one.getValue()))
                        .toList());
    }

    static String address(String query, String name, String word) {
        return UriComponentsBuilder.newInstance()
                .query(query)
                .replaceQueryParam(name, word)
                .build()
                .toUriString();
    }
}
