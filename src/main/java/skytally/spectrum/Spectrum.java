package skytally.spectrum;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.DoubleUnaryOperator;

/**
 * Where in wavelength one watt of radiant flux between 380 and 780 nm lies: lines at their exact wavelengths, and a
 * continuum held every half nanometre with straight lines between. Immutable.
 *
 * <p>Every integral is a sum over nodes, {@code ∫ S R f dλ = Σ w_i R(λ_i) f(λ_i)}, the nodes being the lines and the
 * points of the continuum. Loops take {@link #nodeWavelengthsNm()} and {@link #nodeWeights} once and keep them.
 */
public final class Spectrum {

    /** CIE maximum photopic luminous efficacy K_m (683.002 unrounded), lm/W. */
    public static final double CIE_KM_LM_PER_W = 683;

    /** CIE maximum scotopic luminous efficacy K′_m (1700.06 unrounded), lm/W. */
    public static final double CIE_KM_SCOTOPIC_LM_PER_W = 1700;

    /**
     * Mean flux density in Johnson V (Bessell 1990, energy weighting) of a source of V = 0, W m⁻² nm⁻¹: the scale on
     * which the CALSPEC spectrum of Vega has V = +0.03. Good to 1 %.
     */
    public static final double CALSPEC_V_ZERO_W_PER_M2_NM = 3.721e-11;

    /** Where the radiant flux begins to count, nm. */
    public static final double FROM_NM = 380;

    /** Where the radiant flux ceases to count, nm. */
    public static final double TO_NM = 780;

    private static final double STEP_NM = 0.5;
    private static final int GRID = (int) ((TO_NM - FROM_NM) / STEP_NM) + 1;

    /** Rounded powers of a class may miss 1 by this much. */
    private static final double ROUNDING_OF_POWERS = 2e-4;

    private final List<Component.Line> lines;
    private final double[] densityPerNm;
    private final double[] nodesNm;
    private final double[] nodePowers;
    private final Map<Passband, double[]> weights = new ConcurrentHashMap<>();

    private Spectrum(List<Component.Line> lines, double[] densityPerNm) {
        this.lines = List.copyOf(lines);
        this.densityPerNm = densityPerNm;
        double[][] nodes = nodes(this.lines, densityPerNm);
        this.nodesNm = nodes[0];
        this.nodePowers = nodes[1];
    }

    /** The sum of components; their powers must add to 1 within rounding, and are then made to do so exactly. */
    static Spectrum of(List<? extends Component> components) {
        double sum = components.stream().mapToDouble(Component::power).sum();
        if (!(Math.abs(sum - 1) <= ROUNDING_OF_POWERS)) {
            throw new IllegalArgumentException("The powers of a spectrum must add to 1, not " + sum);
        }
        List<Component.Line> lines = new ArrayList<>();
        double[] densityPerNm = new double[GRID];
        for (Component component : components) {
            double power = component.power() / sum;
            if (component instanceof Component.Line line) {
                lines.add(new Component.Line(line.wavelengthNm(), Math.min(1, power)));
            } else if (component instanceof Component.Continuum continuum) {
                double[] shape = normalised(continuum::at);
                for (int i = 0; i < GRID; i++) {
                    densityPerNm[i] += power * shape[i];
                }
            }
        }
        return new Spectrum(lines, densityPerNm);
    }

    /**
     * A smooth spectrum of any scale, sampled every half nanometre from 380 to 780 nm.
     *
     * @param relativeDensityAtNm radiant flux per nm; finite, never negative, more than 0 somewhere
     */
    public static Spectrum ofContinuum(DoubleUnaryOperator relativeDensityAtNm) {
        return new Spectrum(List.of(), normalised(relativeDensityAtNm));
    }

    /** All the light at one wavelength, 380 to 780 nm. */
    public static Spectrum ofLine(double wavelengthNm) {
        return of(List.of(new Component.Line(wavelengthNm, 1)));
    }

    /** A blackbody, cut to 380-780 nm. */
    public static Spectrum ofBlackbody(double temperatureK) {
        return of(List.of(new Component.Planck(temperatureK, 1)));
    }

    private static double[] normalised(DoubleUnaryOperator shape) {
        double[] density = new double[GRID];
        double sumNm = 0;
        for (int i = 0; i < GRID; i++) {
            density[i] = shape.applyAsDouble(gridNm(i));
            if (!(density[i] >= 0 && density[i] < Double.POSITIVE_INFINITY)) {
                throw new IllegalArgumentException("Radiant flux must be finite and never negative, not " + density[i]);
            }
            sumNm += density[i] * gridWidthNm(i);
        }
        if (!(sumNm > 0 && sumNm < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException("A spectrum must hold some light between 380 and 780 nm");
        }
        for (int i = 0; i < GRID; i++) {
            density[i] /= sumNm;
        }
        return density;
    }

    private static double gridNm(int i) {
        return FROM_NM + i * STEP_NM;
    }

    /** Trapezoid rule: the ends count half. */
    private static double gridWidthNm(int i) {
        return i == 0 || i == GRID - 1 ? STEP_NM / 2 : STEP_NM;
    }

    private static double[][] nodes(List<Component.Line> lines, double[] densityPerNm) {
        List<double[]> nodes = new ArrayList<>();
        for (int i = 0; i < GRID; i++) {
            if (densityPerNm[i] > 0) {
                nodes.add(new double[] {gridNm(i), densityPerNm[i] * gridWidthNm(i)});
            }
        }
        lines.forEach(line -> nodes.add(new double[] {line.wavelengthNm(), line.power()}));
        nodes.sort(Comparator.comparingDouble(node -> node[0]));
        double[] wavelengthsNm = nodes.stream().mapToDouble(node -> node[0]).toArray();
        double[] powers = nodes.stream().mapToDouble(node -> node[1]).toArray();
        return new double[][] {wavelengthsNm, powers};
    }

    /**
     * {@code ∫ S(λ) R(λ) f(λ) dλ} for one watt of this spectrum.
     *
     * @param factorAtNm dimensionless, such as a transmission or a reflectance, at a wavelength in nm
     */
    public double weighted(Passband band, DoubleUnaryOperator factorAtNm) {
        double[] weights = keptWeights(band);
        double sum = 0;
        for (int i = 0; i < weights.length; i++) {
            sum += weights[i] * factorAtNm.applyAsDouble(nodesNm[i]);
        }
        return sum;
    }

    /** {@code ∫ S(λ) R(λ) dλ} for one watt of this spectrum. */
    public double weighted(Passband band) {
        double sum = 0;
        for (double weight : keptWeights(band)) {
            sum += weight;
        }
        return sum;
    }

    /** Wavelengths of the nodes, rising, in nm. The caller's own copy. */
    public double[] nodeWavelengthsNm() {
        return nodesNm.clone();
    }

    /** Power times response at each of {@link #nodeWavelengthsNm()}, W per W. The caller's own copy. */
    public double[] nodeWeights(Passband band) {
        return keptWeights(band).clone();
    }

    private double[] keptWeights(Passband band) {
        return weights.computeIfAbsent(band, this::weightsOf);
    }

    private double[] weightsOf(Passband band) {
        double[] weights = new double[nodesNm.length];
        for (int i = 0; i < weights.length; i++) {
            weights[i] = nodePowers[i] * band.at(nodesNm[i]);
        }
        return weights;
    }

    /** Luminous efficacy of radiation, photopic: lumens per radiant watt between 380 and 780 nm. */
    public double luminousEfficacyLmPerW() {
        return CIE_KM_LM_PER_W * weighted(Passband.PHOTOPIC);
    }

    /** Luminous efficacy of radiation for the dark-adapted eye: scotopic lumens per radiant watt. */
    public double scotopicEfficacyLmPerW() {
        return CIE_KM_SCOTOPIC_LM_PER_W * weighted(Passband.SCOTOPIC);
    }

    /** S/P: scotopic over photopic lumens. */
    public double scotopicPhotopicRatio() {
        return scotopicEfficacyLmPerW() / luminousEfficacyLmPerW();
    }

    /**
     * Share of the radiant flux that lies between two wavelengths; a line at the upper end itself is not counted.
     *
     * @param fromNm 380 to 780 nm
     * @param toNm   fromNm to 780 nm
     */
    public double shareBetween(double fromNm, double toNm) {
        if (!(fromNm >= FROM_NM && toNm >= fromNm && toNm <= TO_NM)) {
            throw new IllegalArgumentException(
                    "A share lies between two wavelengths, 380 to 780 nm and rising, not " + fromNm + " and " + toNm);
        }
        double share = continuumUpTo(toNm) - continuumUpTo(fromNm);
        for (Component.Line line : lines) {
            boolean below = line.wavelengthNm() < toNm || toNm == TO_NM;
            if (line.wavelengthNm() >= fromNm && below) {
                share += line.power();
            }
        }
        return share;
    }

    /** The continuum from 380 nm up to a wavelength, its density running straight between points of the grid. */
    private double continuumUpTo(double wavelengthNm) {
        double steps = (wavelengthNm - FROM_NM) / STEP_NM;
        int whole = Math.min((int) steps, GRID - 2);
        double sum = 0;
        for (int i = 0; i < whole; i++) {
            sum += (densityPerNm[i] + densityPerNm[i + 1]) / 2 * STEP_NM;
        }
        double rest = steps - whole;
        double rise = densityPerNm[whole + 1] - densityPerNm[whole];
        return sum + (densityPerNm[whole] + rise * rest / 2) * rest * STEP_NM;
    }

    /** Mean flux density in Johnson V, {@code ∫ S R_V dλ / ∫ R_V dλ}, for one lux of this light: W m⁻² nm⁻¹ per lx. */
    public double johnsonVFluxDensityPerLux() {
        return weighted(Passband.JOHNSON_V) / Passband.JOHNSON_V.integralNm() / luminousEfficacyLmPerW();
    }

    /** E0_V: the photopic illuminance at which this spectrum has Johnson V = 0, lx. */
    public double zeroMagnitudeIlluminanceLx() {
        return CALSPEC_V_ZERO_W_PER_M2_NM / johnsonVFluxDensityPerLux();
    }
}
