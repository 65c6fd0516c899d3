package skytally.project;

import java.util.ArrayList;
import java.util.List;

/**
 * A value of a project: every claim made of it, exactly one of them used. Two documents that disagree, a guess
 * overruled and an earlier value are the same thing: several claims.
 *
 * @param claims in the order they were made, at least one
 * @param used   index of the one in use
 */
public record Stated(List<Claim> claims, int used) {

    /** Nothing said, so not known. */
    public static final Stated NOTHING = new Stated(List.of(Claim.NOT_STATED), 0);

    public Stated {
        claims = List.copyOf(claims);
        if (!(used >= 0 && used < claims.size())) {
            throw new IllegalArgumentException("Claim " + used + " of " + claims.size() + " cannot be the one in use");
        }
    }

    public static Stated of(Claim claim) {
        return new Stated(List.of(claim), 0);
    }

    public Claim inUse() {
        return claims.get(used);
    }

    /** The same value with one more claim, which is used from now on. The bare absence of a claim is not kept. */
    public Stated claimed(Claim claim) {
        List<Claim> more = new ArrayList<>(claims);
        more.removeIf(Claim.NOT_STATED::equals);
        more.add(claim);
        return new Stated(more, more.size() - 1);
    }

    /** The same claims, another of them used. */
    public Stated using(int index) {
        return new Stated(claims, index);
    }

    /** Whether claims of the same value say different things. */
    public boolean isDisputed() {
        return claims.stream()
                        .filter(claim -> !claim.value().isEmpty())
                        .map(claim -> claim.value() + " " + claim.unit())
                        .distinct()
                        .count()
                > 1;
    }
}
