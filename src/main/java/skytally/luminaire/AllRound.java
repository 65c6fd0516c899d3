package skytally.luminaire;

/** A bare source, equally strong every way: 1/4π. */
record AllRound() implements IntensityDistribution {

    @Override
    public double perLumen(double x, double y, double z) {
        return 1 / (4 * Math.PI);
    }

    @Override
    public double[] breaksRad() {
        return new double[0];
    }

    @Override
    public boolean isRound() {
        return true;
    }

    @Override
    public String formula() {
        return "1 / 4π";
    }
}
