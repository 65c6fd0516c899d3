package skytally.skyglow;

import java.util.concurrent.atomic.AtomicReferenceArray;
import org.hipparchus.analysis.integration.gauss.GaussIntegrator;
import org.hipparchus.analysis.integration.gauss.GaussIntegratorFactory;

/** Nodes and weights of Gauss and Legendre between −1 and 1. The arrays are shared: read only. */
record GaussRule(double[] nodes, double[] weights) {

    private static final int MOST = 64;
    private static final AtomicReferenceArray<GaussRule> KEPT = new AtomicReferenceArray<>(MOST + 1);

    /** The rule of that many nodes, 1 to 64. */
    static GaussRule of(int count) {
        GaussRule kept = KEPT.get(count);
        if (kept == null) {
            kept = made(count);
            KEPT.set(count, kept);
        }
        return kept;
    }

    private static GaussRule made(int count) {
        GaussIntegrator rule = new GaussIntegratorFactory().legendre(count);
        double[] nodes = new double[count];
        double[] weights = new double[count];
        for (int i = 0; i < count; i++) {
            nodes[i] = rule.getPoint(i);
            weights[i] = rule.getWeight(i);
        }
        return new GaussRule(nodes, weights);
    }

    int count() {
        return nodes.length;
    }
}
