package skytally.review.sky;

import java.util.UUID;
import org.springframework.stereotype.Controller;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.PathVariable;
import org.springframework.web.servlet.ModelAndView;
import skytally.assessment.Scope.Others;
import skytally.project.KeptProject;
import skytally.project.Place;
import skytally.review.ReviewDesk;
import skytally.review.ReviewDesk.Opened;
import skytally.review.Reviews;
import skytally.web.SwitchBoard;

/** How the sky over the places of a project brightens. */
@Controller
class SkyController {

    private static final String ROOM = "sky";

    private final ReviewDesk desk;
    private final Reviews reviews;

    SkyController(ReviewDesk desk, Reviews reviews) {
        this.desk = desk;
        this.reviews = reviews;
    }

    @GetMapping("/projects/{id}/sky")
    ModelAndView first(@PathVariable UUID id, SwitchBoard board) {
        KeptProject kept = desk.project(id);
        return kept.project().places().stream()
                .findFirst()
                .map(place -> page(kept, place, board))
                .orElseGet(() -> desk.noPlace(kept, ROOM));
    }

    @GetMapping("/projects/{id}/sky/{mark}")
    ModelAndView place(@PathVariable UUID id, @PathVariable String mark, SwitchBoard board) {
        KeptProject kept = desk.project(id);
        return page(kept, desk.place(kept, mark), board);
    }

    private ModelAndView page(KeptProject kept, Place place, SwitchBoard board) {
        Opened opened = desk.open(kept, ROOM, place, board, Others.NOTHING);
        ModelAndView page = desk.page("review/sky", opened);
        SkyPage.of(opened.review(), place, opened.frame(), reviews.otherAirs(kept, opened.review(), place.mark()))
                .ifPresent(sky -> page.addObject("sky", sky));
        page.addObject("seenAddress", board.address(ReviewDesk.address(kept, "seen", place.mark())));
        return page;
    }
}
