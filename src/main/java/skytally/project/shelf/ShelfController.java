package skytally.project.shelf;

import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import java.time.Clock;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.UUID;
import org.jspecify.annotations.Nullable;
import org.springframework.context.MessageSource;
import org.springframework.http.HttpStatus;
import org.springframework.http.MediaType;
import org.springframework.stereotype.Controller;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.PathVariable;
import org.springframework.web.bind.annotation.PostMapping;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.multipart.MultipartFile;
import org.springframework.web.servlet.ModelAndView;
import skytally.project.KeptProject;
import skytally.project.NoSuchProjectException;
import skytally.project.Project;
import skytally.project.ProjectClashException;
import skytally.project.Projects;
import skytally.project.Saving;
import skytally.project.WholeProject;
import skytally.project.entry.WhoCookie;
import skytally.project.transfer.ProjectFile;
import skytally.project.transfer.ProjectFileException;
import skytally.web.InvalidInputException.Fault;

/** The list of projects, and every way one comes onto it: by a title, from a file, from a sample. */
@Controller
class ShelfController {

    /** What may have been done just now, as a word in the address. */
    private static final Set<String> DONE = Set.of("deleted", "gone");

    private final Projects projects;
    private final WaitingFiles waiting;
    private final MessageSource messages;
    private final Clock clock = Clock.systemUTC();

    ShelfController(Projects projects, WaitingFiles waiting, MessageSource messages) {
        this.projects = projects;
        this.waiting = waiting;
        this.messages = messages;
    }

    /** A line of the list. */
    public record Line(UUID id, String title, Ago changed) {}

    @GetMapping("/projects")
    ModelAndView list(@RequestParam(defaultValue = "") String done, HttpServletRequest request) {
        ModelAndView page = page(List.of(), "", request);
        page.addObject("done", DONE.contains(done) ? done : null);
        return page;
    }

    private ModelAndView page(List<Fault> faults, String title, HttpServletRequest request) {
        ModelAndView page = new ModelAndView("project/list");
        page.addObject(
                "lines",
                projects.list().stream()
                        .map(one -> new Line(one.id(), one.title(), Ago.of(one.changedAt(), clock.instant())))
                        .toList());
        page.addObject("samples", Samples.all());
        page.addObject("faults", faults);
        page.addObject("typedTitle", title);
        page.addObject("who", WhoCookie.in(request));
        if (!faults.isEmpty()) {
            page.setStatus(HttpStatus.BAD_REQUEST);
        }
        return page;
    }

    @PostMapping("/projects")
    ModelAndView make(
            @RequestParam(defaultValue = "") String title,
            @RequestParam(defaultValue = "") String who,
            HttpServletRequest request,
            HttpServletResponse response) {
        List<Fault> faults = titleFaults(title);
        if (!faults.isEmpty()) {
            return page(faults, title, request);
        }
        String name = WhoCookie.taken(who, response);
        Project project = Project.named(UUID.randomUUID(), title.strip());
        projects.add(project, Saving.by(name, say("shelf.why.new")));
        return to(project.id(), "added");
    }

    /** What is wrong with a title, as faults of the field {@code title}. */
    private List<Fault> titleFaults(String title) {
        return titleFaults(title, messages);
    }

    static List<Fault> titleFaults(String title, MessageSource messages) {
        String wrong = title.isBlank()
                ? "shelf.fault.title.empty"
                : title.strip().length() > Projects.LONGEST_TITLE ? "shelf.fault.title.long" : "";
        return wrong.isEmpty()
                ? List.of()
                : List.of(new Fault("title", messages.getMessage(wrong, null, Locale.ENGLISH)));
    }

    @PostMapping(path = "/projects/open", consumes = MediaType.MULTIPART_FORM_DATA_VALUE)
    ModelAndView open(@RequestParam(required = false) @Nullable MultipartFile file, HttpServletRequest request)
            throws IOException {
        if (file == null
                || (file.isEmpty() && String.valueOf(file.getOriginalFilename()).isEmpty())) {
            return page(List.of(new Fault("file", say("shelf.fault.file.none"))), "", request);
        }
        WholeProject whole;
        try {
            whole = ProjectFile.open(file.getBytes());
        } catch (ProjectFileException refused) {
            return page(List.of(fault(refused)), "", request);
        }
        Project opened = whole.project();
        if (!titleFaults(opened.title()).isEmpty()) {
            return page(List.of(new Fault("file", say("shelf.fault.file.title"))), "", request);
        }
        Optional<KeptProject> kept = projects.find(opened.id());
        if (kept.isEmpty()) {
            projects.add(whole, Saving.by(WhoCookie.in(request), say("shelf.why.file")));
            return to(opened.id(), "opened");
        }
        if (kept.get().project().equals(opened)) {
            return to(opened.id(), "same");
        }
        return new ModelAndView("redirect:/projects/waiting/" + waiting.hold(whole));
    }

    private Fault fault(ProjectFileException refused) {
        return new Fault(
                "file", messages.getMessage("shelf.fault.file", new Object[] {refused.getMessage()}, Locale.ENGLISH));
    }

    @GetMapping("/projects/waiting/{token}")
    ModelAndView ask(@PathVariable String token) {
        Optional<Project> opened = waiting.find(token).map(WholeProject::project);
        if (opened.isEmpty()) {
            return gone();
        }
        Optional<KeptProject> kept = projects.find(opened.get().id());
        ModelAndView page = new ModelAndView("project/waiting");
        page.addObject("token", token);
        page.addObject("inFile", Holding.of(opened.get()));
        // Nothing, if it was deleted while the question stood open.
        page.addObject("kept", kept.orElse(null));
        page.addObject("inList", kept.map(one -> Holding.of(one.project())).orElse(null));
        page.addObject(
                "changed",
                kept.map(one -> Ago.of(one.changedAt(), clock.instant())).orElse(null));
        return page;
    }

    @PostMapping("/projects/waiting/{token}/replace")
    ModelAndView replace(@PathVariable String token, @RequestParam long version, HttpServletRequest request) {
        Optional<WholeProject> opened = waiting.find(token);
        if (opened.isEmpty()) {
            return gone();
        }
        projects.save(opened.get(), version, Saving.by(WhoCookie.in(request), say("shelf.why.replaced")));
        waiting.letGo(token);
        return to(opened.get().project().id(), "replaced");
    }

    @PostMapping("/projects/waiting/{token}/keep-both")
    ModelAndView keepBoth(@PathVariable String token, HttpServletRequest request) {
        Optional<WholeProject> opened = waiting.find(token);
        if (opened.isEmpty()) {
            return gone();
        }
        Project copy = Copies.withFreshId(opened.get().project());
        projects.add(
                new WholeProject(copy, opened.get().attachments()),
                Saving.by(WhoCookie.in(request), say("shelf.why.file")));
        waiting.letGo(token);
        return to(copy.id(), "opened");
    }

    @PostMapping("/projects/samples/{name}")
    ModelAndView sample(@PathVariable String name, HttpServletRequest request) {
        Project sample = Samples.byName(name).orElseThrow(NoSuchProjectException::new);
        return to(
                added(sample, Saving.by(WhoCookie.in(request), say("shelf.why.sample")))
                        .id(),
                "sample");
    }

    /** Under its own id the first time, even where two open it at once; as a copy ever after. */
    private Project added(Project sample, Saving saving) {
        try {
            return projects.add(sample, saving).project();
        } catch (ProjectClashException keptAlready) {
            return projects.add(Copies.withFreshId(sample), saving).project();
        }
    }

    private static ModelAndView to(UUID id, String done) {
        return new ModelAndView("redirect:/projects/" + id + "?done=" + done);
    }

    private static ModelAndView gone() {
        return new ModelAndView("redirect:/projects?done=gone");
    }

    private String say(String key) {
        return messages.getMessage(key, null, Locale.ENGLISH);
    }
}
