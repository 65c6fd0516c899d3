package skytally.project;

import java.io.IOException;
import java.nio.file.Path;
import java.util.UUID;
import org.springframework.boot.WebApplicationType;
import org.springframework.boot.autoconfigure.EnableAutoConfiguration;
import org.springframework.boot.builder.SpringApplicationBuilder;
import org.springframework.boot.security.autoconfigure.UserDetailsServiceAutoConfiguration;
import org.springframework.context.ConfigurableApplicationContext;
import org.springframework.context.annotation.Import;

/**
 * The tool without its pages, as a process of its own: the same data directory, database and {@link Projects}. It says
 * what it finds, then saves until its input ends or it is killed, and says each save only when it is made.
 */
@EnableAutoConfiguration(exclude = UserDetailsServiceAutoConfiguration.class)
@Import(Projects.class)
class SavingProcess {

    static final String FOUND = "found ";
    static final String READY = "ready";
    static final String KEPT = "kept ";

    public static void main(String[] args) throws IOException {
        try (ConfigurableApplicationContext context = new SpringApplicationBuilder(SavingProcess.class)
                .web(WebApplicationType.NONE)
                .run(args)) {
            Projects projects = context.getBean(Projects.class);
            for (Projects.Listed one : projects.list()) {
                say(FOUND + one.id() + " " + projects.countSteps(one.id()) + " " + one.title());
            }
            say(READY);
            int number = 0;
            while (System.in.available() == 0) {
                number++;
                KeptProject kept = projects.add(titled(UUID.randomUUID(), "1 of " + number), Saving.by("", ""));
                say(KEPT + kept.project().id() + " 1 1 of " + number);
                projects.save(titled(kept.project().id(), "2 of " + number), kept.version(), Saving.by("", "again"));
                say(KEPT + kept.project().id() + " 2 2 of " + number);
            }
        }
    }

    private static Project titled(UUID id, String title) {
        Project ground = Cases.aSportsGround();
        return new Project(id, title, ground.documents(), ground.site(), ground.schemes(), ground.places());
    }

    private static void say(String line) {
        System.out.println(line);
        System.out.flush();
    }

    /** Starts one on a data directory; what it says on its error output is ours. */
    static Process on(Path data) throws IOException {
        return new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        "-XX:TieredStopAtLevel=1",
                        "-XX:+UseSerialGC",
                        "-cp",
                        System.getProperty("java.class.path"),
                        SavingProcess.class.getName(),
                        "--skytally.data-directory=" + data)
                .redirectError(ProcessBuilder.Redirect.INHERIT)
                .start();
    }
}
