package skytally.scene;

import java.util.List;
import java.util.OptionalDouble;

/**
 * The sky as it is, before what the scene shows.
 *
 * @param lamps            that shine now, whether or not they stay
 * @param zenithMagArcsec2 brightness overhead as read there, or nothing where nobody read it
 */
public record Present(List<Lamp> lamps, OptionalDouble zenithMagArcsec2) {

    public Present {
        lamps = List.copyOf(lamps);
    }
}
