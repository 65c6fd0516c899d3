package skytally.review;

import com.github.benmanes.caffeine.cache.Cache;
import com.github.benmanes.caffeine.cache.Caffeine;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.UUID;
import org.springframework.stereotype.Component;
import skytally.assessment.Assessment.Topic;
import skytally.assessment.Assessor;
import skytally.assessment.Circumstance;
import skytally.assessment.Circumstance.Cloud;
import skytally.assessment.Circumstance.Moment;
import skytally.atmosphere.Clearness;
import skytally.project.Claim;
import skytally.project.KeptProject;
import skytally.project.Party;
import skytally.project.Project;
import skytally.project.SceneDrawing;
import skytally.project.SceneDrawing.Drawn;
import skytally.project.Scheme;
import skytally.project.Source;
import skytally.project.Stated;
import skytally.scene.Scene;
import skytally.scene.State;

/**
 * Has the schemes of projects assessed, and remembers the last: the same version of a project, scheme, hour and air
 * always has the same answer. The only class that asks the assessor.
 */
@Component
public class Reviews {

    private static final int FIGURES_REMEMBERED = 200_000;
    private static final List<Clearness> FAR_AIRS = List.of(Clearness.VERY_CLEAR, Clearness.CLEAR, Clearness.HAZY);

    private final Cache<Key, Night> remembered = Caffeine.newBuilder()
            .maximumWeight(FIGURES_REMEMBERED)
            .weigher((Key key, Night night) -> night.weight())
            .build();

    private record Key(UUID project, long version, String scheme, Hour hour, Clearness air) {}

    /** A scheme early and late, under one air. */
    public Review of(KeptProject kept, Asked asked) {
        return new Review(
                kept.project(),
                asked,
                night(kept, asked.scheme(), Hour.EARLY, asked),
                night(kept, asked.scheme(), Hour.LATE, asked));
    }

    /** What is there, at the hour asked for; nothing where that is nothing, or is what was asked for. */
    public Optional<Night> present(KeptProject kept, Asked asked) {
        return kept.project().schemes().stream()
                .filter(scheme -> scheme.kind() == Scheme.Kind.EXISTING)
                .filter(scheme -> !scheme.types().isEmpty() && !scheme.equals(asked.scheme()))
                .findFirst()
                .map(scheme -> night(kept, scheme, asked.hour(), asked));
    }

    /** The same scheme and hour in other airs, for a place so far off that the haze decides; none for a near one. */
    public Map<Clearness, Night> otherAirs(KeptProject kept, Review review, String place) {
        boolean far = review.shown()
                .assessment()
                .map(found -> found.notesOf(place).stream().anyMatch(note -> note.topic() == Topic.FAR_SKY))
                .orElse(false);
        Map<Clearness, Night> airs = new EnumMap<>(Clearness.class);
        if (far) {
            for (Clearness air : FAR_AIRS) {
                Asked there = review.asked().in(air, kept.project());
                airs.put(air, night(kept, there.scheme(), there.hour(), there));
            }
        }
        return airs;
    }

    private Night night(KeptProject kept, Scheme scheme, Hour hour, Asked asked) {
        Key key = new Key(kept.project().id(), kept.version(), scheme.mark(), hour, asked.air());
        return remembered.get(key, unknown -> workedOut(kept.project(), scheme, hour, asked));
    }

    private static Night workedOut(Project project, Scheme scheme, Hour hour, Asked asked) {
        Project inAir = asked.asEntered() ? project : inAir(project, asked.air());
        Drawn drawn = SceneDrawing.of(inAir, scheme, hour.period());
        Scene likely = drawn.scene().drawn(Map.of());
        Circumstance circumstance = new Circumstance(hour == Hour.EARLY ? Moment.EARLY : Moment.LATE, Cloud.NONE);
        return new Night(
                likely,
                drawn.leftOut(),
                drawn.unplaced(),
                likely.lamps().isEmpty()
                        ? Optional.empty()
                        : Optional.of(new Assessor(circumstance).assess(drawn.scene())));
    }

    /** The same project with the air of the switch in place of its own. */
    private static Project inAir(Project project, Clearness air) {
        Claim chosen = new Claim(
                air.id(),
                "",
                State.ASSUMED,
                "",
                "",
                Source.reason("chosen by the switch of the page"),
                Party.OURS,
                "",
                "");
        return project.withSite(project.site().with("air", Stated.of(chosen)));
    }
}
