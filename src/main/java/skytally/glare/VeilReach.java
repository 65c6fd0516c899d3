package skytally.glare;

import java.util.OptionalDouble;

/** How far around a lamp its veil is brighter than something else, as far as the formula can tell. */
public sealed interface VeilReach {

    /** The angle inside which the veil is the brighter, in degrees, where there is one in the formula's range. */
    OptionalDouble angleDeg();

    /** The veil is the brighter inside this angle and the darker outside it. */
    record Within(double degrees) implements VeilReach {

        public Within {
            if (!(degrees > 0 && degrees <= 180)) {
                throw new IllegalArgumentException("Angle must be more than 0 and at most 180 degrees, not " + degrees);
            }
        }

        @Override
        public OptionalDouble angleDeg() {
            return OptionalDouble.of(degrees);
        }
    }

    /** The veil is the brighter at every angle the formula holds for. */
    record Throughout(AngleRange range) implements VeilReach {

        @Override
        public OptionalDouble angleDeg() {
            return OptionalDouble.empty();
        }
    }

    /** The veil is the darker at every angle the formula holds for. */
    record Nowhere(AngleRange range) implements VeilReach {

        @Override
        public OptionalDouble angleDeg() {
            return OptionalDouble.empty();
        }
    }
}
