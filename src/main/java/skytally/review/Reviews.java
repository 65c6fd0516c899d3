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
import skytally.assessment.Scope;
import skytally.assessment.Scope.Others;
import skytally.atmosphere.Clearness;
import skytally.project.KeptProject;
import skytally.project.Project;
import skytally.project.SceneDrawing;
import skytally.project.SceneDrawing.Drawn;
import skytally.project.Scheme;
import skytally.scene.Scene;

/**
 * Has the schemes of projects assessed, and remembers the last: the same version of a project, scheme, hour and air
 * always has the same answer. The only class that asks the assessor.
 */
@Component
public class Reviews {

    private static final int FIGURES_REMEMBERED = 200_000;
    private static final long MOST_PAIRS_AT_ONCE = 5_000;
    private static final List<Clearness> FAR_AIRS = List.of(Clearness.VERY_CLEAR, Clearness.CLEAR, Clearness.HAZY);

    private final Cache<Key, Night> remembered = Caffeine.newBuilder()
            .maximumWeight(FIGURES_REMEMBERED)
            .weigher((Key key, Night night) -> night.weight())
            .build();

    private record Key(
            UUID project, long version, String scheme, Hour hour, Clearness air, boolean asEntered, Scope scope) {}

    /**
     * A scheme early and late, under one air, for a page about one place.
     *
     * @param others what the page says of the other places at the hour it shows
     */
    public Review of(KeptProject kept, Asked asked, String place, Others others) {
        Hour shown = asked.hour();
        Night atHour = night(kept, asked.scheme(), shown, asked, Scope.of(place, others));
        Night atOther = night(kept, asked.scheme(), shown.other(), asked, Scope.of(place, Others.NOTHING));
        return shown == Hour.EARLY
                ? new Review(kept.project(), asked, atHour, atOther)
                : new Review(kept.project(), asked, atOther, atHour);
    }

    /** What is there, at the hour asked for; nothing where that is nothing, or is what was asked for. */
    public Optional<Night> present(KeptProject kept, Asked asked, String place) {
        return kept.project().schemes().stream()
                .filter(scheme -> scheme.kind() == Scheme.Kind.EXISTING)
                .filter(scheme -> !scheme.types().isEmpty() && !scheme.equals(asked.scheme()))
                .findFirst()
                .map(scheme -> night(kept, scheme, asked.hour(), asked, Scope.of(place, Others.NOTHING)));
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
                airs.put(air, night(kept, there.scheme(), there.hour(), there, Scope.of(place, Others.NOTHING)));
            }
        }
        return airs;
    }

    private Night night(KeptProject kept, Scheme scheme, Hour hour, Asked asked, Scope scope) {
        Scope worthIt = isSmall(kept.project(), scheme) ? Scope.ALL : scope;
        Key key = new Key(
                kept.project().id(), kept.version(), scheme.mark(), hour, asked.air(), asked.asEntered(), worthIt);
        return remembered.get(key, unknown -> workedOut(kept.project(), scheme, hour, asked, worthIt));
    }

    /** Whether everything is worked out at once, so that every page of the project has it. */
    private static boolean isSmall(Project project, Scheme scheme) {
        long pairs = (long) scheme.placements().size() * project.places().size();
        return pairs <= MOST_PAIRS_AT_ONCE;
    }

    private static Night workedOut(Project project, Scheme scheme, Hour hour, Asked asked, Scope scope) {
        Drawn drawn = SceneDrawing.of(
                project, scheme, hour.period(), asked.asEntered() ? Optional.empty() : Optional.of(asked.air()));
        Scene likely = drawn.scene().drawn(Map.of());
        Circumstance circumstance = new Circumstance(hour == Hour.EARLY ? Moment.EARLY : Moment.LATE, Cloud.NONE);
        return new Night(
                likely,
                drawn.leftOut(),
                drawn.unplaced(),
                drawn.unaimed(),
                likely.allLamps().isEmpty() || likely.observers().isEmpty()
                        ? Optional.empty()
                        : Optional.of(new Assessor(circumstance).assess(drawn.scene(), scope)));
    }
}
