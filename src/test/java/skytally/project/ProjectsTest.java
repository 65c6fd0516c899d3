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
        assertThat(Cases.history(projects, project.id())).hasSize(1).first().satisfies(step -> {
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
        assertThat(Cases.history(projects, opened.project().id())).hasSize(2);
    }

    @Test
    void letOneOfManyAtOnceBeTheFirst() throws Exception {
        Project project = fresh("Eight at once");
        ExecutorService people = Executors.newFixedThreadPool(8);
        List<Callable<Boolean>> adds = new ArrayList<>();
        for (int i = 0; i < 8; i++) {
            adds.add(() -> {
                try {
                    projects.add(project, Saving.by("", ""));
                    return true;
                } catch (ProjectClashException keptAlready) {
                    return false;
                }
            });
        }
        int won = 0;
        for (Future<Boolean> add : people.invokeAll(adds)) {
            won += add.get() ? 1 : 0;
        }
        people.shutdown();
        assertThat(won).isEqualTo(1);
        assertThat(projects.countSteps(project.id())).isEqualTo(1);
    }

    @Test
    void tellTheirHistoryInPagesAndEachStepInStretches() {
        KeptProject kept = projects.add(fresh("1"), Saving.by("", ""));
        UUID id = kept.project().id();
        for (int i = 2; i <= 5; i++) {
            kept = projects.save(titled(kept.project(), String.valueOf(i)), kept.version(), Saving.by("A", "why " + i));
        }
        projects.undo(id, kept.version(), "B");

        List<Step> newest = projects.history(id, Long.MAX_VALUE, 3, 1);
        assertThat(newest).extracting(Step::number).containsExactly(6L, 5L, 4L);
        assertThat(newest).extracting(Step::undoes).containsExactly(5L, null, null);
        assertThat(newest).extracting(Step::takenBackBy).containsExactly(null, 6L, null);
        assertThat(newest.get(1).why()).isEqualTo("why 5");
        assertThat(projects.history(id, 4, 3, 1)).extracting(Step::number).containsExactly(3L, 2L, 1L);
        assertThat(projects.lastStanding(id)).hasValue(4L);

        Step first = projects.step(id, 1, 0, Integer.MAX_VALUE).orElseThrow();
        assertThat(first.count()).isEqualTo(first.changes().size()).isGreaterThan(10);
        assertThat(projects.step(id, 1, 3, 4).orElseThrow().changes())
                .isEqualTo(first.changes().subList(3, 7));
        assertThat(projects.step(id, 7, 0, 1)).isEmpty();
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
        assertThat(Cases.history(projects, id)).hasSize(7);
    }

    @Test
    void areForgottenWithTheirHistoryWhenDeleted() {
        KeptProject kept = projects.add(fresh("Gone"), Saving.by("", ""));
        projects.delete(kept.project().id(), kept.version());
        assertThat(projects.find(kept.project().id())).isEmpty();
        assertThat(Cases.history(projects, kept.project().id())).isEmpty();
    }

    @Test
    void needATitle() {
        assertThatThrownBy(() -> projects.add(fresh(" "), Saving.by("", ""))).hasMessage("A project needs a title");
    }
}
