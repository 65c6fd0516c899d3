package skytally.project;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

@DisplayName("The outline of a site")
class OutlineTest {

    /** By hand: 700 ft × 590 ft = 413 000 sq ft; at 0.3048 m a foot that is 38 368.96 m², its middle at 350 and 295 ft. */
    @Test
    void hasTheAreaAndTheMiddleOfARectangleInFeet() {
        Outline outline = Outline.read("0,0; 700,0; 700,590; 0,590", "ft");
        assertThat(outline.corners()).hasSize(4);
        assertThat(outline.areaHa()).isCloseTo(413_000 * 0.3048 * 0.3048 / 10_000, within(1e-12));
        assertThat(outline.centroid().eastM()).isCloseTo(350 * 0.3048, within(1e-9));
        assertThat(outline.centroid().northM()).isCloseTo(295 * 0.3048, within(1e-9));
    }

    /**
     * By hand: an L of a square of 20 m and, on its north-west quarter, one of 10 m: 400 + 100 m², the middle at (400 × 10
     * + 100 × 5) / 500 = 9 m east and (400 × 10 + 100 × 25) / 500 = 13 m north. Far from the reference point, where sums
     * of large products would lose digits.
     */
    @Test
    void hasTheAreaAndTheMiddleOfACornerTypedEitherWayAround() {
        String ell = "500000 500000\n500020 500000\n500020 500020\n500010 500020\n500010 500030\n500000 500030";
        String other = "500000 500030\n500010 500030\n500010 500020\n500020 500020\n500020 500000\n500000 500000";
        for (String text : new String[] {ell, other, ell + "\n500000 500000\n"}) {
            Outline outline = Outline.read(text, "m");
            assertThat(outline.corners()).hasSize(6);
            assertThat(outline.areaHa()).isCloseTo(0.05, within(1e-12));
            assertThat(outline.centroid().eastM()).isCloseTo(500_009, within(1e-6));
            assertThat(outline.centroid().northM()).isCloseTo(500_013, within(1e-6));
        }
    }

    @ParameterizedTest(name = "{0}: {1}")
    @CsvSource(delimiter = '|', textBlock = """
            0 0; 10 0                      | A site has at least three corners, a line each; there are 2
            0 0; 10 0; 0 0                 | The edge from line 2 to line 3 crosses or touches the edge from line 1 to line 2. Put the corners in their turn around the site
            0 0; 10 0; east 10             | Line 3, “east 10”: write east and north, such as “700 590”
            0 0; 10 0 5; 10 10             | Line 2, “10 0 5”: write east and north, such as “700 590”
            0 0; 10 10; 10 0; 0 10         | The edge from line 3 to line 4 crosses or touches the edge from line 1 to line 2. Put the corners in their turn around the site
            0 0; 10 0; 10 10; 5 0; 0 10    | The edge from line 3 to line 4 crosses or touches the edge from line 1 to line 2. Put the corners in their turn around the site
            0 0; 10 0; 5 0; 5 10           | The edge from line 2 to line 3 crosses or touches the edge from line 1 to line 2. Put the corners in their turn around the site
            0 0; 10 0; 20 0                | The edge from line 3 to line 1 crosses or touches the edge from line 1 to line 2. Put the corners in their turn around the site
            0 0; 10 0; 10 0; 5 5           | The edge from line 2 to line 3 crosses or touches the edge from line 1 to line 2. Put the corners in their turn around the site
            0 0; 2000000 0; 0 9            | Line 2, “2000000 0”: a corner lies within 1000 km of the reference point
            """)
    void isRefusedWithTheLine(String text, String message) {
        assertThatThrownBy(() -> Outline.read(text, "m"))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage(message);
    }

    @Test
    void mayHaveCornersOnAStraightEdgeAndAThousandOfThem() {
        assertThat(Outline.read("0 0; 5 0; 10 0; 10 10", "m").areaHa()).isCloseTo(0.005, within(1e-12));
        StringBuilder round = new StringBuilder();
        for (int i = 0; i < 1000; i++) {
            double angle = 2 * Math.PI * i / 1000;
            round.append(100 * Math.cos(angle))
                    .append(' ')
                    .append(100 * Math.sin(angle))
                    .append('\n');
        }
        // A polygon of n corners on a circle has the area n/2 · r² · sin(2π/n).
        assertThat(Outline.read(round.toString(), "m").areaHa())
                .isCloseTo(500 * 100 * 100 * Math.sin(2 * Math.PI / 1000) / 10_000, within(1e-9));
        assertThatThrownBy(() -> Outline.read(round + "1 1", "m")).hasMessage("At most 1000 lines fit, not 1001");
    }
}
