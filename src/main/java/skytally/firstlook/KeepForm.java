package skytally.firstlook;

import java.util.Arrays;
import java.util.List;

/**
 * The form that keeps a first look as a project.
 *
 * @param title  to begin with, or as typed
 * @param blanks what was typed in the sentence, to be sent along
 */
record KeepForm(String title, List<SentenceForm.Option> blanks) {

    static KeepForm of(Sentence sentence, String title) {
        return new KeepForm(
                title,
                Arrays.stream(Blank.values())
                        .filter(blank -> !sentence.isGuess(blank))
                        .map(blank -> new SentenceForm.Option(blank.field(), sentence.text(blank)))
                        .toList());
    }
}
