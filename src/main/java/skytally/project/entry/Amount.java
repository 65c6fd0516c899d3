package skytally.project.entry;

import java.math.BigDecimal;
import java.util.Optional;
import skytally.notation.NumberReader;
import skytally.project.Claim;
import skytally.project.Units;

/** A typed number in the first unit of its kind. */
public final class Amount {

    private Amount() {}

    /** Nothing where the claim has no number that can be read. */
    public static Optional<BigDecimal> of(Claim claim) {
        return NumberReader.read(claim.value(), false) instanceof NumberReader.Number number
                ? Optional.of(Units.inFirst(number.value(), claim.unit()))
                : Optional.empty();
    }
}
