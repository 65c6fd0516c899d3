package skytally.project.entry;

import java.util.Map;
import java.util.UUID;
import org.springframework.http.HttpStatus;
import org.springframework.stereotype.Component;
import org.springframework.web.server.ResponseStatusException;
import org.springframework.web.servlet.ModelAndView;
import org.springframework.web.servlet.view.RedirectView;
import org.springframework.web.util.UriComponentsBuilder;
import skytally.project.Attachment;
import skytally.project.KeptProject;
import skytally.project.Project;
import skytally.project.Projects;
import skytally.project.Saving;
import skytally.project.WholeProject;

/** Opens a project for a page, saves what the page changed, and leads on. */
@Component
public class ProjectDesk {

    private final Projects projects;
    private final Words words;

    ProjectDesk(Projects projects, Words words) {
        this.projects = projects;
        this.words = words;
    }

    /** The project, or the page that says there is none. */
    public KeptProject open(UUID id) {
        return projects.find(id).orElseThrow(() -> new ResponseStatusException(HttpStatus.NOT_FOUND));
    }

    /**
     * The project a form was filled in from.
     *
     * @throws skytally.project.ProjectClashException if it was saved since
     */
    public KeptProject openForChange(UUID id, Typed typed) {
        return open(id).requireVersion(typed.version());
    }

    /**
     * Saves it over the version it was opened at.
     *
     * @param why key of the message that says what was done, with what goes into it
     */
    public void save(KeptProject opened, Project changed, String who, String why, Object... with) {
        projects.save(changed, opened.version(), Saving.by(who, words.say(why, with)));
    }

    /** Saves it with files that are new. */
    public void save(KeptProject opened, WholeProject changed, String who, String why, Object... with) {
        projects.save(changed, opened.version(), Saving.by(who, words.say(why, with)));
    }

    /** The bytes of a file that one of the project's documents has. */
    public byte[] bytes(UUID id, Attachment file) {
        return projects.bytes(id, file.sha256()).orElseThrow(() -> new ResponseStatusException(HttpStatus.NOT_FOUND));
    }

    /** A page of the project, with what was just done if the address says so. */
    public ModelAndView page(String template, KeptProject kept, Typed typed) {
        ModelAndView page = new ModelAndView(template);
        page.addObject("kept", kept);
        String done = typed.text("done");
        if (done.matches("[a-z-]{1,40}")) {
            String many = typed.text("many");
            words.find("done." + done, many.matches("\\d{1,6}") ? Integer.parseInt(many) : 0)
                    .ifPresent(said -> page.addObject("done", said));
        }
        return page;
    }

    /** The same page with what is wrong with what was sent to it. */
    public ModelAndView refusal(String template, KeptProject kept) {
        ModelAndView page = new ModelAndView(template, HttpStatus.BAD_REQUEST);
        page.addObject("kept", kept);
        return page;
    }

    /** On to a page of the project, which will say what was done. */
    public ModelAndView on(KeptProject kept, String done, String... path) {
        return on(kept, done, Heading.NONE, path);
    }

    /** On to a page whose form begins with the same document. */
    public ModelAndView on(KeptProject kept, String done, Heading heading, String... path) {
        return on(kept, done, 0, heading, path);
    }

    /**
     * On to a page that will say how many it was done to.
     *
     * @param many goes into the message
     */
    public ModelAndView on(KeptProject kept, String done, int many, Heading heading, String... path) {
        UriComponentsBuilder address = UriComponentsBuilder.fromPath("/projects")
                .pathSegment(kept.project().id().toString())
                .pathSegment(path)
                .queryParam("done", done);
        if (many > 0) {
            address.queryParam("many", many);
        }
        if (!heading.document().isEmpty()) {
            address.queryParam("document", "{document}").queryParam("party", "{party}");
        }
        RedirectView view = new RedirectView(address.encode()
                .buildAndExpand(Map.of("document", heading.document(), "party", heading.party()))
                .toUriString());
        view.setStatusCode(HttpStatus.SEE_OTHER);
        view.setExposeModelAttributes(false);
        view.setExpandUriTemplateVariables(false);
        return new ModelAndView(view);
    }
}
