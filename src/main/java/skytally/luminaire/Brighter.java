package skytally.luminaire;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import skytally.notation.QuantityFormat;

/**
 * A shape of which two things are said that cannot both be true: what it is, and how much of its light goes above the
 * level. In each direction it takes the greater of the shape as it is and the shape blended with an all-round source in
 * the proportion that makes the stated share, so that every place is told the brighter of the two.
 * <pre>
 *   i = max[ i₀, (1 − p) i₀ + p / 4π ] = i₀ + p · max(0, 1/4π − i₀)
 * </pre>
 * It is an upper envelope of the two, not a third fitting: over the whole sphere it holds more than one lumen a lumen, by
 * p times what the plain shape falls short of an all-round source, and never as much as p more. No place sees all of it
 * at once. What is said of the flux as a whole ({@link FluxShare}) is the greater of the two and never their sum.
 */
final class Brighter implements IntensityDistribution {

    private static final double ALL_ROUND = 1 / (4 * Math.PI);
    private static final double LOOK_EVERY_RAD = StrictMath.toRadians(0.25);
    private static final double SAME_RAD = 1e-9;

    private final IntensityDistribution plain;
    private final double allRound;
    private final double[] breaksRad;

    /**
     * @param plain    i₀, the shape as it is
     * @param allRound p, the part of the light that the blend sends to all sides alike, over 0 to 1
     */
    Brighter(IntensityDistribution plain, double allRound) {
        if (!(allRound > 0 && allRound <= 1)) {
            throw new IllegalArgumentException("The all-round part must be over 0 to 1, not " + allRound);
        }
        this.plain = plain;
        this.allRound = allRound;
        this.breaksRad = breaks();
    }

    @Override
    public double perLumen(double x, double y, double z) {
        double own = plain.perLumen(x, y, z);
        return own + allRound * Math.max(0, ALL_ROUND - own);
    }

    @Override
    public List<IntensityDistribution> readings() {
        return List.of(plain, new Blended(plain, allRound));
    }

    /** Those of the plain shape, and for a round one the angles at which the blend overtakes it. */
    @Override
    public double[] breaksRad() {
        return breaksRad.clone();
    }

    private double[] breaks() {
        List<Double> all = new ArrayList<>();
        for (double one : plain.breaksRad()) {
            all.add(one);
        }
        for (double from = 0; isRound() && from < Math.PI; from += LOOK_EVERY_RAD) {
            double to = Math.min(Math.PI, from + LOOK_EVERY_RAD);
            if (overtaken(from) != overtaken(to)) {
                double crossing = crossing(from, to);
                if (all.stream().noneMatch(one -> Math.abs(one - crossing) < SAME_RAD)) {
                    all.add(crossing);
                }
            }
        }
        return all.stream().mapToDouble(Double::doubleValue).sorted().toArray();
    }

    private boolean overtaken(double gammaRad) {
        return plain.perLumen(StrictMath.sin(gammaRad), 0, -StrictMath.cos(gammaRad)) < ALL_ROUND;
    }

    private double crossing(double from, double to) {
        boolean before = overtaken(from);
        double low = from;
        double high = to;
        for (int halving = 0; halving < 45; halving++) {
            double middle = (low + high) / 2;
            if (overtaken(middle) == before) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return high;
    }

    @Override
    public boolean isRound() {
        return plain.isRound();
    }

    @Override
    public String formula() {
        return "max[ i₀, (1 − p) i₀ + p / 4π ], p = "
                + QuantityFormat.significant(allRound, 4).plain() + ", i₀ = " + plain.formula();
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Brighter same && plain.equals(same.plain) && allRound == same.allRound;
    }

    @Override
    public int hashCode() {
        return Objects.hash(plain, allRound);
    }

    /** A shape of which a part of the light goes to all sides alike. */
    private record Blended(IntensityDistribution plain, double allRound) implements IntensityDistribution {

        @Override
        public double perLumen(double x, double y, double z) {
            return (1 - allRound) * plain.perLumen(x, y, z) + allRound * ALL_ROUND;
        }

        @Override
        public double[] breaksRad() {
            return plain.breaksRad();
        }

        @Override
        public boolean isRound() {
            return plain.isRound();
        }

        @Override
        public String formula() {
            return "(1 − p) i₀ + p / 4π, p = "
                    + QuantityFormat.significant(allRound, 4).plain() + ", i₀ = " + plain.formula();
        }
    }
}
