package skytally.project;

import jakarta.persistence.Column;
import jakarta.persistence.Entity;
import jakarta.persistence.Id;
import jakarta.persistence.IdClass;
import jakarta.persistence.Lob;
import jakarta.persistence.Table;
import java.io.Serializable;
import java.util.UUID;

/** The bytes of one file of one project. Rows are added and never altered; they go with their project. */
@Entity
@Table(name = "project_attachment")
@IdClass(AttachmentRow.Key.class)
class AttachmentRow {

    /** What a row is found by. */
    record Key(UUID projectId, String sha256) implements Serializable {}

    @Id
    @Column(name = "project_id")
    private UUID projectId;

    @Id
    private String sha256;

    @Lob
    private byte[] content;

    @SuppressWarnings("NullAway") // filled by the database
    protected AttachmentRow() {}

    AttachmentRow(UUID projectId, String sha256, byte[] content) {
        this.projectId = projectId;
        this.sha256 = sha256;
        this.content = content;
    }

    byte[] content() {
        return content;
    }
}
