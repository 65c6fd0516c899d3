package skytally.skyglow;

/** Interpolation by the polynomial through the nodes nearest. */
final class Lagrange {

    private Lagrange() {}

    /**
     * How much each node counts at x: 0 for all but some neighbours, and exactly 1 for a node that x falls on.
     *
     * @param nodes rising
     * @param most  how many nodes may count, 2 or more
     */
    static double[] weights(double[] nodes, double x, int most) {
        int count = Math.min(most, nodes.length);
        int above = 0;
        while (above < nodes.length && nodes[above] < x) {
            above++;
        }
        int first = Math.max(0, Math.min(above - count / 2, nodes.length - count));
        double[] weights = new double[nodes.length];
        for (int i = first; i < first + count; i++) {
            double product = 1;
            for (int j = first; j < first + count; j++) {
                if (j != i) {
                    product *= (x - nodes[j]) / (nodes[i] - nodes[j]);
                }
            }
            weights[i] = product;
        }
        return weights;
    }
}
