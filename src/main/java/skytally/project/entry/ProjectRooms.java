package skytally.project.entry;

import java.util.List;
import java.util.UUID;
import org.springframework.web.bind.annotation.ControllerAdvice;
import org.springframework.web.bind.annotation.ModelAttribute;

/** The pages of one project, which each of them leads to. */
@ControllerAdvice("skytally")
class ProjectRooms {

    /** The pages that exist, in the order they are named. A new page is one line here. */
    private static final List<Room> ROOMS = List.of(
            new Room("front", ""),
            new Room("documents", "documents"),
            new Room("site", "site"),
            new Room("lights", "lights"),
            new Room("places", "places"),
            new Room("plan", "plan"),
            new Room("seen", "seen"),
            new Room("sky", "sky"),
            new Room("history", "history"));

    /**
     * A page of a project.
     *
     * @param name as in messages: {@code project.room.lights}, and as {@code project/rooms} is told the current one
     * @param path after the address of the project, or empty for that address itself
     */
    record Room(String name, String path) {

        /** Its address in one project. */
        public String in(UUID project) {
            return "/projects/" + project + (path.isEmpty() ? "" : "/" + path);
        }
    }

    @ModelAttribute("projectRooms")
    List<Room> rooms() {
        return ROOMS;
    }
}
