package skytally.project;

import com.github.benmanes.caffeine.cache.Cache;
import com.github.benmanes.caffeine.cache.Caffeine;
import java.nio.charset.StandardCharsets;
import java.time.Clock;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.UUID;
import java.util.stream.Collectors;
import org.springframework.dao.ConcurrencyFailureException;
import org.springframework.dao.DataIntegrityViolationException;
import org.springframework.data.domain.Limit;
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

    private static final int LIGHTS_REMEMBERED = 60_000;

    /** Projects as they were read, which never change: reading twenty thousand lights takes longer than a page may. */
    private final Cache<ReadKey, KeptProject> read = Caffeine.newBuilder()
            .maximumWeight(LIGHTS_REMEMBERED)
            .weigher((ReadKey key, KeptProject kept) -> weight(kept.project()))
            .build();

    private record ReadKey(UUID id, long version, Instant changedAt) {}

    private final ProjectRows rows;
    private final ChangeRows changes;
    private final AttachmentRows attachments;
    private final Clock clock;

    Projects(ProjectRows rows, ChangeRows changes, AttachmentRows attachments) {
        this.rows = rows;
        this.changes = changes;
        this.attachments = attachments;
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
        return rows.findById(id).map(this::kept);
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
                return rows.findById(uuid).map(this::kept).orElseThrow(NoSuchProjectException::new);
            }
        } catch (IllegalArgumentException notOne) {
            // the same to whoever asked: there is no such page
        }
        throw new NoSuchProjectException();
    }

    /** Keeps a new project none of whose documents has a file. */
    @Transactional
    public KeptProject add(Project project, Saving saving) {
        return add(new WholeProject(project, Attachments.NONE), saving);
    }

    /**
     * Keeps a new project with its files.
     *
     * @throws IllegalArgumentException if one with its id is kept already, its title is empty or too long, the bytes of
     *                                  a file are missing, or it would not fit into a project file
     */
    @Transactional
    public KeptProject add(WholeProject whole, Saving saving) {
        Project project = whole.project();
        requireTitle(project);
        if (rows.existsById(project.id())) {
            throw new ProjectClashException();
        }
        ProjectRow row = inserted(new ProjectRow(project.id(), project.title(), text(project), now()));
        keep(whole);
        record(project.id(), Difference.between(Project.named(project.id(), ""), project), saving);
        return kept(row);
    }

    /** Two may add the same at once; whoever comes second is told so. */
    private ProjectRow inserted(ProjectRow row) {
        try {
            return rows.saveAndFlush(row);
        } catch (DataIntegrityViolationException | ConcurrencyFailureException keptByAnother) {
            throw new ProjectClashException();
        }
    }

    /** Saves a project all of whose files are kept already. */
    @Transactional
    public KeptProject save(Project project, long openedAt, Saving saving) {
        return save(new WholeProject(project, Attachments.NONE), openedAt, saving);
    }

    /**
     * Saves a project over the version it was opened at.
     *
     * @param whole    with the bytes of those of its files that are new
     * @param openedAt the version its editor started from
     * @throws ProjectClashException    if it has been saved since; nothing is changed then
     * @throws IllegalArgumentException if the bytes of a file are missing, or it would not fit into a project file
     */
    @Transactional
    public KeptProject save(WholeProject whole, long openedAt, Saving saving) {
        Project project = whole.project();
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
        keep(whole);
        record(project.id(), made, saving);
        return kept(rows.saveAndFlush(row));
    }

    /** A kept project with the bytes of its files. */
    @Transactional(readOnly = true)
    public WholeProject whole(Project project) {
        Attachments files = Attachments.NONE;
        for (String hash : Attachments.namedBy(project).toList()) {
            files = files.with(bytes(project.id(), hash)
                    .orElseThrow(() -> new IllegalStateException(
                            "Project " + project.id() + " is not kept whole: a file is missing, " + hash)));
        }
        return new WholeProject(project, files);
    }

    /** The bytes of one file of a kept project. */
    @Transactional(readOnly = true)
    public Optional<byte[]> bytes(UUID id, String sha256) {
        return attachments.findById(new AttachmentRow.Key(id, sha256)).map(AttachmentRow::content);
    }

    /**
     * A page of what was ever saved of a project, the newest first.
     *
     * @param before  only steps with a lower number
     * @param steps   as many steps at most
     * @param changes as many changes of each at most
     */
    @Transactional(readOnly = true)
    public List<Step> history(UUID id, long before, int steps, int changes) {
        return steps(id, this.changes.heads(id, before, Limit.of(steps)), 0, changes);
    }

    /** One step with a stretch of its changes, or nothing where there was none. */
    @Transactional(readOnly = true)
    public Optional<Step> step(UUID id, long number, int from, int most) {
        List<ChangeRows.Head> found = changes.heads(id, number + 1, Limit.of(1)).stream()
                .filter(head -> head.getStep() == number)
                .toList();
        return steps(id, found, from, most).stream().findFirst();
    }

    private List<Step> steps(UUID id, List<ChangeRows.Head> heads, int from, int most) {
        List<Long> numbers = heads.stream().map(ChangeRows.Head::getStep).toList();
        Map<Long, Long> takenBack = changes.takenBack(id, numbers).stream()
                .collect(Collectors.toMap(ChangeRows.TakenBack::getUndone, ChangeRows.TakenBack::getBy));
        return heads.stream()
                .map(head -> new Step(
                        head.getStep(),
                        head.getChangedAt(),
                        head.getWho(),
                        head.getWhy(),
                        head.getUndoes(),
                        takenBack.get(head.getStep()),
                        head.getCount(),
                        changesOf(id, head.getStep(), from, most)))
                .toList();
    }

    private List<Difference.Change> changesOf(UUID id, long step, int from, int most) {
        return changes.changes(id, step, from, most).stream()
                .map(ChangeRow::change)
                .toList();
    }

    /**
     * The step that {@link #undo} takes back next, or nothing. It is the last that neither takes another back nor was
     * taken back itself; the first, which made the project, stays.
     */
    @Transactional(readOnly = true)
    public Optional<Long> lastStanding(UUID id) {
        return changes.lastStanding(id);
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
        Optional<Long> last = changes.lastStanding(id);
        if (last.isEmpty()) {
            return Optional.empty();
        }
        long step = last.get();
        List<Difference.Change> back = changesOf(id, step, 0, Integer.MAX_VALUE).stream()
                .map(Difference.Change::reversed)
                .toList();
        try {
            Project before = Difference.applied(kept(row).project(), back);
            return Optional.of(save(before, openedAt, new Saving(who, "Undo", step)));
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

    private void keep(WholeProject whole) {
        UUID id = whole.project().id();
        for (String hash : Attachments.namedBy(whole.project()).toList()) {
            if (!attachments.existsById(new AttachmentRow.Key(id, hash))) {
                byte[] content = whole.attachments()
                        .bytes(hash)
                        .orElseThrow(() -> new IllegalArgumentException("The bytes of a file are missing: " + hash));
                attachments.save(new AttachmentRow(id, hash, content));
            }
        }
    }

    private void record(UUID id, List<Difference.Change> made, Saving saving) {
        long step = changes.lastStep(id).orElse(0L) + 1;
        Instant at = now();
        changes.saveAll(made.stream()
                .map(change -> new ChangeRow(id, step, at, saving, change))
                .toList());
    }

    private KeptProject kept(ProjectRow row) {
        return read.get(new ReadKey(row.id(), row.version(), row.changedAt()), key -> readAnew(row));
    }

    /** Rough size in memory, counted in lights. */
    private static int weight(Project project) {
        return 100
                + project.schemes().stream()
                        .mapToInt(scheme ->
                                20 * scheme.types().size() + scheme.placements().size())
                        .sum();
    }

    private static KeptProject readAnew(ProjectRow row) {
        try {
            String text = row.document();
            Project project = ProjectFile.read(text.getBytes(StandardCharsets.UTF_8));
            return new KeptProject(project, row.version(), row.changedAt());
        } catch (ProjectFileException broken) {
            throw new IllegalStateException("Project " + row.id() + " is not kept whole", broken);
        }
    }

    /** The text of its row, if it and its files would fit into a project file. */
    private static String text(Project project) {
        byte[] text = ProjectFile.write(project);
        if (ProjectFile.size(project, text) > ProjectFile.LARGEST_BYTES) {
            throw new ProjectTooLargeException();
        }
        return new String(text, StandardCharsets.UTF_8);
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
