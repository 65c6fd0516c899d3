package skytally.project.entry;

import java.util.List;
import org.springframework.web.bind.annotation.ControllerAdvice;
import org.springframework.web.bind.annotation.ModelAttribute;

/** The pages of one project, which each of them leads to. */
@ControllerAdvice("skytally")
class ProjectRooms {

    /** The pages that exist, in the order they are named. A new page is one line here. */
    private static final List<Room> ROOMS = List.of(
            new Room("documents", "documents"),
            new Room("site", "site"),
            new Room("lights", "lights"),
            new Room("places", "places"),
            new Room("seen", "seen"),
            new Room("sky", "sky"));

    /**
     * A page of a project.
     *
     * @param name as in messages: {@code project.room.lights}, and as {@code project/rooms} is told the current one
     * @param path after the address of the project
     */
    record Room(String name, String path) {}

    @ModelAttribute("projectRooms")
    List<Room> rooms() {
        return ROOMS;
    }
}
