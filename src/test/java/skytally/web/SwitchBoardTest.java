package skytally.web;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.LinkedHashMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.springframework.mock.web.MockHttpServletRequest;
import skytally.web.SwitchBoard.Chosen;
import skytally.web.Switches.Theme;

@DisplayName("The switches of a page that has more of them")
class SwitchBoardTest {

    private static SwitchBoard asked(@Nullable String query) {
        MockHttpServletRequest request = new MockHttpServletRequest("GET", "/somewhere");
        request.setQueryString(query);
        return SwitchBoard.of(request);
    }

    private static Map<String, String> named() {
        Map<String, String> named = new LinkedHashMap<>();
        named.put("a.1", "The <first>");
        named.put("b-2", "The second");
        return named;
    }

    @Test
    void takeAChoiceFromTheAddressAndPassOverAWordThatIsNone() {
        assertThat(asked("x=dark").choose("x", Theme.values(), Theme.DAY).choice())
                .isEqualTo(Theme.DARK);
        assertThat(asked("x=sepia").choose("x", Theme.values(), Theme.DAY).choice())
                .isEqualTo(Theme.DAY);
        assertThat(asked("").choose("x", Theme.values(), Theme.DAY).choice()).isEqualTo(Theme.DAY);
        assertThat(asked("s=b-2").chooseNamed("s", named(), "a.1").choice()).isEqualTo("b-2");
        assertThat(asked("s=c").chooseNamed("s", named(), "a.1").choice()).isEqualTo("a.1");
    }

    @Test
    void areLinksThatKeepTheRestOfTheAddressAndLeadBackToTheirPart() {
        Chosen<Theme> chosen = asked("units=us&x=dark&s=b-2").choose("x", Theme.values(), Theme.DAY, "part");

        assertThat(chosen.row().choices())
                .extracting(SwitchRow.Link::href)
                .containsExactly(
                        "?units=us&s=b-2&x=day#part",
                        "?units=us&s=b-2&x=dark#part",
                        "?units=us&s=b-2&x=telescope#part");
        assertThat(chosen.row().choices())
                .filteredOn(SwitchRow.Link::current)
                .singleElement()
                .satisfies(link -> assertThat(link.word()).isEqualTo("dark"));
    }

    @Test
    void sayChoicesThatPeopleNamedInTheirWords() {
        SwitchRow row = asked("").chooseNamed("s", named(), "a.1").row();

        assertThat(row.choices()).extracting(SwitchRow.Link::said).containsExactly("The <first>", "The second");
        assertThat(row.choices()).extracting(SwitchRow.Link::href).containsExactly("?s=a.1", "?s=b-2");
    }

    @Test
    void standBetweenUnitsAndTheme() {
        SwitchBoard board = asked("units=us&theme=dark");

        assertThat(board.rows(board.chooseNamed("s", named(), "a.1").row()))
                .extracting(SwitchRow::name)
                .containsExactly("units", "s", "theme");
        assertThat(board.always()).isEqualTo(new Switches(Switches.Units.US, Theme.DARK));
    }

    @Test
    void goAlongToAnotherPage() {
        assertThat(asked("units=us&x=dark").address("/there")).isEqualTo("/there?units=us&x=dark");
        assertThat(asked(null).address("/there", "part")).isEqualTo("/there#part");
        assertThat(asked("x=dark").address("/there", "x", "day", "part")).isEqualTo("/there?x=day#part");
    }
}
