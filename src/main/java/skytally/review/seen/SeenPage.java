package skytally.review.seen;

import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import skytally.assessment.Assessment;
import skytally.figures.LadderPicture;
import skytally.project.Place;
import skytally.review.Night;
import skytally.review.PlaceFrame;
import skytally.review.Review;
import skytally.review.TypeNames;
import skytally.scene.Observer;

/**
 * How one place is lit, as the page shows it.
 *
 * @param frame    what stands around the numbers
 * @param wildlife whether only light is given, and nothing judged
 * @param harms    the four, side by side
 * @param ladder   of light at the eye
 * @param view     from the place; nothing where no lamp sends light there
 * @param byType   light at the eye
 * @param who      causes what
 * @param edge     the worst point of the property line; nothing where the corners of the site are not known
 */
record SeenPage(
        PlaceFrame frame,
        boolean wildlife,
        List<HarmCards.Card> harms,
        LadderPicture ladder,
        @Nullable WindowPicture view,
        ByType byType,
        WhoCauses who,
        @Nullable EdgeOfSite edge) {

    /** Nothing where the place has no position or no lamp can be reckoned with. */
    static Optional<SeenPage> of(
            Review review,
            Place place,
            PlaceFrame frame,
            Optional<Night> present,
            Harm harm,
            HarmCards.Doors doors,
            WhoCauses.Address address) {
        Optional<Observer> observer = review.shown().observer(place.mark());
        Optional<Assessment> found = review.shown().assessment();
        if (observer.isEmpty() || found.isEmpty()) {
            return Optional.empty();
        }
        TypeNames names = TypeNames.of(review.project(), review.asked().scheme());
        HarmCards cards = new HarmCards(review, place, observer.get(), found.get(), present, doors);
        return Optional.of(new SeenPage(
                frame,
                cards.isOfWildlife(),
                cards.all(),
                SeenLadder.of(review, place.mark()),
                WindowPicture.of(review, place, observer.get(), names).orElse(null),
                ByType.of(review, place.mark(), names, doors),
                WhoCauses.of(review, place.mark(), harm, names, address),
                EdgeOfSite.of(review).orElse(null)));
    }
}
