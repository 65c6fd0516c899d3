package skytally.firstlook;

import java.util.List;
import java.util.Locale;
import java.util.UUID;
import org.springframework.context.MessageSource;
import org.springframework.http.HttpStatus;
import org.springframework.stereotype.Controller;
import org.springframework.util.MultiValueMap;
import org.springframework.web.bind.annotation.PostMapping;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.servlet.ModelAndView;
import skytally.project.Project;
import skytally.project.Projects;
import skytally.project.Saving;
import skytally.web.InvalidInputException;

/** Keeps a first look as a project, without anything typed twice. */
@Controller
class KeepController {

    private final Projects projects;
    private final MessageSource messages;

    KeepController(Projects projects, MessageSource messages) {
        this.projects = projects;
        this.messages = messages;
    }

    @PostMapping("/keep")
    ModelAndView keep(@RequestParam MultiValueMap<String, String> sent, @RequestParam(defaultValue = "") String title) {
        SentenceReader.Result read = SentenceReader.read(sent);
        Sentence sentence = read.sentence()
                .orElseThrow(() -> new InvalidInputException(read.faults().stream()
                        .map(fault ->
                                new InvalidInputException.Fault(fault.blank().field(), fault.message()))
                        .toList()));
        String wrong = title.isBlank()
                ? "shelf.fault.title.empty"
                : title.strip().length() > Projects.LONGEST_TITLE ? "shelf.fault.title.long" : "";
        if (!wrong.isEmpty()) {
            ModelAndView again = new ModelAndView("firstlook/keep", HttpStatus.BAD_REQUEST);
            again.addObject("keep", KeepForm.of(sentence, title));
            again.addObject("faults", List.of(new InvalidInputException.Fault("title", say(wrong))));
            return again;
        }
        Project project = SentenceProject.of(sentence, UUID.randomUUID(), title.strip());
        projects.add(project, Saving.by("", say("firstlook.keep.why")));
        return new ModelAndView("redirect:/projects/" + project.id() + "?done=kept");
    }

    private String say(String key) {
        return messages.getMessage(key, null, Locale.ENGLISH);
    }
}
