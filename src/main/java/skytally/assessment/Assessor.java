package skytally.assessment;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import skytally.geometry.Position;
import skytally.scene.Look;
import skytally.scene.Observer;
import skytally.scene.OpenScene;
import skytally.scene.OpenScene.End;
import skytally.scene.Scene;

/**
 * Works out everything a scene gives at every place, and how far its guesses may move it.
 *
 * <p>A range goes from the least to the most that a figure becomes with every guess at whichever end of its range
 * lowers or raises that figure: the outer bounds, wider than chance would make them.
 */
public final class Assessor {

    private final Circumstance circumstance;

    public Assessor(Circumstance circumstance) {
        this.circumstance = circumstance;
    }

    /** Assesses an open scene, likely values first. */
    public Assessment assess(OpenScene open) {
        return assess(open, Scope.ALL);
    }

    /** The same for a part of it. */
    public Assessment assess(OpenScene open, Scope scope) {
        return new Run(open, scope).assessment();
    }

    /** One number of one place, by its measure and its direction; −1 for the place as a whole. */
    private record Slot(int place, int look, Measure measure) {}

    private final class Run {

        private final OpenScene open;
        private final Scope scope;
        private final Map<Map<String, End>, List<PlaceNumbers>> drawn = new HashMap<>();
        private final List<PlaceNumbers> likely;

        Run(OpenScene open, Scope scope) {
            this.open = open;
            this.scope = scope;
            this.likely = at(Map.of());
        }

        private List<PlaceNumbers> at(Map<String, End> ends) {
            return drawn.computeIfAbsent(ends, key -> places(open.drawn(key)));
        }

        /** Place by place on all processors; each is worked out by itself, so their order changes nothing. */
        private List<PlaceNumbers> places(Scene scene) {
            SceneLights lights = new SceneLights(scene);
            List<Observer> observers = new ArrayList<>(scene.observers());
            if (scope.isWanted(Assessment.PROPERTY_LINE)) {
                PropertyLine.of(scene).worstPoint(lights.direct()).ifPresent(observers::add);
            }
            observers.removeIf(observer -> !scope.isWanted(observer.mark()));
            return observers.parallelStream()
                    .map(observer -> {
                        PlaceNumbers numbers = new PlaceNumbers(lights, observer);
                        contributions(numbers); // here, while there are several processors for it
                        return numbers;
                    })
                    .toList();
        }

        private List<Contribution> contributions(PlaceNumbers place) {
            return scope.isInFull(place.observer().mark())
                    ? place.contributions()
                    : place.shares(scope.others() == Scope.Others.DIRECT_AND_OVERHEAD);
        }

        Assessment assessment() {
            Map<String, Figure> figures = new LinkedHashMap<>();
            List<Influence> influences = new ArrayList<>();
            for (Slot slot : slots()) {
                Figure figure = figure(slot, influences);
                figures.put(figure.key(), figure);
            }
            Map<String, Position> eyes = new LinkedHashMap<>();
            likely.forEach(
                    place -> eyes.put(place.observer().mark(), place.observer().eye()));
            return new Assessment(
                    circumstance,
                    figures,
                    likenesses(),
                    likely.stream()
                            .flatMap(place -> contributions(place).stream())
                            .toList(),
                    eyes,
                    influences,
                    new Notes(likely).all());
        }

        private Map<String, Likeness> likenesses() {
            Map<String, Likeness> likenesses = new HashMap<>();
            for (PlaceNumbers place : likely) {
                for (Measure measure : List.of(Measure.ONE_ILLUMINANCE, Measure.ILLUMINANCE)) {
                    String key = Assessment.key(place.observer().mark(), measure.path(), circumstance);
                    place.likeness(place.get(measure)).ifPresent(likeness -> likenesses.put(key, likeness));
                }
            }
            return likenesses;
        }

        private List<Slot> slots() {
            List<Slot> slots = new ArrayList<>();
            for (int place = 0; place < likely.size(); place++) {
                if (!scope.isInFull(likely.get(place).observer().mark())) {
                    continue;
                }
                for (Measure measure : Measure.values()) {
                    if (measure.isOf(likely.get(place).observer())) {
                        slots.add(new Slot(place, -1, measure));
                    }
                }
                List<Look> looks = likely.get(place).looks();
                boolean presentKnown = likely.get(place).scene().present().isPresent();
                for (int look = 0; look < looks.size(); look++) {
                    for (Measure measure : Measure.values()) {
                        if (measure.isOf(looks.get(look), presentKnown)) {
                            slots.add(new Slot(place, look, measure));
                        }
                    }
                }
            }
            return slots;
        }

        private double value(Slot slot, Map<String, End> ends) {
            PlaceNumbers numbers = at(ends).get(slot.place());
            return slot.look() < 0 ? numbers.get(slot.measure()) : numbers.get(slot.measure(), slot.look());
        }

        private Figure figure(Slot slot, List<Influence> influences) {
            PlaceNumbers numbers = likely.get(slot.place());
            Measure measure = slot.measure();
            String path = slot.look() < 0
                    ? measure.path()
                    : measure.path(numbers.looks().get(slot.look()));
            String key = Assessment.key(numbers.observer().mark(), path, circumstance);
            Workings workings = new Workings(numbers, open);
            Working working = slot.look() < 0 ? workings.of(measure) : workings.of(measure, slot.look());
            return new Figure(key, measure.title(), measure.unit(), range(slot, key, influences), working);
        }

        private Optional<Range> range(Slot slot, String key, List<Influence> influences) {
            double middle = value(slot, Map.of());
            Map<String, End> lowering = new HashMap<>();
            Map<String, End> raising = new HashMap<>();
            double low = middle;
            double high = middle;
            for (String guess : open.guesses()) {
                double atLow = value(slot, Map.of(guess, End.LOW));
                double atHigh = value(slot, Map.of(guess, End.HIGH));
                influences.add(
                        new Influence(guess, key, atLow, atHigh, strength(slot.measure(), middle, atLow, atHigh)));
                lowering.putAll(endThat(guess, middle, atLow, atHigh, -1));
                raising.putAll(endThat(guess, middle, atLow, atHigh, 1));
                low = least(low, least(atLow, atHigh));
                high = most(high, most(atLow, atHigh));
            }
            if (Double.isNaN(middle)) {
                return Optional.empty();
            }
            low = least(low, value(slot, lowering));
            high = most(high, value(slot, raising));
            return Optional.of(new Range(low, middle, high));
        }

        /** The end of a guess that moves a figure down (sign −1) or up (sign 1), if either does. */
        private static Map<String, End> endThat(String guess, double middle, double atLow, double atHigh, int sign) {
            double gainLow = sign * (atLow - middle);
            double gainHigh = sign * (atHigh - middle);
            if (gainLow > 0 && !(gainHigh > gainLow)) {
                return Map.of(guess, End.LOW);
            }
            return gainHigh > 0 ? Map.of(guess, End.HIGH) : Map.of();
        }

        private static double strength(Measure measure, double middle, double atLow, double atHigh) {
            double least = least(middle, least(atLow, atHigh));
            double most = most(middle, most(atLow, atHigh));
            if (Double.isNaN(least) || most == least) {
                return 0;
            }
            if (!measure.unit().isLinear()) {
                return most - least;
            }
            return least > 0 ? 2.5 * StrictMath.log10(most / least) : Double.POSITIVE_INFINITY;
        }

        private static double least(double a, double b) {
            return Double.isNaN(a) ? b : Double.isNaN(b) ? a : Math.min(a, b);
        }

        private static double most(double a, double b) {
            return Double.isNaN(a) ? b : Double.isNaN(b) ? a : Math.max(a, b);
        }
    }
}
