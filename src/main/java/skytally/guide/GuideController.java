package skytally.guide;

import java.util.Comparator;
import java.util.List;
import org.springframework.context.MessageSource;
import org.springframework.stereotype.Controller;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.servlet.ModelAndView;
import skytally.citation.Bibliography;
import skytally.citation.Citation;
import skytally.firstlook.StandIns;
import skytally.luminaire.ShapeWords;

/** The guide: what the tool rests on, all of it read from the tables the reckoning reads. */
@Controller
class GuideController {

    private final List<StandInRow> standIns;
    private final List<ShapeRow> shapes = ShapeRow.all();
    private final List<SpectrumRow> spectra = SpectrumRow.all();

    GuideController(MessageSource messages) {
        this.standIns = StandInRow.all(messages);
    }

    @GetMapping("/guide")
    ModelAndView page() {
        return new ModelAndView("guide/page")
                .addObject("parts", List.of("words", "shapes", "stand-ins", "spectra", "not-assessed", "sources"))
                .addObject("words", ShapeWords.rows())
                .addObject("shapes", shapes)
                .addObject("standIns", standIns)
                .addObject("guesses", StandIns.all())
                .addObject("spectra", spectra)
                .addObject("scope", NotAssessed.all(NotAssessed.Kind.SCOPE))
                .addObject("model", NotAssessed.all(NotAssessed.Kind.MODEL))
                .addObject(
                        "sources",
                        Bibliography.all().stream()
                                .sorted(Comparator.comparing(Citation::reference))
                                .toList());
    }
}
