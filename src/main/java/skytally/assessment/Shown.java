package skytally.assessment;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.function.ToDoubleFunction;
import skytally.citation.Bibliography;
import skytally.citation.Citation;
import skytally.notation.QuantityFormat;
import skytally.scene.Known;
import skytally.scene.Lamp;
import skytally.scene.OpenScene;
import skytally.scene.Property;

/** What every working of a place says alike: inputs with their states, sources, numbers to five figures. */
abstract class Shown {

    private static final int FIGURES = 5;
    private static final int MOST_TYPES = 12;

    static final String FIRST_ORDER =
            "First scattering only: light scattered more than once is not in it, so read it as \"at least\".";

    final PlaceNumbers numbers;
    final Lamp lamp;
    final String place;
    private final OpenScene open;

    Shown(PlaceNumbers numbers, OpenScene open) {
        this.numbers = numbers;
        this.open = open;
        this.lamp = numbers.brightest();
        this.place = numbers.observer().mark();
    }

    /** What each type adds, the most first; beyond a dozen the rest as one. */
    final List<Working.Input> byType(String symbol, String unit, ToDoubleFunction<Contribution> part) {
        List<Contribution> types = numbers.contributions().stream()
                .filter(type -> part.applyAsDouble(type) > 0)
                .sorted(Comparator.comparingDouble(part).reversed())
                .toList();
        List<Working.Input> inputs = new ArrayList<>();
        for (Contribution type : types.subList(0, Math.min(MOST_TYPES, types.size()))) {
            inputs.add(worked(
                    "All of type " + type.type(),
                    symbol + "(" + type.type() + ")",
                    written(part.applyAsDouble(type), unit),
                    lights(type.type())));
        }

        if (types.size() > MOST_TYPES) {
            double rest = types.stream().skip(MOST_TYPES).mapToDouble(part).sum();
            inputs.add(worked(
                    "All other types", symbol + "(rest)", written(rest, unit), types.size() - MOST_TYPES + " types"));
        }

        return inputs;
    }

    private String lights(String type) {
        int count = numbers.scene().allLamps().stream()
                .filter(one -> one.type().equals(type))
                .mapToInt(Lamp::count)
                .sum();
        return count == 1
                ? "1 light, with its own distance and angle"
                : count + " lights, each with its own distance and angle";
    }

    /** What goes into the light that the air sends back, of the lamps and of the ground they light. */
    final List<Working.Input> skyInputs() {
        List<Working.Input> inputs = new ArrayList<>(airInputs());
        inputs.add(
                1,
                input(
                        "Share the ground sends back",
                        "ρ",
                        written(numbers.scene().surroundings().groundReflectance(), ""),
                        Property.GROUND,
                        place));
        return inputs;
    }

    /** The same of the lamps alone. */
    final List<Working.Input> airInputs() {
        List<Working.Input> inputs = new ArrayList<>();
        double lumens = numbers.scene().allLamps().stream()
                .mapToDouble(one -> one.allFlux().lumens())
                .sum();
        inputs.add(worked("Light of all lamps", "N Φ", written(lumens, " lm"), "count and lumens"));
        if (isOnePoint()) {
            inputs.add(worked(
                    "Share sent above the level",
                    "ULR",
                    withUnit(Measure.UPWARD_SHARE, numbers.get(Measure.UPWARD_SHARE)),
                    "its shape and tilt"));
        }
        inputs.add(input(
                "Aerosol optical depth at 550 nm",
                "τ_a",
                written(numbers.air().aerosol().opticalDepthAt550(), ""),
                Property.AIR,
                place));
        inputs.add(worked(
                "Optical depth of the molecules at 550 nm",
                "τ_m",
                written(numbers.air().molecularOpticalDepth(550), ""),
                "height of the ground"));
        inputs.add(input("Distance along the ground", "D", m(groundDistance()), Property.DISTANCE, place));
        return inputs;
    }

    /** Whether all light comes from one point, so that the sum is a product. */
    final boolean isOnePoint() {
        return numbers.scene().allLamps().size() == 1;
    }

    Working.Input passedByAir() {
        return new Working.Input(
                "Passed by the air",
                "T",
                written(numbers.transmission(), ""),
                Known.workedOut(
                        "aerosol depth " + written(numbers.air().aerosol().opticalDepthAt550(), "") + ", "
                                + open.known(Property.AIR, place).state().words()));
    }

    static Working.Input zeroPointLuminance() {
        return constant(
                "Luminance of 0 mag/arcsec²",
                "L₀",
                written(PlaceNumbers.ZERO_POINT.zeroPointLuminanceCdM2(), " cd/m²") + ", from E₀");
    }

    Working.Input input(String name, String symbol, String value, Property property, String mark) {
        return new Working.Input(name, symbol, value, open.known(property, mark));
    }

    static Working.Input worked(String name, String symbol, String value, String from) {
        return new Working.Input(name, symbol, value, Known.workedOut(from));
    }

    static Working.Input constant(String name, String symbol, String value) {
        return new Working.Input(name, symbol, value, Known.assumed("convention, see the sources"));
    }

    static List<Citation> cite(String... keys) {
        return Arrays.stream(keys).map(Bibliography::cite).toList();
    }

    double lampHeight() {
        return lamp.position().heightM();
    }

    double eyeHeight() {
        return numbers.observer().eye().heightM();
    }

    double groundDistance() {
        return lamp.position().groundDistanceTo(numbers.observer().eye());
    }

    static String m(double metres) {
        return written(metres, " m");
    }

    String result(Measure measure) {
        return withUnit(measure, numbers.get(measure));
    }

    String result(Measure measure, int look) {
        return withUnit(measure, numbers.get(measure, look));
    }

    /** Magnitudes and angles to a fixed number of decimals, all else to five figures. */
    static String withUnit(Measure measure, double value) {
        if (Double.isNaN(value)) {
            return "none";
        }

        Unit unit = measure.unit();
        String digits =
                unit.isLinear() ? QuantityFormat.significant(value, FIGURES).plain() : decimals(value, 4);
        String gap = unit == Unit.DEGREE ? "" : "\u00a0";
        return digits + gap + unit.symbol();
    }

    static String decimals(double value, int decimals) {
        return Double.isNaN(value)
                ? "none"
                : QuantityFormat.decimals(value, decimals).plain();
    }

    static String written(double value, String unit) {
        return QuantityFormat.atMost(value, FIGURES).plain() + unit.replace(' ', '\u00a0');
    }
}
