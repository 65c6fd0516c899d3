package skytally.review.seen;

import java.util.Locale;
import java.util.function.ToDoubleFunction;
import skytally.assessment.Contribution;
import skytally.figures.Quantity;
import skytally.web.Switches.Choice;
import skytally.web.Switches.Units;

/** The four ways in which light is a harm, never one standing for another. */
enum Harm implements Choice {
    DIRECT("direct/illuminance", "light seen directly", Contribution::illuminanceLx),
    SURFACE("direct/window-illuminance", "light on the window or wall", Contribution::windowLx),
    GLARE("beside/glare/veil", "glare", Contribution::veilCdM2),
    GLOW("zenith/sky/artificial", "sky glow overhead", Contribution::skyZenithCdM2);

    private final String measure;
    private final String words;
    private final ToDoubleFunction<Contribution> amount;

    Harm(String measure, String words, ToDoubleFunction<Contribution> amount) {
        this.measure = measure;
        this.words = words;
        this.amount = amount;
    }

    /** The figure whose parts it shows. */
    String measure() {
        return measure;
    }

    String words() {
        return words;
    }

    ToDoubleFunction<Contribution> amount() {
        return amount;
    }

    Quantity written(double value, Units units) {
        return this == DIRECT || this == SURFACE ? Quantity.light(value, 2, units) : Quantity.luminance(value, 2);
    }

    @Override
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }
}
