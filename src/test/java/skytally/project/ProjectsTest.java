package skytally.project;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.ArrayList;
import java.util.List;
import java.util.UUID;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.context.SpringBootTest;
import org.springframework.dao.OptimisticLockingFailureException;

@DisplayName("Projects kept in the database")
@SpringBootTest
class ProjectsTest {

    @Autowired
    private Projects projects;

    private static Project fresh(String title) {
        Project ground = Cases.aSportsGround();
        return new Project(
                UUID.randomUUID(), title, ground.documents(), ground.site(), ground.schemes(), ground.places());
    }

    private static Project titled(Project project, String title) {
        return new Project(
                project.id(), title, project.documents(), project.site(), project.schemes(), project.places());
    }

    @Test
    void comeBackAsTheyWereKept() {
        Project project = fresh("Kept");
        projects.add(project, Saving.by("A. Planner", "from the file"));
        assertThat(projects.find(project.id()).orElseThrow().project()).isEqualTo(project);
        assertThat(projects.list()).extracting(Projects.Listed::title).contains("Kept");
        assertThat(projects.history(project.id())).hasSize(1).first().satisfies(step -> {
            assertThat(step.number()).isEqualTo(1);
            assertThat(step.who()).isEqualTo("A. Planner");
            assertThat(step.changes()).extracting(change -> change.key()).contains("title", "places/VA8/values/east");
        });
    }

    @Test
    void refuseASaveOverAnother() {
        KeptProject opened = projects.add(fresh("Two editors"), Saving.by("", ""));
        KeptProject first = projects.save(titled(opened.project(), "Mine"), opened.version(), Saving.by("A", ""));
        assertThatThrownBy(() -> projects.save(titled(opened.project(), "Yours"), opened.version(), Saving.by("B", "")))
                .isInstanceOf(ProjectClashException.class);
        assertThat(projects.find(opened.project().id()).orElseThrow()).isEqualTo(first);
    }

    @Test
    void letOneOfManyAtOnceWin() throws Exception {
        KeptProject opened = projects.add(fresh("Eight at once"), Saving.by("", ""));
        ExecutorService people = Executors.newFixedThreadPool(8);
        List<Callable<Boolean>> saves = new ArrayList<>();
        for (int i = 0; i < 8; i++) {
            String title = "By " + i;
            saves.add(() -> {
                try {
                    projects.save(titled(opened.project(), title), opened.version(), Saving.by(title, ""));
                    return true;
                } catch (ProjectClashException | OptimisticLockingFailureException clash) {
                    return false;
                }
            });
        }
        int won = 0;
        for (Future<Boolean> save : people.invokeAll(saves)) {
            won += save.get() ? 1 : 0;
        }
        people.shutdown();
        assertThat(won).isEqualTo(1);
        assertThat(projects.history(opened.project().id())).hasSize(2);
    }

    @Test
    void goBackStepByStepAsFarAsTheFirstSave() {
        KeptProject kept = projects.add(fresh("One"), Saving.by("", ""));
        UUID id = kept.project().id();
        kept = projects.save(titled(kept.project(), "Two"), kept.version(), Saving.by("A", ""));
        kept = projects.save(titled(kept.project(), "Three"), kept.version(), Saving.by("A", ""));
        kept = projects.undo(id, kept.version(), "A").orElseThrow();
        assertThat(kept.project().title()).isEqualTo("Two");
        kept = projects.save(titled(kept.project(), "Four"), kept.version(), Saving.by("A", ""));
        kept = projects.undo(id, kept.version(), "A").orElseThrow();
        assertThat(kept.project().title()).isEqualTo("Two");
        kept = projects.undo(id, kept.version(), "A").orElseThrow();
        assertThat(kept.project().title()).isEqualTo("One");
        assertThat(projects.undo(id, kept.version(), "A")).isEmpty();
        assertThat(projects.history(id)).hasSize(7);
    }

    @Test
    void areForgottenWithTheirHistoryWhenDeleted() {
        KeptProject kept = projects.add(fresh("Gone"), Saving.by("", ""));
        projects.delete(kept.project().id(), kept.version());
        assertThat(projects.find(kept.project().id())).isEmpty();
        assertThat(projects.history(kept.project().id())).isEmpty();
    }

    @Test
    void needATitle() {
        assertThatThrownBy(() -> projects.add(fresh(" "), Saving.by("", ""))).hasMessage("A project needs a title");
    }
}
