package skytally.review;

import java.util.List;
import java.util.UUID;
import org.springframework.http.HttpStatus;
import org.springframework.stereotype.Component;
import org.springframework.web.server.ResponseStatusException;
import org.springframework.web.servlet.ModelAndView;
import skytally.assessment.Scope.Others;
import skytally.project.KeptProject;
import skytally.project.Place;
import skytally.project.entry.ProjectDesk;
import skytally.project.entry.Words;
import skytally.review.PlaceFrame.PlaceLink;
import skytally.web.SwitchBoard;

/** Opens a project at one of its places for a page that shows results. */
@Component
public class ReviewDesk {

    private final ProjectDesk projects;
    private final Reviews reviews;
    private final Words words;

    ReviewDesk(ProjectDesk projects, Reviews reviews, Words words) {
        this.projects = projects;
        this.reviews = reviews;
        this.words = words;
    }

    /**
     * What a page about a place is made of.
     *
     * @param kept   the project
     * @param place  looked from
     * @param review its scheme through the night
     * @param frame  what stands around the numbers
     */
    public record Opened(KeptProject kept, Place place, Review review, PlaceFrame frame) {}

    /** The project, or the page that says there is none. */
    public KeptProject project(UUID id) {
        return projects.open(id);
    }

    /** A place of it, or the page that says there is none. */
    public Place place(KeptProject kept, String mark) {
        return kept.project().place(mark).orElseThrow(() -> new ResponseStatusException(HttpStatus.NOT_FOUND));
    }

    /**
     * Opens one place.
     *
     * @param room   the last part of the page's address before the place
     * @param others what the page says of the other places
     */
    public Opened open(KeptProject kept, String room, Place place, SwitchBoard board, Others others) {
        Review review = reviews.of(kept, Asked.of(board, kept.project()), place.mark(), others);
        List<PlaceLink> links = kept.project().places().stream()
                .map(each -> new PlaceLink(
                        each.mark(),
                        PlaceFrame.name(each),
                        board.address(address(kept, room, each.mark())),
                        each.equals(place)))
                .toList();
        return new Opened(kept, place, review, PlaceFrame.of(review, place, links, words));
    }

    /** The address of a page about a place, without its switches. */
    public static String address(KeptProject kept, String room, String mark) {
        return "/projects/" + kept.project().id() + "/" + room + "/" + mark;
    }

    /** A page, with what every page about a place has. */
    public ModelAndView page(String template, Opened opened) {
        ModelAndView page = new ModelAndView(template);
        page.addObject("kept", opened.kept());
        page.addObject("frame", opened.frame());
        page.addObject(
                "located",
                opened.review().shown().observer(opened.place().mark()).isPresent());
        page.addObject("switchRows", opened.review().asked().rows());
        return page;
    }

    /** The page of a project that has no place yet. */
    public ModelAndView noPlace(KeptProject kept, String room) {
        ModelAndView page = new ModelAndView("review/no-place");
        page.addObject("kept", kept);
        page.addObject("here", room);
        return page;
    }
}
