package skytally.eye;

import skytally.citation.Citation;
import skytally.photometry.Illuminance;
import skytally.photometry.Magnitude;
import skytally.photometry.ZeroPoint;

/**
 * A light of nature that people know, as a rung to compare with.
 *
 * @param id       its name for machines, such as {@code full-moon}
 * @param name     its name for people, as a label
 * @param said     the same within a sentence
 * @param kind     where its light is taken
 * @param light    how bright
 * @param citation where that came from
 */
public record NaturalAnchor(String id, String name, String said, Kind kind, Light light, Citation citation) {

    /** Where the light is taken. */
    public enum Kind {
        /** A point or small disc in the sky: at the eye, facing it. */
        POINT("at the eye, facing it"),
        /** The whole sky: on open level ground, not comparable with one lamp in view. */
        GROUND("on level ground");

        private final String words;

        Kind(String words) {
            this.words = words;
        }

        public String words() {
            return words;
        }
    }

    /** How bright an anchor is. */
    public sealed interface Light {

        /** In lux, reckoned with a zero point where the light is known as a magnitude. */
        Illuminance illuminance(ZeroPoint zeroPoint);
    }

    /**
     * A magnitude above the air, seen through it with {@link EquivalentStar#OVERHEAD_KV}.
     *
     * @param altitudeDeg above the horizon
     * @param airMass     there, by Kasten and Young; 1 overhead
     */
    public record ThroughAir(Magnitude magnitude, double altitudeDeg, double airMass) implements Light {

        public ThroughAir {
            if (!(altitudeDeg > 0 && altitudeDeg <= 90)) {
                throw new IllegalArgumentException(
                        "Altitude must be more than 0 and at most 90 degrees, not " + altitudeDeg);
            }
        }

        @Override
        public Illuminance illuminance(ZeroPoint zeroPoint) {
            return EquivalentStar.atEye(magnitude, zeroPoint, EquivalentStar.OVERHEAD_KV, airMass);
        }
    }

    /** Known in lux; no zero point changes it. */
    public record InLux(Illuminance illuminance) implements Light {

        @Override
        public Illuminance illuminance(ZeroPoint zeroPoint) {
            return illuminance;
        }
    }

    public Illuminance illuminance(ZeroPoint zeroPoint) {
        return light.illuminance(zeroPoint);
    }
}
