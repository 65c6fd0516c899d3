package skytally.firstlook;

import com.github.benmanes.caffeine.cache.Cache;
import com.github.benmanes.caffeine.cache.Caffeine;
import java.math.BigDecimal;
import java.util.Map;
import org.springframework.stereotype.Component;
import skytally.assessment.Assessor;

/** Works out answers, and remembers the last few: the same sentence always has the same answer. */
@Component
class Answers {

    /** The tilt that is shown beside lights as described: what a bracket set carelessly does. */
    static final double CARELESS_TILT_DEG = 15;

    private static final int REMEMBERED = 200;

    private final Assessor assessor;
    private final Cache<Sentence, Answer> remembered =
            Caffeine.newBuilder().maximumSize(REMEMBERED).build();

    Answers(Assessor assessor) {
        this.assessor = assessor;
    }

    Answer to(Sentence sentence) {
        return remembered.get(sentence, this::workedOut);
    }

    private Answer workedOut(Sentence sentence) {
        double usual = sentence.shape().usualTiltDeg();
        double other = sentence.tiltDeg() == usual ? tilted(usual) : usual;
        Sentence otherWay = sentence.with(Map.of(Blank.TILT, plain(other))).settled();
        return new Answer(
                sentence,
                assessor.assess(new SentenceScene(sentence)),
                other,
                assessor.assess(new SentenceScene(otherWay)));
    }

    private static double tilted(double usual) {
        return usual + CARELESS_TILT_DEG;
    }

    private static String plain(double degrees) {
        return BigDecimal.valueOf(degrees).stripTrailingZeros().toPlainString();
    }
}
