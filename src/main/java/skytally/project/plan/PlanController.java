package skytally.project.plan;

import java.util.List;
import java.util.UUID;
import org.springframework.stereotype.Controller;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.PathVariable;
import org.springframework.web.bind.annotation.RequestMapping;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.servlet.ModelAndView;
import skytally.charts.SitePlan.Unit;
import skytally.project.KeptProject;
import skytally.project.Scheme;
import skytally.project.entry.ProjectDesk;
import skytally.project.entry.Words;
import skytally.web.Switches;

/** The plan of a project, drawn from what was entered. */
@Controller
@RequestMapping("/projects/{id}/plan")
class PlanController {

    private final ProjectDesk desk;
    private final Words words;

    PlanController(ProjectDesk desk, Words words) {
        this.desk = desk;
        this.words = words;
    }

    @GetMapping
    ModelAndView plan(
            @PathVariable UUID id,
            @RequestParam(defaultValue = "") String scheme,
            @RequestParam(defaultValue = "") String from,
            Switches switches) {
        KeptProject kept = desk.open(id);
        Scheme drawn = PlanPage.asked(kept.project(), scheme)
                .orElseGet(() -> new Scheme("proposed", Scheme.Kind.PROPOSED, "", List.of(), List.of()));
        Unit unit = switches.units() == Switches.Units.US ? Unit.FEET : Unit.METRES;
        int first = from.matches("\\d{1,6}") ? Integer.parseInt(from) : 0;
        return new ModelAndView("project/plan/page")
                .addObject("kept", kept)
                .addObject("drawn", drawn)
                .addObject("plan", PlanPage.of(kept.project(), drawn, unit, first, words));
    }
}
