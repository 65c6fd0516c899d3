package skytally.web;

import java.util.Arrays;
import java.util.List;
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
     */
    public record Link(String word, String href, boolean current) {}

    static List<SwitchRow> of(Switches inForce, String query) {
        return List.of(
                row("units", Switches.Units.values(), inForce.units(), query),
                row("theme", Switches.Theme.values(), inForce.theme(), query));
    }

    private static SwitchRow row(String name, Switches.Choice[] choices, Switches.Choice inForce, String query) {
        return new SwitchRow(
                name,
                Arrays.stream(choices)
                        .map(one -> new Link(one.word(), address(query, name, one.word()), one == inForce))
                        .toList());
    }

    private static String address(String query, String name, String word) {
        return UriComponentsBuilder.newInstance()
                .query(query)
                .replaceQueryParam(name, word)
                .build()
                .toUriString();
    }
}
