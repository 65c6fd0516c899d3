package skytally.project;

import java.time.Instant;
import java.util.List;
import java.util.UUID;
import org.springframework.data.jpa.repository.JpaRepository;
import org.springframework.data.jpa.repository.Query;

interface ProjectRows extends JpaRepository<ProjectRow, UUID> {

    /** What a list of projects shows, without the projects themselves. */
    @Query("select row.id as id, row.title as title, row.changedAt as changedAt from ProjectRow row"
            + " order by row.changedAt desc")
    List<Listed> listed();

    /** A line of the list. */
    interface Listed {
        UUID getId();

        String getTitle();

        Instant getChangedAt();
    }
}
