package skytally.project;

import org.springframework.data.jpa.repository.JpaRepository;

interface AttachmentRows extends JpaRepository<AttachmentRow, AttachmentRow.Key> {}
