package skytally.assessment;

import java.util.ArrayList;
import java.util.List;
import skytally.assessment.Assessment.Note;
import skytally.assessment.Assessment.Topic;
import skytally.notation.QuantityFormat;

/** What limits the results of a scene, in sentences. */
final class Notes {

    private static final double POINT_ARCMIN = 1;
    private static final double GROUND_IS_A_POINT_M = 300;
    private static final double FAR_SKY_M = 10_000;
    private static final double RODS_FROM_MAG = 4;

    private final List<Note> notes = new ArrayList<>();
    private String place = "";

    Notes(List<PlaceNumbers> places) {
        places.forEach(this::of);
        place = "";
        if (places.stream().anyMatch(Notes::lacksReading)) {
            add(
                    Topic.NO_READING,
                    "No reading of the sky is entered. The sky as it is is taken as the natural sky with the lamps that"
                            + " are entered as there now, which is an assumption: where other lights brighten it, the"
                            + " increase over it is less than shown.");
        }
        add(
                Topic.FIRST_SCATTERING,
                "Sky glow counts light scattered once only. More scattering adds to it, by about 15 % overhead at 1 km"
                        + " and as much again at 25 km, so read every sky number as \"at least\"."
                        + " Air, emission and ground leave any such method uncertain by 30 to 50 %, beside the ranges shown.");
    }

    List<Note> all() {
        return List.copyOf(notes);
    }

    private static boolean lacksReading(PlaceNumbers numbers) {
        return numbers.scene()
                .present()
                .map(present -> present.zenithMagArcsec2().isEmpty())
                .orElse(false);
    }

    private void of(PlaceNumbers numbers) {
        place = numbers.observer().mark();
        double distance = numbers.get(Measure.DISTANCE);
        if (!numbers.path().clearsTheHorizon()) {
            add(
                    Topic.BELOW_HORIZON,
                    "The lights stand below the horizon: the curve of the Earth hides them, and no direct light reaches"
                            + " the eye by this data. Light still arrives from the sky.");
        } else if (numbers.scene().allLamps().stream()
                .allMatch(lamp -> lamp.allFlux().lumens() == 0)) {
            add(Topic.NO_LIGHT_AT_ALL, "No light leaves these lamps by this data.");
        } else if (numbers.get(Measure.ILLUMINANCE) == 0) {
            add(
                    Topic.NO_DIRECT_LIGHT,
                    "No direct light reaches here by this data; light still arrives from the ground and the sky.");
        }
        if (numbers.hidden() > 0) {
            add(
                    Topic.HIDDEN_BY_GROUND,
                    (numbers.hidden() == 1 ? "One position is" : numbers.hidden() + " positions are")
                            + " hidden behind the ground heights entered, and counted for nothing here but the sky.");
        }
        if (distance < numbers.brightest().nearestM()) {
            add(
                    Topic.TOO_NEAR,
                    "Nearer than "
                            + QuantityFormat.significant(numbers.brightest().nearestM(), 2)
                                    .plain()
                            + "\u00a0m, five times the bright part (ten for narrow beams), the inverse-square law"
                            + " overstates the light.");
        }
        size(numbers);
        if (ground(numbers) < GROUND_IS_A_POINT_M) {
            add(
                    Topic.GROUND_NOT_A_POINT,
                    "Nearer than 300 m the lit ground is no longer a point: the sky numbers are indicative.");
        }
        if (ground(numbers) > FAR_SKY_M) {
            add(
                    Topic.FAR_SKY,
                    "At this distance the haze decides: compare very clear, clear and hazy air before quoting one.");
        }
    }

    private void size(PlaceNumbers numbers) {
        double size = numbers.get(Measure.ANGULAR_SIZE);
        double one = numbers.get(Measure.ONE_ILLUMINANCE);
        String arcminutes = QuantityFormat.significant(size, 2).plain() + "\u00a0arcminutes";
        if (!(one > 0)) {
            return;
        }
        if (size >= PlaceNumbers.WIDEST_STAR_ARCMIN) {
            add(
                    Topic.NOT_A_POINT,
                    "One lamp's bright part, " + across(numbers) + " is " + arcminutes
                            + " wide, so it is no point and no star is compared with it.");
        } else if (size >= POINT_ARCMIN) {
            add(
                    Topic.SMALL_PATCH,
                    "One lamp's bright part, " + across(numbers) + " is " + arcminutes
                            + " wide: a small patch, with the magnitude of its total light.");
        }
        if (one >= PlaceNumbers.fullMoonLx()) {
            add(
                    Topic.BRIGHTER_THAN_MOON,
                    "One lamp gives more light than the full Moon, so no star is compared with it.");
        }
        if (numbers.get(Measure.ONE_MAGNITUDE) > RODS_FROM_MAG) {
            add(
                    Topic.FAINT,
                    "Fainter than about magnitude 4 the eye sees with its rods: by day vision the number is as given,"
                            + " to the dark-adapted eye "
                            + QuantityFormat.decimals(numbers.get(Measure.SCOTOPIC_MAGNITUDE), 1)
                                    .plain() + ".");
        }
    }

    /** The size of the bright part is usual for the kind of fitting, and no blank of anybody's. */
    private static String across(PlaceNumbers numbers) {
        return "taken as "
                + QuantityFormat.atMost(numbers.brightest().luminousSizeM(), 2).plain() + "\u00a0m across,";
    }

    private static double ground(PlaceNumbers numbers) {
        return numbers.brightest()
                .position()
                .groundDistanceTo(numbers.observer().eye());
    }

    private void add(Topic topic, String sentence) {
        notes.add(new Note(topic, place, sentence));
    }
}
