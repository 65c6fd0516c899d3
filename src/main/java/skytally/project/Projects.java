package skytally.project;

import java.nio.charset.StandardCharsets;
import java.time.Clock;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.UUID;
import org.springframework.stereotype.Component;
import org.springframework.transaction.annotation.Transactional;
import skytally.project.transfer.Difference;
import skytally.project.transfer.ProjectFile;
import skytally.project.transfer.ProjectFileException;

/** All projects kept here. Every save is one transaction with the record of what it changed. */
@Component
public class Projects {

    /** A line of the list of projects. */
    public record Listed(UUID id, String title, Instant changedAt) {}

    /** Characters of a title. */
    public static final int LONGEST_TITLE = 400;

    private final ProjectRows rows;
    private final ChangeRows changes;
    private final Clock clock;

    Projects(ProjectRows rows, ChangeRows changes) {
        this.rows = rows;
        this.changes = changes;
        this.clock = Clock.systemUTC();
    }

    /** The last changed first. */
    @Transactional(readOnly = true)
    public List<Listed> list() {
        return rows.listed().stream()
                .map(row -> new Listed(row.getId(), row.getTitle(), row.getChangedAt()))
                .toList();
    }

    @Transactional(readOnly = true)
    public Optional<KeptProject> find(UUID id) {
        return rows.findById(id).map(Projects::kept);
    }

    /**
     * The project at an address.
     *
     * @param id as written in the address
     * @throws NoSuchProjectException if it is no id, or none is kept under it
     */
    @Transactional(readOnly = true)
    public KeptProject require(String id) {
        try {
            UUID uuid = UUID.fromString(id);
            if (uuid.toString().equals(id)) {
                return rows.findById(uuid).map(Projects::kept).orElseThrow(NoSuchProjectException::new);
            }
        } catch (IllegalArgumentException notOne) {
            // the same to whoever asked: there is no such page
        }
        throw new NoSuchProjectException();
    }

    /**
     * Keeps a new project.
     *
     * @throws IllegalArgumentException if one with its id is kept already, or its title is empty or too long
     */
    @Transactional
    public KeptProject add(Project project, Saving saving) {
        requireTitle(project);
        if (rows.existsById(project.id())) {
            throw new IllegalArgumentException("A project with this id is kept already");
        }
        ProjectRow row = rows.saveAndFlush(new ProjectRow(project.id(), project.title(), text(project), now()));
        record(project.id(), Difference.between(Project.named(project.id(), ""), project), saving);
        return kept(row);
    }

    /**
     * Saves a project over the version it was opened at.
     *
     * @param openedAt the version its editor started from
     * @throws ProjectClashException if it has been saved since; nothing is changed then
     */
    @Transactional
    public KeptProject save(Project project, long openedAt, Saving saving) {
        requireTitle(project);
        ProjectRow row = rows.findById(project.id()).orElseThrow(ProjectClashException::new);
        if (row.version() != openedAt) {
            throw new ProjectClashException();
        }
        List<Difference.Change> made = Difference.between(kept(row).project(), project);
        if (made.isEmpty()) {
            return kept(row);
        }
        row.replace(project.title(), text(project), now());
        record(project.id(), made, saving);
        return kept(rows.saveAndFlush(row));
    }

    /** Everything that was ever saved of a project, the first save first. */
    @Transactional(readOnly = true)
    public List<Step> history(UUID id) {
        Map<Long, List<ChangeRow>> bySteps = new LinkedHashMap<>();
        for (ChangeRow row : changes.findByProjectIdOrderByStepAscIdAsc(id)) {
            bySteps.computeIfAbsent(row.step(), step -> new ArrayList<>()).add(row);
        }
        return bySteps.values().stream().map(Projects::step).toList();
    }

    /** How many saves there were of a project. */
    @Transactional(readOnly = true)
    public long countSteps(UUID id) {
        return changes.lastStep(id).orElse(0L);
    }

    /**
     * Takes back the last save that has not been taken back yet; again takes back the one before. The taking back is a
     * save of its own, so nothing is forgotten. The first save, which made the project, stays.
     *
     * @return the project as it is then, or nothing if there was nothing to take back
     * @throws ProjectClashException if it has been saved since it was opened
     */
    @Transactional
    public Optional<KeptProject> undo(UUID id, long openedAt, String who) {
        ProjectRow row = rows.findById(id).orElseThrow(ProjectClashException::new);
        if (row.version() != openedAt) {
            throw new ProjectClashException();
        }
        Optional<Step> last = Step.lastStanding(history(id));
        if (last.isEmpty()) {
            return Optional.empty();
        }
        Step step = last.get();
        List<Difference.Change> back =
                step.changes().stream().map(Difference.Change::reversed).toList();
        try {
            Project before = Difference.applied(kept(row).project(), back);
            return Optional.of(save(before, openedAt, new Saving(who, "Undo", step.number())));
        } catch (ProjectFileException cannot) {
            throw new IllegalStateException("The history of project " + id + " does not fit it", cannot);
        }
    }

    /**
     * Lets go of a project and its whole history.
     *
     * @throws ProjectClashException if it has been saved since it was opened
     */
    @Transactional
    public void delete(UUID id, long openedAt) {
        ProjectRow row = rows.findById(id).orElseThrow(ProjectClashException::new);
        if (row.version() != openedAt) {
            throw new ProjectClashException();
        }
        rows.delete(row);
    }

    private void record(UUID id, List<Difference.Change> made, Saving saving) {
        long step = changes.lastStep(id).orElse(0L) + 1;
        Instant at = now();
        changes.saveAll(made.stream()
                .map(change -> new ChangeRow(id, step, at, saving, change))
                .toList());
    }

    private static Step step(List<ChangeRow> rows) {
        ChangeRow first = rows.get(0);
        return new Step(
                first.step(),
                first.changedAt(),
                first.who(),
                first.why(),
                first.undoes(),
                rows.stream().map(ChangeRow::change).toList());
    }

    private static KeptProject kept(ProjectRow row) {
        try {
            Project project = ProjectFile.read(row.document().getBytes(StandardCharsets.UTF_8));
            return new KeptProject(project, row.version(), row.changedAt());
        } catch (ProjectFileException broken) {
            throw new IllegalStateException("Project " + row.id() + " is not kept whole", broken);
        }
    }

    private static String text(Project project) {
        return new String(ProjectFile.write(project), StandardCharsets.UTF_8);
    }

    private static void requireTitle(Project project) {
        if (project.title().isBlank()) {
            throw new IllegalArgumentException("A project needs a title");
        }
        Bounds.require(project.title().length(), LONGEST_TITLE, "characters of a title");
    }

    private Instant now() {
        return clock.instant().truncatedTo(ChronoUnit.MICROS);
    }
}
