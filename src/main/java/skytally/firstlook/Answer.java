package skytally.firstlook;

import java.util.Map;
import skytally.assessment.Assessment;
import skytally.assessment.Figure;
import skytally.atmosphere.Clearness;

/**
 * What a sentence gives, and the same lights hung another way beside it.
 *
 * @param sentence   what was asked
 * @param assessment its numbers
 * @param otherTilt  the tilt of the other way, in degrees
 * @param other      the numbers of the other way
 * @param airs       sky glow overhead in other airs, for a far place; none for a near one
 */
record Answer(
        Sentence sentence, Assessment assessment, double otherTilt, Assessment other, Map<Clearness, Figure> airs) {

    Answer {
        airs = Map.copyOf(airs);
    }

    /** A figure of the one place, such as {@code direct/illuminance}. */
    Figure figure(String measure) {
        return assessment.figure(SentenceScene.HERE, measure);
    }

    Figure otherFigure(String measure) {
        return other.figure(SentenceScene.HERE, measure);
    }
}
