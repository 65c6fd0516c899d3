package skytally.skyglow;

import java.util.List;

/** Emissions with a total upward flux of one watt, as the independent solutions use them. */
final class TestEmissions {

    private TestEmissions() {}

    static Emission named(String name) {
        if (name.equals("lambert")) {
            return of((ahead, left, up) -> up > 0 ? up / Math.PI : 0, List.of());
        }
        String[] ring = name.substring("ring".length()).split("-");
        return ring(Double.parseDouble(ring[0]), Double.parseDouble(ring[1]));
    }

    static Emission ring(double fromZenithDeg, double toZenithDeg) {
        double inner = Math.cos(Math.toRadians(fromZenithDeg));
        double outer = toZenithDeg == 90 ? 0 : Math.cos(Math.toRadians(toZenithDeg));
        double intensity = 1 / (2 * Math.PI * (inner - outer));
        return of(
                (ahead, left, up) -> up <= inner && up > outer ? intensity : 0,
                List.of(Emission.Cone.aboutZenith(inner), Emission.Cone.aboutZenith(outer)));
    }

    static Emission of(Pattern pattern, List<Emission.Cone> edges) {
        return at(0, pattern, edges);
    }

    static Emission at(double heightM, Pattern pattern, List<Emission.Cone> edges) {
        return new Emission() {
            @Override
            public double toward(double ahead, double left, double up) {
                return pattern.toward(ahead, left, up);
            }

            @Override
            public List<Cone> edges() {
                return edges;
            }

            @Override
            public double heightM() {
                return heightM;
            }
        };
    }

    interface Pattern {
        double toward(double ahead, double left, double up);
    }
}
