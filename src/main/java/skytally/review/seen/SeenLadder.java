package skytally.review.seen;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import skytally.assessment.Assessment;
import skytally.assessment.Figure;
import skytally.charts.Ladder;
import skytally.figures.LadderPicture;
import skytally.review.Hour;
import skytally.review.Review;

/** The lights at one place on the ladder: the brightest single lamp, and all together early and late. */
final class SeenLadder {

    private static final double FAINTEST_SHOWN_LX = 1e-12;

    private SeenLadder() {}

    static LadderPicture of(Review review, String place) {
        List<LadderPicture.Said> marks = new ArrayList<>();
        Hour hour = review.asked().hour();
        add(marks, review, place, hour, "direct/one-lamp-illuminance", "The brightest single lamp", false);
        add(marks, review, place, hour, "direct/illuminance", "All together, " + hour.word(), false);
        Hour other = hour.other();
        add(marks, review, place, other, "direct/illuminance", "All together, " + other.word(), true);
        return LadderPicture.of("ladder", marks, review.asked().units());
    }

    private static void add(
            List<LadderPicture.Said> marks,
            Review review,
            String place,
            Hour hour,
            String measure,
            String name,
            boolean hollow) {
        Optional<Assessment> found = review.at(hour).assessment();
        found.flatMap(assessment -> assessment.find(place, measure))
                .flatMap(Figure::range)
                .filter(range -> range.likely() > FAINTEST_SHOWN_LX)
                .ifPresent(range -> {
                    boolean star = found.orElseThrow()
                            .likeness(found.orElseThrow().figure(place, measure))
                            .map(like -> !like.inMoons())
                            .orElse(true);
                    Ladder.Line line = LadderPicture.line(range.likely(), star);
                    marks.add(new LadderPicture.Said(
                            new Ladder.Mark(name, range.likely(), range.low(), range.high(), line, hollow), name));
                });
    }
}
