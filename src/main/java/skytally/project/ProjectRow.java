package skytally.project;

import jakarta.persistence.Column;
import jakarta.persistence.Entity;
import jakarta.persistence.Id;
import jakarta.persistence.Lob;
import jakarta.persistence.Table;
import jakarta.persistence.Version;
import java.time.Instant;
import java.util.UUID;

/** A project as it is kept: its file's text, and a version that every save moves on. */
@Entity
@Table(name = "project")
class ProjectRow {

    @Id
    private UUID id;

    @Version
    private Long version;

    private String title;

    @Lob
    private String document;

    @Column(name = "changed_at")
    private Instant changedAt;

    @SuppressWarnings("NullAway") // filled by the database
    protected ProjectRow() {}

    @SuppressWarnings("NullAway") // the version is the database's
    ProjectRow(UUID id, String title, String document, Instant changedAt) {
        this.id = id;
        this.title = title;
        this.document = document;
        this.changedAt = changedAt;
    }

    UUID id() {
        return id;
    }

    long version() {
        return version;
    }

    String title() {
        return title;
    }

    String document() {
        return document;
    }

    Instant changedAt() {
        return changedAt;
    }

    void replace(String title, String document, Instant changedAt) {
        this.title = title;
        this.document = document;
        this.changedAt = changedAt;
    }
}
