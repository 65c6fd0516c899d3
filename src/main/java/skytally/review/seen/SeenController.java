package skytally.review.seen;

import java.util.Optional;
import java.util.UUID;
import org.springframework.stereotype.Controller;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.PathVariable;
import org.springframework.web.servlet.ModelAndView;
import skytally.assessment.Scope.Others;
import skytally.project.KeptProject;
import skytally.project.Place;
import skytally.review.Asked;
import skytally.review.Night;
import skytally.review.ReviewDesk;
import skytally.review.ReviewDesk.Opened;
import skytally.review.Reviews;
import skytally.web.SwitchBoard;
import skytally.web.SwitchBoard.Chosen;

/** How the places of a project are lit. */
@Controller
class SeenController {

    private static final String ROOM = "seen";

    private final ReviewDesk desk;
    private final Reviews reviews;

    SeenController(ReviewDesk desk, Reviews reviews) {
        this.desk = desk;
        this.reviews = reviews;
    }

    @GetMapping("/projects/{id}/seen")
    ModelAndView first(@PathVariable UUID id, SwitchBoard board) {
        KeptProject kept = desk.project(id);
        return kept.project().places().stream()
                .findFirst()
                .map(place -> page(kept, place, board))
                .orElseGet(() -> desk.noPlace(kept, ROOM));
    }

    @GetMapping("/projects/{id}/seen/{mark}")
    ModelAndView place(@PathVariable UUID id, @PathVariable String mark, SwitchBoard board) {
        KeptProject kept = desk.project(id);
        return page(kept, desk.place(kept, mark), board);
    }

    private ModelAndView page(KeptProject kept, Place place, SwitchBoard board) {
        Chosen<Harm> harm = board.choose("harm", Harm.values(), Harm.DIRECT, "who");
        Others others = harm.choice() == Harm.GLOW ? Others.DIRECT_AND_OVERHEAD : Others.DIRECT;
        Opened opened = desk.open(kept, ROOM, place, board, others);
        Asked asked = opened.review().asked();
        Optional<Night> present = reviews.present(kept, asked, place.mark());
        String here = ReviewDesk.address(kept, ROOM, place.mark());
        HarmCards.Doors doors = new HarmCards.Doors(
                asked.hour(),
                (hour, part) -> board.address(here, Asked.HOUR, hour.word(), part),
                part -> board.address(here, Asked.SCHEME, asked.existing(kept.project()), part));
        WhoCauses.Address address = (mark, part) -> board.address(ReviewDesk.address(kept, ROOM, mark), part);
        ModelAndView page = desk.page("review/seen", opened);
        SeenPage.of(opened.review(), place, opened.frame(), present, harm.choice(), doors, address)
                .ifPresent(seen -> page.addObject("seen", seen));
        page.addObject("skyAddress", board.address(ReviewDesk.address(kept, "sky", place.mark())));
        page.addObject("harm", harm.choice().word());
        page.addObject("harmRow", harm.row());
        return page;
    }
}
