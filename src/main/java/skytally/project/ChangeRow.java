package skytally.project;

import jakarta.persistence.Column;
import jakarta.persistence.Entity;
import jakarta.persistence.GeneratedValue;
import jakarta.persistence.GenerationType;
import jakarta.persistence.Id;
import jakarta.persistence.Lob;
import jakarta.persistence.SequenceGenerator;
import jakarta.persistence.Table;
import java.time.Instant;
import java.util.UUID;
import org.jspecify.annotations.Nullable;
import skytally.project.transfer.Difference;

/** One key that one save changed. Rows are added and never altered. */
@Entity
@Table(name = "project_change")
class ChangeRow {

    @Id
    @GeneratedValue(strategy = GenerationType.SEQUENCE, generator = "project_change_id")
    @SequenceGenerator(name = "project_change_id", sequenceName = "project_change_id", allocationSize = 500)
    private Long id;

    @Column(name = "project_id")
    private UUID projectId;

    private long step;

    @Column(name = "changed_at")
    private Instant changedAt;

    private String who;

    private String why;

    private @Nullable Long undoes;

    @Column(name = "change_key")
    private String key;

    @Lob
    @Column(name = "text_before")
    private @Nullable String before;

    @Lob
    @Column(name = "text_after")
    private @Nullable String after;

    @SuppressWarnings("NullAway") // filled by the database
    protected ChangeRow() {}

    @SuppressWarnings("NullAway") // the id is the database's
    ChangeRow(UUID projectId, long step, Instant changedAt, Saving saving, Difference.Change change) {
        this.projectId = projectId;
        this.step = step;
        this.changedAt = changedAt;
        this.who = saving.who();
        this.why = saving.why();
        this.undoes = saving.undoes();
        this.key = change.key();
        this.before = change.before();
        this.after = change.after();
    }

    Difference.Change change() {
        return new Difference.Change(key, before, after);
    }
}
