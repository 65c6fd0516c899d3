package skytally.skyglow;

import java.util.Arrays;

/**
 * The functions of direction that a field of radiance is kept in: associated Legendre functions about the way to the
 * light, even in azimuth,
 * <pre>
 *   B_lm = √((l−m)!/(l+m)!) P_l^m(cos γ) cos mφ
 * </pre>
 * without Condon and Shortley's sign. A direction is given by {@code c = cos γ}, γ from the way to the light, and
 * {@code x = sin γ cos φ}, φ from the plane through the vertical; neither angle is worked out.
 *
 * <p>For each m the degrees run to L − 2m: the part that is round about the way to the light needs high degrees, for
 * the haze throws little back and its series alternates; the rest does not.
 */
final class AngularBasis {

    private static final int TAPER = 2;

    private final int highestDegree;
    private final int highestOrder;
    private final int size;
    private final int[] degree;
    private final int[] order;
    private final double[] start; // for each m, what B_mm is of sin^m γ cos mφ
    private final double[] along; // of c times the function one degree down
    private final double[] back; // of the function two degrees down

    AngularBasis(int highestDegree, int highestOrder) {
        this.highestDegree = highestDegree;
        this.highestOrder = highestOrder;
        int count = 0;
        for (int m = 0; m <= highestOrder; m++) {
            count += top(m) - m + 1;
        }
        size = count;
        degree = new int[size];
        order = new int[size];
        along = new double[size];
        back = new double[size];
        start = new double[highestOrder + 1];
        fill();
    }

    private int top(int m) {
        return highestDegree - TAPER * m;
    }

    private void fill() {
        int k = 0;
        double product = 1;
        for (int m = 0; m <= highestOrder; m++) {
            if (m > 0) {
                product *= Math.sqrt((2 * m - 1) / (2.0 * m));
            }
            start[m] = product;
            for (int l = m; l <= top(m); l++, k++) {
                degree[k] = l;
                order[k] = m;
                if (l > m) {
                    double root = Math.sqrt((double) l * l - m * m);
                    along[k] = (2 * l - 1) / root;
                    back[k] = Math.sqrt((l - 1.0) * (l - 1.0) - m * m) / root;
                }
            }
        }
    }

    /** How many functions there are. */
    int size() {
        return size;
    }

    int highestDegree() {
        return highestDegree;
    }

    int highestOrder() {
        return highestOrder;
    }

    int degree(int k) {
        return degree[k];
    }

    /** How often a function counts in a sum over all azimuths: once for m = 0, else for m and −m. */
    int multiplicity(int k) {
        return order[k] == 0 ? 1 : 2;
    }

    /** The functions at a direction, in their fixed order: by m, then by degree. */
    void at(double c, double x, double[] into) {
        double sineSquared = 1 - c * c;
        double before = 0;
        double here = 1; // sin^m γ cos mφ
        int k = 0;
        for (int m = 0; m <= highestOrder; m++) {
            double lower = 0;
            double value = start[m] * here;
            into[k++] = value;
            for (int l = m + 1; l <= top(m); l++, k++) {
                double next = along[k] * c * value - back[k] * lower;
                lower = value;
                value = next;
                into[k] = value;
            }
            double next = m == 0 ? x : 2 * x * here - sineSquared * before;
            before = here;
            here = next;
        }
    }

    /** Where each of these functions stands in a larger basis that holds them all. */
    int[] placesIn(AngularBasis larger) {
        int[] places = new int[size];
        for (int k = 0; k < size; k++) {
            places[k] = larger.place(degree[k], order[k]);
        }
        return places;
    }

    private int place(int l, int m) {
        for (int k = 0; k < size; k++) {
            if (degree[k] == l && order[k] == m) {
                return k;
            }
        }
        throw new IllegalArgumentException("No function of degree " + l + " and order " + m + " up to degree "
                + highestDegree + " and order " + highestOrder + " in " + Arrays.toString(degree));
    }
}
