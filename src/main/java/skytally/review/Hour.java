package skytally.review;

import java.util.Locale;
import skytally.project.SceneDrawing.Period;
import skytally.web.Switches.Choice;

/** Before the curfew or after it. */
public enum Hour implements Choice {
    EARLY(Period.EARLY),
    LATE(Period.LATE);

    private final Period period;

    Hour(Period period) {
        this.period = period;
    }

    Period period() {
        return period;
    }

    @Override
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }

    /** The word that begins a sentence. */
    public String capital() {
        return this == EARLY ? "Early" : "Late";
    }

    public Hour other() {
        return this == EARLY ? LATE : EARLY;
    }
}
