package skytally.assessment;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/**
 * What each type causes of one number at one place, as amounts and as shares of the whole.
 *
 * @param all    in the order of the scene
 * @param total  of them, in the unit of the number; 0 where there is none
 */
public record Shares(List<Share> all, double total) {

    /**
     * One type's part.
     *
     * @param type    its mark
     * @param amount  in the unit of the number
     * @param percent of the total; 0 where the total is
     */
    public record Share(String type, double amount, double percent) {}

    public Shares {
        all = List.copyOf(all);
    }

    /**
     * The shares at one place.
     *
     * @param harm which number of a contribution
     */
    public static Shares of(Assessment assessment, String place, ToDoubleFunction<Contribution> harm) {
        List<Contribution> here = assessment.contributions().stream()
                .filter(each -> each.place().equals(place))
                .toList();
        double total =
                here.stream().mapToDouble(harm).filter(amount -> amount > 0).sum();
        List<Share> shares = new ArrayList<>();
        for (Contribution each : here) {
            double amount = Math.max(0, harm.applyAsDouble(each)); // not a number where there is nothing to say
            double known = Double.isNaN(amount) ? 0 : amount;
            shares.add(new Share(each.type(), known, total > 0 ? 100 * known / total : 0));
        }
        return new Shares(shares, total);
    }

    /** Those that cause anything, the most first. */
    public List<Share> ranked() {
        return all.stream()
                .filter(share -> share.amount() > 0)
                .sorted(Comparator.comparingDouble(Share::amount).reversed())
                .toList();
    }

    /** The part of one type; nothing where it causes nothing. */
    public Optional<Share> of(String type) {
        return all.stream()
                .filter(share -> share.type().equals(type) && share.amount() > 0)
                .findFirst();
    }

    /** The parts of several types as one; nothing where they cause nothing. */
    public Optional<Share> together(String name, List<String> types) {
        List<Share> some = types.stream().flatMap(type -> of(type).stream()).toList();
        return some.isEmpty()
                ? Optional.empty()
                : Optional.of(new Share(
                        name,
                        some.stream().mapToDouble(Share::amount).sum(),
                        some.stream().mapToDouble(Share::percent).sum()));
    }
}
