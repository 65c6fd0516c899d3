package skytally.luminaire;

/** A bare source under a solid cap that stops everything above its own level: 1/2π below, nothing above. */
record Capped() implements IntensityDistribution {

    @Override
    public double perLumen(double x, double y, double z) {
        return z <= 0 ? 1 / (2 * Math.PI) : 0;
    }

    @Override
    public double[] breaksRad() {
        return new double[] {Math.PI / 2};
    }

    @Override
    public boolean isRound() {
        return true;
    }

    @Override
    public String formula() {
        return "1 / 2π for γ ≤ 90°, else 0";
    }
}
