package skytally.firstlook;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import java.util.TreeSet;
import skytally.atmosphere.Clearness;
import skytally.luminaire.Shape;
import skytally.luminaire.Shapes;
import skytally.spectrum.SpectralClass;
import skytally.spectrum.SpectralClasses;

/**
 * The sentence filled in: a text for every blank, each in bounds, and which of them were guessed.
 *
 * @param texts   what stands in each blank, numbers in plain notation with a decimal point
 * @param guessed the blanks that were left out
 */
record Sentence(Map<Blank, String> texts, Set<Blank> guessed) {

    Sentence {
        texts = Map.copyOf(texts);
        guessed = Set.copyOf(guessed);
    }

    int count() {
        return number(Blank.COUNT).intValueExact();
    }

    double lumens() {
        return number(Blank.LUMENS).doubleValue();
    }

    SpectralClass spectralClass() {
        return SpectralClasses.byId(text(Blank.SPECTRAL_CLASS)).orElseThrow();
    }

    Shape shape() {
        return Shapes.byId(text(Blank.SHAPE)).orElseThrow();
    }

    double tiltDeg() {
        return number(Blank.TILT).doubleValue();
    }

    double mountingHeightM() {
        return number(Blank.MOUNTING_HEIGHT).doubleValue();
    }

    double eyeHeightM() {
        return number(Blank.EYE_HEIGHT).doubleValue();
    }

    double distanceM() {
        return number(Blank.DISTANCE).doubleValue();
    }

    double glareAngleDeg() {
        return number(Blank.GLARE_ANGLE).doubleValue();
    }

    Clearness air() {
        return Clearness.byId(text(Blank.AIR)).orElseThrow();
    }

    double groundReflectance() {
        return number(Blank.GROUND_REFLECTANCE).doubleValue();
    }

    String text(Blank blank) {
        return Objects.requireNonNull(texts.get(blank));
    }

    BigDecimal number(Blank blank) {
        return new BigDecimal(text(blank));
    }

    boolean isGuess(Blank blank) {
        return guessed.contains(blank);
    }

    /** The guesses it rests on, in the order of the sentence. */
    List<Guess> guesses() {
        List<Guess> guesses = new ArrayList<>();
        for (Blank blank : new TreeSet<>(guessed)) {
            guesses.add(guess(blank));
        }
        return guesses;
    }

    /** A shape that stands upright by its nature is guessed upright, not level. */
    Guess guess(Blank blank) {
        Guess table = Guesses.of(blank);
        double usual = shape().usualTiltDeg();
        if (blank != Blank.TILT || usual == 0) {
            return table;
        }
        String upright = BigDecimal.valueOf(usual).stripTrailingZeros().toPlainString();
        return new Guess(blank, upright, upright, upright, "This kind of fitting stands upright.");
    }

    /** The same sentence with other values in some blanks, which of them are guesses unchanged. */
    Sentence with(Map<Blank, String> others) {
        Map<Blank, String> changed = new EnumMap<>(Blank.class);
        changed.putAll(texts);
        changed.putAll(others);
        return new Sentence(changed, guessed);
    }

    /** The same sentence with every guess at its likely value, once the other blanks are known. */
    Sentence withGuessesSettled() {
        Map<Blank, String> likely = new EnumMap<>(Blank.class);
        guesses().forEach(guess -> likely.put(guess.blank(), guess.likely()));
        return with(likely);
    }

    /** The same sentence with nothing guessed: as if every value had been typed. */
    Sentence settled() {
        return new Sentence(texts, Set.of());
    }
}
