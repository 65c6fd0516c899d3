package skytally.project.shelf;

import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.time.Clock;
import java.util.Optional;
import java.util.Set;
import java.util.UUID;
import org.springframework.stereotype.Controller;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.PathVariable;
import org.springframework.web.bind.annotation.PostMapping;
import org.springframework.web.bind.annotation.RequestMapping;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.servlet.ModelAndView;
import skytally.project.KeptProject;
import skytally.project.NoSuchProjectException;
import skytally.project.Projects;
import skytally.project.Step;
import skytally.project.entry.WhoCookie;

/** Everything that was ever saved of a project, and the way back. */
@Controller
@RequestMapping("/projects/{id}/history")
class HistoryController {

    private static final Set<String> DONE = Set.of("undone", "nothing");
    private static final int CHANGES_A_PAGE = 100;

    private final Projects projects;
    private final Clock clock = Clock.systemUTC();

    HistoryController(Projects projects) {
        this.projects = projects;
    }

    @GetMapping
    ModelAndView history(
            @PathVariable String id,
            @RequestParam(defaultValue = "") String before,
            @RequestParam(defaultValue = "") String done,
            HttpServletRequest request) {
        KeptProject kept = projects.require(id);
        UUID uuid = kept.project().id();
        ModelAndView page = new ModelAndView("project/history");
        page.addObject("kept", kept);
        page.addObject(
                "history",
                HistoryPage.of(
                        projects.history(
                                uuid,
                                number(before).orElse(Long.MAX_VALUE),
                                HistoryPage.STEPS + 1,
                                HistoryPage.CHANGES),
                        projects.lastStanding(uuid).orElse(null),
                        kept.project(),
                        clock.instant()));
        page.addObject("done", DONE.contains(done) ? done : null);
        page.addObject("who", WhoCookie.in(request));
        return page;
    }

    @GetMapping("/{step}")
    ModelAndView step(
            @PathVariable String id, @PathVariable String step, @RequestParam(defaultValue = "0") String from) {
        KeptProject kept = projects.require(id);
        long wanted = number(step).orElseThrow(NoSuchProjectException::new);
        int first = number(from).orElse(0L).intValue();
        Step found = projects.step(kept.project().id(), wanted, first, CHANGES_A_PAGE)
                .orElseThrow(NoSuchProjectException::new);
        ModelAndView page = new ModelAndView("project/step");
        page.addObject("kept", kept);
        page.addObject("step", HistoryPage.line(found, kept.project(), clock.instant()));
        page.addObject("first", first);
        page.addObject("next", first + CHANGES_A_PAGE < found.count() ? first + CHANGES_A_PAGE : null);
        return page;
    }

    @PostMapping("/undo")
    ModelAndView undo(
            @PathVariable String id,
            @RequestParam long version,
            @RequestParam(defaultValue = "") String who,
            HttpServletResponse response) {
        UUID uuid = projects.require(id).project().id();
        boolean undone =
                projects.undo(uuid, version, WhoCookie.taken(who, response)).isPresent();
        return new ModelAndView("redirect:/projects/" + uuid + "/history?done=" + (undone ? "undone" : "nothing"));
    }

    private static Optional<Long> number(String text) {
        return text.matches("\\d{1,9}") ? Optional.of(Long.valueOf(text)) : Optional.empty();
    }
}
