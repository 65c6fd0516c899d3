package skytally.luminaire;

/** Another shape turned over, so that what faced down faces up. */
record TurnedUp(IntensityDistribution down) implements IntensityDistribution {

    @Override
    public double perLumen(double x, double y, double z) {
        return down.perLumen(-x, y, -z);
    }

    @Override
    public double[] breaksRad() {
        double[] below = down.breaksRad();
        double[] above = new double[below.length];
        for (int i = 0; i < below.length; i++) {
            above[i] = Math.PI - below[below.length - 1 - i];
        }
        return above;
    }

    @Override
    public boolean isRound() {
        return down.isRound();
    }

    @Override
    public String formula() {
        return down.formula() + ", γ from straight up";
    }
}
