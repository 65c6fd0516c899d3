package skytally.skyglow;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.hipparchus.analysis.UnivariateFunction;
import org.hipparchus.analysis.integration.IterativeLegendreGaussIntegrator;
import org.hipparchus.analysis.integration.gauss.GaussIntegrator;
import org.hipparchus.analysis.integration.gauss.GaussIntegratorFactory;
import skytally.atmosphere.Aerosol;
import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.Molecules;

/**
 * The integral of light scattered once, written anew from its formula to check the quick one by: plain s along the line,
 * positions from the Earth's centre, the air on a chord summed from exact heights, edges found by search, and a
 * library's adaptive rule pushed until nothing moves. At one wavelength.
 */
final class PlainScattering {

    private static final double R = Atmosphere.EARTH_RADIUS_M;
    private static final GaussIntegrator CHORD = new GaussIntegratorFactory().legendre(8);
    private static final double PIECE_M = 6000;
    private static final int MOST_EVALUATIONS = 10_000_000;

    private final Aerosol aerosol;
    private final double molecularDepth;
    private final double aerosolDepth;
    private final Emission light;
    private final double[] source;
    private final double[] eye;
    private final double[] view;
    private final double end;

    PlainScattering(Aerosol aerosol, double molecularDepth, double aerosolDepth, Emission light, Sightline line) {
        this.aerosol = aerosol;
        this.molecularDepth = molecularDepth;
        this.aerosolDepth = aerosolDepth;
        this.light = light;
        source = new double[] {0, 0, R + light.heightM()};
        double turn = line.groundDistanceM() / R;
        double[] upAtEye = {Math.sin(turn), 0, Math.cos(turn)};
        double[] toLight = {-Math.cos(turn), 0, Math.sin(turn)};
        eye = plus(new double[3], R + line.eyeHeightM(), upAtEye);
        double level = Math.sin(line.zenithAngleRad());
        view = plus(new double[3], Math.cos(line.zenithAngleRad()), upAtEye);
        view[0] += level * Math.cos(line.azimuthRad()) * toLight[0];
        view[1] += level * Math.sin(line.azimuthRad());
        view[2] += level * Math.cos(line.azimuthRad()) * toLight[2];
        double along = dot(eye, view);
        double apart = dot(eye, eye);
        double toGround = -along - Math.sqrt(Math.max(0, along * along - apart + R * R));
        boolean hits = along < 0 && along * along - apart + R * R > 0;
        double top = R + Atmosphere.TOP_M;
        end = hits ? Math.max(0, toGround) : -along + Math.sqrt(along * along - apart + top * top);
    }

    private static double[] plus(double[] from, double times, double[] direction) {
        return new double[] {
            from[0] + times * direction[0], from[1] + times * direction[1], from[2] + times * direction[2]
        };
    }

    private static double dot(double[] a, double[] b) {
        return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
    }

    double endM() {
        return end;
    }

    /** The s nearest the light. */
    double nearestM() {
        return -dot(plus(eye, -1, source), view);
    }

    /** The integrand at s, per metre. */
    double at(double s) {
        double[] point = plus(eye, s, view);
        double[] ray = plus(point, -1, source);
        double distance = Math.sqrt(dot(ray, ray));
        if (clearance(point) < 0) {
            return 0;
        }
        double intensity = light.toward(ray[0] / distance, ray[1] / distance, ray[2] / distance);
        if (intensity == 0) {
            return 0;
        }
        double cosine = -dot(ray, view) / distance;
        double height = heightM(point);
        double scattered = molecularDepth
                        / Molecules.SCALE_HEIGHT_M
                        * Math.exp(-height / Molecules.SCALE_HEIGHT_M)
                        * Molecules.phase(cosine)
                + aerosol.singleScatteringAlbedo()
                        * aerosolDepth
                        / aerosol.scaleHeightM()
                        * Math.exp(-height / aerosol.scaleHeightM())
                        * aerosol.phase(cosine);
        return intensity / (distance * distance) * scattered * Math.exp(-depth(source, point) - depth(point, eye));
    }

    private static double heightM(double[] point) {
        return Math.sqrt(dot(point, point)) - R;
    }

    /** By how much the straight way from the light to a point clears the ground, in metres. */
    private double clearance(double[] point) {
        double[] way = plus(point, -1, source);
        double t = Math.max(0, Math.min(1, -dot(source, way) / dot(way, way)));
        return heightM(plus(source, t, way)) + 1e-6;
    }

    /** Optical depth along a chord, in pieces of 6 km at most. */
    private double depth(double[] from, double[] to) {
        double[] way = plus(to, -1, from);
        double length = Math.sqrt(dot(way, way));
        int pieces = 1 + (int) (length / PIECE_M);
        double sum = 0;
        for (int piece = 0; piece < pieces; piece++) {
            for (int i = 0; i < CHORD.getNumberOfPoints(); i++) {
                double t = (piece + 0.5 + CHORD.getPoint(i) / 2) / pieces;
                double height = heightM(plus(from, t, way));
                sum += CHORD.getWeight(i)
                        * (molecularDepth / Molecules.SCALE_HEIGHT_M * Math.exp(-height / Molecules.SCALE_HEIGHT_M)
                                + aerosolDepth / aerosol.scaleHeightM() * Math.exp(-height / aerosol.scaleHeightM()));
            }
        }
        return sum * length / pieces / 2;
    }

    /** The integral, each stretch between steps of the integrand to a relative accuracy of 1e-6 of itself. */
    double converged() {
        List<Double> cuts = cuts();
        double sum = 0;
        for (int i = 1; i < cuts.size(); i++) {
            sum += stretch(this::at, cuts.get(i - 1), cuts.get(i), 1e-6);
        }
        return sum;
    }

    static double stretch(UnivariateFunction integrand, double from, double to, double relative) {
        // the ends themselves are steps; stay a hair inside
        double hair = 1e-12 * (to - from);
        return new IterativeLegendreGaussIntegrator(8, relative, 1e-300, 2, 24)
                .integrate(MOST_EVALUATIONS, integrand, from + hair, to - hair);
    }

    /** Both ends, steps of the integrand, and marks that double their distance from the point nearest the light. */
    private List<Double> cuts() {
        double nearest = nearestM();
        double[] offset = plus(plus(eye, -1, source), nearest, view);
        double least = Math.sqrt(dot(offset, offset));
        List<Double> marks = new ArrayList<>(List.of(0.0, end, nearest));
        for (double step = Math.max(least, 1e-4); step < 2 * end + Math.abs(nearest); step *= 2) {
            marks.add(nearest - step);
            marks.add(nearest + step);
        }
        List<Double> cuts = new ArrayList<>(
                marks.stream().filter(s -> s >= 0 && s <= end).sorted().toList());
        List<DoubleUnaryOperator> edges = new ArrayList<>();
        edges.add(s -> clearance(plus(eye, s, view)));
        for (Emission.Cone edge : light.edges()) {
            edges.add(s -> beyond(edge, s));
        }
        edges.add(s -> beyond(Emission.Cone.aboutZenith(0), s));
        for (DoubleUnaryOperator edge : edges) {
            addSteps(edge, cuts);
        }
        return cuts.stream().sorted().distinct().toList();
    }

    private double beyond(Emission.Cone edge, double s) {
        double[] ray = plus(plus(eye, s, view), -1, source);
        double[] axis = {edge.axisAhead(), edge.axisLeft(), edge.axisUp()};
        return dot(ray, axis) / Math.sqrt(dot(ray, ray)) - edge.cosine();
    }

    private static void addSteps(DoubleUnaryOperator edge, List<Double> cuts) {
        List<Double> sorted = cuts.stream().sorted().distinct().toList();
        int parts = 16;
        for (int i = 1; i < sorted.size(); i++) {
            double width = (sorted.get(i) - sorted.get(i - 1)) / parts;
            for (int part = 0; part < parts; part++) {
                double low = sorted.get(i - 1) + part * width;
                double high = low + width;
                if (edge.applyAsDouble(low) * edge.applyAsDouble(high) < 0) {
                    cuts.add(bisected(edge, low, high));
                }
            }
        }
    }

    private static double bisected(DoubleUnaryOperator edge, double low, double high) {
        double below = edge.applyAsDouble(low);
        for (int i = 0; i < 60; i++) {
            double middle = (low + high) / 2;
            if (edge.applyAsDouble(middle) * below > 0) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return (low + high) / 2;
    }
}
