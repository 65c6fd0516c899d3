package skytally.skyglow;

import java.util.Arrays;

/**
 * Sums an emission over the directions above the level, hat by hat. The sum runs in rings about the emission's own
 * axis, cut at its edges and where the ring meets the level, so that a narrow beam is not missed and no step is crossed.
 */
final class UpwardGathering {

    private static final int RING_NODES = 12;
    private static final int AROUND_NODES = 48;
    /** No stretch between two rings is longer, in radians. */
    private static final double STRETCH = StrictMath.toRadians(10);

    private final Emission light;
    private final double axisAhead;
    private final double axisLeft;
    private final double axisUp;
    private final double axisLevel; // sine of the axis' zenith angle

    UpwardGathering(Emission light) {
        this.light = light;
        Emission.Cone first = light.edges().isEmpty()
                ? Emission.Cone.aboutZenith(0)
                : light.edges().get(0);
        axisAhead = first.axisAhead();
        axisLeft = first.axisLeft();
        axisUp = first.axisUp();
        axisLevel = Math.sqrt(Math.max(0, 1 - axisUp * axisUp));
    }

    void addTo(double[] onHats) {
        double[] cuts = cuts();
        for (int i = 1; i < cuts.length; i++) {
            int parts = (int) Math.ceil((cuts[i] - cuts[i - 1]) / STRETCH);
            for (int part = 0; part < parts; part++) {
                double width = (cuts[i] - cuts[i - 1]) / parts;
                addRings(cuts[i - 1] + part * width, width, onHats);
            }
        }
    }

    /** Angles from the axis at which the emission has an edge or a ring begins or ceases to meet the level or the hats' peaks. */
    private double[] cuts() {
        double tilt = StrictMath.acos(Math.max(-1, Math.min(1, axisUp)));
        double[] found = new double[2 + light.edges().size() + 2 * ZenithHats.COUNT];
        int count = 0;
        found[count++] = 0;
        found[count++] = Math.PI;
        for (Emission.Cone edge : light.edges()) {
            if (isAboutTheAxis(edge)) {
                found[count++] = StrictMath.acos(Math.max(-1, Math.min(1, edge.cosine())));
            }
        }
        for (int hat = 0; hat < ZenithHats.COUNT; hat++) {
            found[count++] = Math.abs(ZenithHats.peak(hat) - tilt);
            found[count++] = Math.min(ZenithHats.peak(hat) + tilt, 2 * Math.PI - ZenithHats.peak(hat) - tilt);
        }
        double[] cuts = Arrays.copyOf(found, count);
        Arrays.sort(cuts);
        return cuts;
    }

    private boolean isAboutTheAxis(Emission.Cone edge) {
        return edge.axisAhead() * axisAhead + edge.axisLeft() * axisLeft + edge.axisUp() * axisUp > 1 - 1e-12;
    }

    private void addRings(double from, double width, double[] onHats) {
        GaussRule rule = GaussRule.of(RING_NODES);
        for (int i = 0; i < rule.count(); i++) {
            double angle = from + width * (1 + rule.nodes()[i]) / 2;
            addRing(angle, rule.weights()[i] * width / 2, onHats);
        }
    }

    /** One ring, from where it is highest to where it dips below the level, on both sides. */
    private void addRing(double angle, double breadth, double[] onHats) {
        double cosine = StrictMath.cos(angle);
        double sine = StrictMath.sin(angle);
        double highest = cosine * axisUp;
        double swing = sine * axisLevel;
        if (highest + swing <= 0) {
            return;
        }
        double turn = highest - swing >= 0 ? Math.PI : StrictMath.acos(-highest / swing);
        GaussRule rule = GaussRule.of(AROUND_NODES);
        for (int i = 0; i < rule.count(); i++) {
            double azimuth = turn * rule.nodes()[i]; // −turn to turn, both sides of the highest point
            double solidAngle = sine * breadth * turn * rule.weights()[i];
            addDirection(cosine, sine * StrictMath.cos(azimuth), sine * StrictMath.sin(azimuth), solidAngle, onHats);
        }
    }

    /**
     * @param along  component along the axis
     * @param toward component square to the axis in its vertical plane, upward
     * @param aside  component that is level
     */
    private void addDirection(double along, double toward, double aside, double solidAngle, double[] onHats) {
        double levelAhead = axisLevel == 0 ? 1 : axisAhead / axisLevel;
        double levelLeft = axisLevel == 0 ? 0 : axisLeft / axisLevel;
        double up = along * axisUp + toward * axisLevel;
        double out = along * axisLevel - toward * axisUp;
        double ahead = out * levelAhead - aside * levelLeft;
        double left = out * levelLeft + aside * levelAhead;
        double flux = light.toward(ahead, left, up) * solidAngle;
        double zenithAngle = StrictMath.acos(Math.max(0, Math.min(1, up)));
        int lower = ZenithHats.lower(zenithAngle);
        double share = ZenithHats.share(lower, zenithAngle);
        onHats[lower] += flux * (1 - share);
        onHats[lower + 1] += flux * share;
    }
}
