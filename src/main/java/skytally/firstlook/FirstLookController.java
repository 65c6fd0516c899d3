package skytally.firstlook;

import jakarta.servlet.http.HttpServletResponse;
import java.util.List;
import java.util.Locale;
import org.springframework.context.MessageSource;
import org.springframework.http.HttpHeaders;
import org.springframework.http.HttpStatus;
import org.springframework.http.MediaType;
import org.springframework.stereotype.Controller;
import org.springframework.util.MultiValueMap;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.bind.annotation.ResponseBody;
import org.springframework.web.servlet.ModelAndView;
import org.springframework.web.servlet.view.RedirectView;
import skytally.web.InvalidInputException;
import skytally.web.Switches;

/** The first look: the sentence in the address, the answer on the same page or, for programs, as data. */
@Controller
class FirstLookController {

    private final Answers answers;
    /** A way on from here: who takes it, and the sample that shows it. */
    record Door(String name, String sample) {}

    private static final List<Door> DOORS = List.of(
            new Door("reviewing", "sillow-gateway"),
            new Door("nearby", "ferrin-lane"),
            new Door("designing", "ostrel-valley"));

    private final MessageSource messages;

    FirstLookController(Answers answers, MessageSource messages) {
        this.answers = answers;
        this.messages = messages;
    }

    @GetMapping(path = "/", produces = MediaType.TEXT_HTML_VALUE)
    ModelAndView page(
            @RequestParam MultiValueMap<String, String> sent, Switches switches, HttpServletResponse response) {
        response.addHeader(HttpHeaders.VARY, HttpHeaders.ACCEPT);
        if (sent.containsKey(SentenceAddress.FORM)) {
            RedirectView plain = new RedirectView(SentenceAddress.plainAddress(sent));
            plain.setStatusCode(HttpStatus.SEE_OTHER);
            plain.setExposeModelAttributes(false);
            plain.setExpandUriTemplateVariables(false);
            return new ModelAndView(plain);
        }
        SentenceReader.Result read = SentenceReader.read(sent, switches.units());
        ModelAndView page = new ModelAndView("firstlook/page");
        page.addObject("doors", DOORS);
        page.addObject("passedOver", SentenceReader.passedOver(sent));
        page.addObject("form", SentenceForm.of(sent, read, switches.units()));
        read.sentence()
                .ifPresent(sentence -> page.addObject("keep", KeepForm.of(sentence, SentenceProject.title(sentence))));
        read.sentence()
                .map(answers::to)
                .ifPresentOrElse(
                        answer -> page.addObject("answer", FirstLookPage.of(answer, switches.units())),
                        () -> page.setStatus(HttpStatus.BAD_REQUEST));
        return page;
    }

    @GetMapping(path = "/", produces = MediaType.APPLICATION_JSON_VALUE)
    @ResponseBody
    FirstLookJson data(@RequestParam MultiValueMap<String, String> sent, HttpServletResponse response) {
        response.addHeader(HttpHeaders.VARY, HttpHeaders.ACCEPT);
        SentenceReader.Result read = SentenceReader.read(sent);
        Sentence sentence = read.sentence().orElseThrow(() -> new InvalidInputException(faults(read)));
        String caution = messages.getMessage("caution", null, Locale.ENGLISH);
        return FirstLookJson.of(answers.to(sentence), SentenceReader.passedOver(sent), caution);
    }

    private static List<InvalidInputException.Fault> faults(SentenceReader.Result read) {
        return read.faults().stream()
                .map(fault -> new InvalidInputException.Fault(fault.blank().field(), fault.message()))
                .toList();
    }
}
