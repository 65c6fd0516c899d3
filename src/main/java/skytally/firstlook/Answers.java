package skytally.firstlook;

import com.github.benmanes.caffeine.cache.Cache;
import com.github.benmanes.caffeine.cache.Caffeine;
import java.math.BigDecimal;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import org.springframework.stereotype.Component;
import skytally.assessment.Assessment;
import skytally.assessment.Assessor;
import skytally.assessment.Figure;
import skytally.atmosphere.Clearness;

/** Works out answers, and remembers the last few: the same sentence always has the same answer. */
@Component
class Answers {

    /** The tilt that is shown beside lights as described: what a bracket set carelessly does. */
    static final double CARELESS_TILT_DEG = 15;

    private static final int REMEMBERED = 200;
    private static final double FAR_M = 10_000;

    private final Assessor assessor;
    private final Cache<Sentence, Answer> remembered =
            Caffeine.newBuilder().maximumSize(REMEMBERED).build();

    Answers(Assessor assessor) {
        this.assessor = assessor;
    }

    Answer to(Sentence sentence) {
        return remembered.get(sentence, this::workedOut);
    }

    /** A far result is shown in other airs beside its own: the haze decides it. */
    private Map<Clearness, Figure> otherAirs(Sentence sentence) {
        Map<Clearness, Figure> airs = new EnumMap<>(Clearness.class);
        if (sentence.distanceM() > FAR_M) {
            for (Clearness air : List.of(Clearness.VERY_CLEAR, Clearness.CLEAR, Clearness.HAZY)) {
                Sentence there = sentence.with(Map.of(Blank.AIR, air.id())).settled();
                Assessment assessment = assessor.assess(new SentenceScene(there));
                airs.put(air, assessment.figure(SentenceScene.HERE, "zenith/sky/increase"));
            }
        }
        return airs;
    }

    private Answer workedOut(Sentence sentence) {
        double usual = sentence.shape().usualTiltDeg();
        double other = sentence.tiltDeg() == usual ? tilted(usual) : usual;
        Sentence otherWay = sentence.with(Map.of(Blank.TILT, plain(other))).settled();
        return new Answer(
                sentence,
                assessor.assess(new SentenceScene(sentence)),
                other,
                assessor.assess(new SentenceScene(otherWay)),
                otherAirs(sentence));
    }

    private static double tilted(double usual) {
        return usual + CARELESS_TILT_DEG;
    }

    static String plain(double degrees) {
        return BigDecimal.valueOf(degrees).stripTrailingZeros().toPlainString();
    }
}
