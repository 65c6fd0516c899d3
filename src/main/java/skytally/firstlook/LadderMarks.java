package skytally.firstlook;

import java.util.ArrayList;
import java.util.List;
import skytally.assessment.Assessment.Topic;
import skytally.charts.Ladder;
import skytally.figures.LadderPicture;
import skytally.notation.QuantityFormat;
import skytally.web.Switches.Units;

/** The lights of a sentence on the ladder, and the same hung another way. */
final class LadderMarks {

    private static final double FAINTEST_SHOWN_LX = 1e-10;

    private LadderMarks() {}

    static LadderPicture picture(Answer answer, Units units) {
        return LadderPicture.of("ladder", marks(answer), units);
    }

    private static List<LadderPicture.Said> marks(Answer answer) {
        int count = answer.sentence().count();
        String all = count == 1
                ? "This light"
                : "These " + QuantityFormat.decimals(count, 0).digits() + " lights";
        List<LadderPicture.Said> marks = new ArrayList<>();
        answer.figure("direct/illuminance").range().ifPresent(range -> {
            if (range.likely() > 0) {
                marks.add(new LadderPicture.Said(
                        new Ladder.Mark(
                                all, range.likely(), range.low(), range.high(), light(answer, range.likely()), false),
                        count == 1 ? all : all + " together"));
            }
        });
        double other = answer.otherFigure("direct/illuminance").likely();
        if (isWorthAMark(answer, other)) {
            double now = answer.figure("direct/illuminance").likely();
            Ladder.Line says = now > 0
                    ? new Ladder.Line(
                            QuantityFormat.significant(other, 2),
                            " lx, " + QuantityFormat.significant(other / now, 2).plain() + " times as much")
                    : light(answer, other);
            marks.add(new LadderPicture.Said(
                    new Ladder.Mark(otherName(answer), other, other, other, says, true), otherName(answer)));
        }
        return marks;
    }

    /** Not when it is next to nothing, nor when it would lie on the other mark. */
    private static boolean isWorthAMark(Answer answer, double other) {
        double now = answer.figure("direct/illuminance").likely();
        return other > FAINTEST_SHOWN_LX && (now == 0 || Math.abs(other / now - 1) > 0.02);
    }

    private static String otherName(Answer answer) {
        double usual = answer.sentence().shape().usualTiltDeg();
        return answer.otherTilt() == usual
                ? "The same, hung as described"
                : "The same, tilted "
                        + QuantityFormat.atMost(answer.otherTilt() - usual, 3).plain()
                        + (usual == 0 ? "° toward you" : "° further up");
    }

    /** With its magnitude, where it may be compared with stars. */
    private static Ladder.Line light(Answer answer, double lux) {
        boolean star = !answer.assessment().has(Topic.NOT_A_POINT)
                && !answer.assessment().has(Topic.BRIGHTER_THAN_MOON);
        return LadderPicture.line(lux, star);
    }
}
