package skytally.luminaire;

import skytally.notation.QuantityFormat;

/**
 * A flat clear lens facing down that throws most of its light to the sides. A plain stand-in, not a measured fitting:
 * <pre>
 *   I ∝ 0.1 cos γ + cos² γ [ 1 + 12 sin⁸ γ (1 + a cos φ − b cos 2φ) ]        γ ≤ 90°, φ from the street side
 * </pre>
 * One cosine is the lens seen ever more edge-on, the second the glass that reflects ever more light back inside near
 * grazing; the tenth that falls with one cosine alone is a film of dirt. The peak lies near 63°; about 3 % of the
 * light leaves within 10° of its level (common practice for flat-lens fittings is 1 to 5 %, no source).
 *
 * @param towardStreet a, how much more goes to the street side than behind; 0 for an area fitting
 * @param alongRoad    b, how much more goes along the road than across it; 0 for an area fitting
 */
record FlatLens(double towardStreet, double alongRoad) implements IntensityDistribution {

    private static final double DIRT = 0.1;
    private static final double THROW = 12;

    /**
     * 2π ∫ sin γ (…) dγ over the lower half. ∫ cos sin = 1/2, ∫ cos² sin = 1/3, ∫ cos² sin⁹ = 128/3465; the parts in
     * φ average out.
     */
    private static final double FLUX = 2 * Math.PI * (DIRT / 2 + 1.0 / 3 + THROW * 128 / 3465);

    static final FlatLens AREA = new FlatLens(0, 0);
    static final FlatLens ROAD = new FlatLens(0.4, 0.5);

    @Override
    public double perLumen(double x, double y, double z) {
        if (z >= 0) {
            return 0;
        }
        double cosine = -z;
        double sineSquared = x * x + y * y;
        double spread = THROW * sineSquared * sineSquared * sineSquared * sineSquared;
        if (!isRound() && sineSquared > 0) {
            double cosPhi = x / Math.sqrt(sineSquared);
            spread *= 1 + towardStreet * cosPhi - alongRoad * (2 * cosPhi * cosPhi - 1);
        }
        return cosine * (DIRT + cosine * (1 + spread)) / FLUX;
    }

    @Override
    public double[] breaksRad() {
        return new double[] {Math.PI / 2};
    }

    @Override
    public boolean isRound() {
        return towardStreet == 0 && alongRoad == 0;
    }

    @Override
    public String formula() {
        String sides = isRound()
                ? ""
                : " (1 + " + QuantityFormat.decimals(towardStreet, 1) + " cos φ − "
                        + QuantityFormat.decimals(alongRoad, 1) + " cos 2φ)";
        return "[0.1 cos γ + cos² γ (1 + 12 sin⁸ γ" + sides + ")] / "
                + QuantityFormat.significant(FLUX, 5).plain() + " for γ < 90°, else 0";
    }
}
