package skytally.assessment;

import java.util.Optional;

/**
 * The sky in one direction before and after, for a table: the figures of an assessment and the differences between
 * them, taken before rounding.
 *
 * @param natural        the natural sky, mag/arcsec²
 * @param present        the sky as it is, mag/arcsec²; nothing without a reading
 * @param with           with the lights, mag/arcsec²
 * @param brighterByMag  from the sky as it is where that is known, else from the natural one
 * @param withCdM2       with the lights, photopic
 * @param overNatural    percent
 * @param overPresent    percent; nothing without a reading
 */
public record SkyLine(
        Figure natural,
        Optional<Figure> present,
        Figure with,
        double brighterByMag,
        double withCdM2,
        Figure overNatural,
        Optional<Figure> overPresent) {

    /** One direction looked in from one place. */
    public static SkyLine of(Assessment assessment, String place, String look) {
        Figure natural = assessment.figure(place, look + "/sky/natural-brightness");
        Optional<Figure> present = valued(assessment, place, look + "/sky/present-brightness");
        Figure with = assessment.figure(place, look + "/sky/brightness");
        return new SkyLine(
                natural,
                present,
                with,
                present.orElse(natural).likely() - with.likely(),
                valued(assessment, place, look + "/sky/luminance")
                        .map(Figure::likely)
                        .orElseGet(() ->
                                assessment.figure(place, look + "/sky/natural").likely()
                                        + assessment
                                                .figure(place, look + "/sky/artificial")
                                                .likely()),
                assessment.figure(place, look + "/sky/increase"),
                valued(assessment, place, look + "/sky/increase-over-present"));
    }

    private static Optional<Figure> valued(Assessment assessment, String place, String measure) {
        return assessment.find(place, measure).filter(figure -> figure.range().isPresent());
    }
}
