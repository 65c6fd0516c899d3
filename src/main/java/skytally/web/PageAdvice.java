package skytally.web;

import jakarta.servlet.http.HttpServletRequest;
import java.util.List;
import org.springframework.web.bind.annotation.ControllerAdvice;
import org.springframework.web.bind.annotation.ModelAttribute;

/** Gives every page what the layout shows around it. */
@ControllerAdvice
class PageAdvice {

    /** The pages that exist, in the order the head of each page names them. A new page is one line here. */
    private static final List<Room> ROOMS =
            List.of(new Room("first-look", "/"), new Room("projects", "/projects"), new Room("guide", "/guide"));

    /**
     * A page the head of every page leads to.
     *
     * @param name as in messages: {@code room.first-look}, and in a template's {@code room}
     * @param href its address
     */
    record Room(String name, String href) {}

    @ModelAttribute("rooms")
    List<Room> rooms() {
        return ROOMS;
    }

    @ModelAttribute("switches")
    Switches switches(HttpServletRequest request) {
        return Switches.of(request);
    }

    @ModelAttribute("switchRows")
    List<SwitchRow> switchRows(HttpServletRequest request) {
        String query = request.getQueryString();
        return SwitchRow.of(Switches.of(request), query == null ? "" : query);
    }
}
