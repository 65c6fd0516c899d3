package skytally.firstlook;

import skytally.assessment.Assessment;
import skytally.assessment.Figure;

/**
 * What a sentence gives, and the same lights hung another way beside it.
 *
 * @param sentence   what was asked
 * @param assessment its numbers
 * @param otherTilt  the tilt of the other way, in degrees
 * @param other      the numbers of the other way
 */
record Answer(Sentence sentence, Assessment assessment, double otherTilt, Assessment other) {

    /** A figure of the one place, such as {@code direct/illuminance}. */
    Figure figure(String measure) {
        return assessment.figure(SentenceScene.HERE, measure);
    }

    Figure otherFigure(String measure) {
        return other.figure(SentenceScene.HERE, measure);
    }
}
