package skytally.spectrum;

import java.util.Arrays;
import java.util.List;
import skytally.citation.Bibliography;
import skytally.citation.Citation;

/**
 * How strongly an eye or an instrument takes each wavelength, relative to energy, peak about 1: a published table, and
 * nothing outside it.
 *
 * <p>The observers of the eye are smooth and stand every 5 nm: a cubic through the four nearest points gives back their
 * 1 nm table to 0.02 %, where straight lines would put a blue LED 0.4 % and a mercury line 0.1 % off. The Bessell bands
 * were published for straight lines and are read so.
 */
public final class Passband {

    private static final String EFFICIENCY = "/spectra/luminous_efficiency_5nm.csv";
    private static final String JOHNSON_COUSINS = "/spectra/johnson_cousins_bessell1990.csv";

    /** V(λ), the eye by day: CIE 1924. */
    public static final Passband PHOTOPIC = read("photopic", EFFICIENCY, Reading.CUBIC, "cie-1924");

    /** V′(λ), the dark-adapted eye: CIE 1951. */
    public static final Passband SCOTOPIC = read("scotopic", EFFICIENCY, Reading.CUBIC, "cie-1924");

    /** Johnson B as realised by Bessell (1990), energy weighting. */
    public static final Passband JOHNSON_B = read("B", JOHNSON_COUSINS, Reading.STRAIGHT, "bessell-1990");

    /** Johnson V as realised by Bessell (1990), energy weighting: the band of sky brightness. */
    public static final Passband JOHNSON_V = read("V", JOHNSON_COUSINS, Reading.STRAIGHT, "bessell-1990");

    /** Cousins R as realised by Bessell (1990), energy weighting; it reaches beyond the spectra of this room. */
    public static final Passband JOHNSON_R = read("R", JOHNSON_COUSINS, Reading.STRAIGHT, "bessell-1990");

    /** How a value between two points of the table is found. */
    private enum Reading {
        STRAIGHT,
        CUBIC
    }

    private final String name;
    private final double[] wavelengthsNm;
    private final double[] responses;
    private final Reading reading;
    private final String source;

    private Passband(String name, double[] wavelengthsNm, double[] responses, Reading reading, String source) {
        this.name = name;
        this.wavelengthsNm = wavelengthsNm;
        this.responses = responses;
        this.reading = reading;
        this.source = source;
    }

    private static Passband read(String column, String resource, Reading reading, String source) {
        Table table = Table.read(resource);
        int at = table.headings().indexOf(column);
        List<Table.Row> body = table.body();
        double[] wavelengthsNm = new double[body.size()];
        double[] responses = new double[body.size()];
        for (int i = 0; i < body.size(); i++) {
            Table.Row row = body.get(i);
            wavelengthsNm[i] = row.number(row.cells().get(0));
            responses[i] = row.number(row.cells().get(at));
            if (i > 0 && !(wavelengthsNm[i] > wavelengthsNm[i - 1])) {
                throw row.fault("wavelengths must increase");
            }
        }
        return new Passband(column, wavelengthsNm, responses, reading, source);
    }

    /** The response at one wavelength, in nm; 0 outside the table. */
    public double at(double wavelengthNm) {
        if (Double.isNaN(wavelengthNm)) {
            throw new IllegalArgumentException("A wavelength must be a number, not NaN");
        }
        int found = Arrays.binarySearch(wavelengthsNm, wavelengthNm);
        if (found >= 0) {
            return responses[found];
        }
        int above = -found - 1;
        if (above == 0 || above == wavelengthsNm.length) {
            return 0;
        }
        return reading == Reading.CUBIC ? cubic(wavelengthNm, above) : straight(wavelengthNm, above);
    }

    private double straight(double wavelengthNm, int above) {
        double share = (wavelengthNm - wavelengthsNm[above - 1]) / (wavelengthsNm[above] - wavelengthsNm[above - 1]);
        return responses[above - 1] + share * (responses[above] - responses[above - 1]);
    }

    /** Lagrange's cubic through the two points on each side; at an end of the table, through the last four. */
    private double cubic(double wavelengthNm, int above) {
        int first = Math.min(Math.max(above - 2, 0), responses.length - 4);
        double sum = 0;
        for (int i = first; i < first + 4; i++) {
            double term = responses[i];
            for (int j = first; j < first + 4; j++) {
                if (j != i) {
                    term *= (wavelengthNm - wavelengthsNm[j]) / (wavelengthsNm[i] - wavelengthsNm[j]);
                }
            }
            sum += term;
        }
        return Math.max(0, sum);
    }

    /** ∫ R dλ over the whole table by the trapezoid rule on its points, in nm. */
    public double integralNm() {
        double sum = 0;
        for (int i = 1; i < responses.length; i++) {
            sum += (responses[i] + responses[i - 1]) / 2 * (wavelengthsNm[i] - wavelengthsNm[i - 1]);
        }
        return sum;
    }

    public Citation citation() {
        return Bibliography.cite(source);
    }

    @Override
    public String toString() {
        return name;
    }
}
