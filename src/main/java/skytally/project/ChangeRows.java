package skytally.project;

import java.util.List;
import java.util.Optional;
import java.util.UUID;
import org.springframework.data.jpa.repository.JpaRepository;
import org.springframework.data.jpa.repository.Query;

interface ChangeRows extends JpaRepository<ChangeRow, Long> {

    List<ChangeRow> findByProjectIdOrderByStepAscIdAsc(UUID projectId);

    @Query("select max(row.step) from ChangeRow row where row.projectId = ?1")
    Optional<Long> lastStep(UUID projectId);
}
