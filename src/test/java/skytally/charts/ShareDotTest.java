package skytally.charts;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;

@DisplayName("A share as a dot")
class ShareDotTest {

    /** By hand: 15 units of radius are a hundred percent, and a quarter of the area is half the radius. */
    @Test
    void hasTheShareForItsArea() {
        assertThat(ShareDot.svg(100)).contains("r=\"15\"");
        assertThat(ShareDot.svg(25)).contains("r=\"7.5\"");
        assertThat(ShareDot.svg(1)).contains("r=\"1.5\"");
        assertThat(ShareDot.svg(0.0001)).contains("r=\"0.9\"");
    }

    @Test
    void isWrittenInWholePercentsAndTenthsUnderTen() {
        assertThat(ShareDot.percent(96.4)).isEqualTo("96");
        assertThat(ShareDot.percent(9.94)).isEqualTo("9.9");
        assertThat(ShareDot.percent(9.96)).isEqualTo("10");
        assertThat(ShareDot.percent(0.04)).isEqualTo("<0.1");
    }
}
