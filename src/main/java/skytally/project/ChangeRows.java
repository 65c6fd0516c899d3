package skytally.project;

import java.time.Instant;
import java.util.Collection;
import java.util.List;
import java.util.Optional;
import java.util.UUID;
import org.jspecify.annotations.Nullable;
import org.springframework.data.domain.Limit;
import org.springframework.data.jpa.repository.JpaRepository;
import org.springframework.data.jpa.repository.Query;

interface ChangeRows extends JpaRepository<ChangeRow, Long> {

    /** What the rows of one step have in common, and how many they are. */
    interface Head {
        long getStep();

        Instant getChangedAt();

        String getWho();

        String getWhy();

        @Nullable
        Long getUndoes();

        long getCount();
    }

    /** A step that was taken back, and the one that took it back. */
    interface TakenBack {
        long getUndone();

        long getBy();
    }

    /** The newest steps before one, the newest first. */
    @Query("""
            select row.step as step, row.changedAt as changedAt, row.who as who, row.why as why, row.undoes as undoes,
              count(row) as count
            from ChangeRow row where row.projectId = ?1 and row.step < ?2
            group by row.step, row.changedAt, row.who, row.why, row.undoes
            order by row.step desc""")
    List<Head> heads(UUID projectId, long before, Limit most);

    @Query("""
            select distinct row.undoes as undone, row.step as by
            from ChangeRow row where row.projectId = ?1 and row.undoes in ?2""")
    List<TakenBack> takenBack(UUID projectId, Collection<Long> steps);

    @Query("select row from ChangeRow row where row.projectId = ?1 and row.step = ?2 order by row.id offset ?3 rows"
            + " fetch first ?4 rows only")
    List<ChangeRow> changes(UUID projectId, long step, int from, int most);

    @Query("select max(row.step) from ChangeRow row where row.projectId = ?1")
    Optional<Long> lastStep(UUID projectId);

    /**
     * The step an undo takes back next: the last that neither takes another back nor was taken back itself. The first,
     * which made the project, stays.
     */
    @Query("""
            select max(row.step) from ChangeRow row
            where row.projectId = ?1 and row.step > 1 and row.undoes is null and not exists
              (select 1 from ChangeRow other where other.projectId = ?1 and other.undoes = row.step)""")
    Optional<Long> lastStanding(UUID projectId);
}
