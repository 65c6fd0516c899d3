package skytally.project.hours;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.time.LocalTime;
import java.util.Optional;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

@DisplayName("Hours row by row")
class HoursTest {

    @ParameterizedTest(name = "{0} is {1}")
    @CsvSource(delimiter = '|', textBlock = """
            dusk 23:00 100%                                  | dusk 23:00 100%
            Dusk to 23:00   100 %                            | dusk 23:00 100%
            16:00-22:00 100% mon-sat                         | 16:00 22:00 100% Mon-Sat
            16:00 – 22:00 33.50% Mon,Wed,fri-sat             | 16:00 22:00 33.5% Mon,Wed,Fri-Sat
            dusk midnight 0%                                 | dusk 24:00 0%
            6:00 0:00 100%                                   | 06:00 24:00 100%
            midnight dawn 30%                                | 00:00 dawn 30%
            24:00 6:30 30% season oct-mar                    | 00:00 06:30 30% season Oct-Mar
            23:00 dawn 30% season Dec Sun                    | 23:00 dawn 30% Sun season Dec
            dusk dawn sensed idle 25% active 100% duty 10%   | dusk dawn sensed idle 25% active 100% duty 10%
            dusk dawn sensed idle 0 % active 100 % Mon-Fri   | dusk dawn sensed idle 0% active 100% Mon-Fri
            """)
    void haveOneForm(String typed, String written) {
        Hours hours = Hours.read(typed);
        assertThat(hours.written()).isEqualTo(written);
        assertThat(Hours.read(hours.written())).isEqualTo(hours);
    }

    @ParameterizedTest(name = "{0}: {1}")
    @CsvSource(delimiter = '|', textBlock = """
            dusk 23:00                          | Line 1, “dusk 23:00”: a level is a share of full output from 0% to 100%, or “sensed idle 25% active 100%”
            dusk 23:00 100%; 23:00 noon 30%     | Line 2, “23:00 noon 30%”: begin with two times, each dusk, dawn or one such as 23:00
            dusk 25:00 100%                     | Line 1, “dusk 25:00 100%”: “25:00” is no time of day; write it as in 23:00
            dusk 24:30 100%                     | Line 1, “dusk 24:30 100%”: “24:30” is no time of day; write it as in 23:00
            dawn dusk 100%                      | Line 1, “dawn dusk 100%”: a row begins at dusk or at a time such as 23:00, not at dawn
            16:00 dusk 100%                     | Line 1, “16:00 dusk 100%”: a row ends at dawn or at a time such as 23:00, not at dusk
            22:00 22:00 100%                    | Line 1, “22:00 22:00 100%”: the row begins when it ends
            dusk 23:00 130%                     | Line 1, “dusk 23:00 130%”: a level is a share of full output from 0% to 100%, or “sensed idle 25% active 100%”
            dusk 23:00 0.3                      | Line 1, “dusk 23:00 0.3”: a level is a share of full output from 0% to 100%, or “sensed idle 25% active 100%”
            dusk dawn sensed active 100%        | Line 1, “dusk dawn sensed active 100%”: after “sensed” write both levels, such as “idle 25% active 100%”
            dusk dawn sensed idle 50% active 20% | Line 1, “dusk dawn sensed idle 50% active 20%”: the idle level is above the active one; put them the other way about
            dusk dawn 100% weekdays             | Line 1, “dusk dawn 100% weekdays”: days are written as in Mon-Sat or Mon,Wed,Fri
            dusk dawn 100% Mon Tue              | Line 1, “dusk dawn 100% Mon Tue”: “tue” is one word too many
            dusk dawn 100% season winter        | Line 1, “dusk dawn 100% season winter”: a season is written as in “season Oct-Mar”
            """)
    void areRefusedWithTheLine(String typed, String message) {
        assertThatThrownBy(() -> Hours.read(typed))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage(message);
    }

    @Test
    void haveARow() {
        assertThatThrownBy(() -> Hours.read(" \n;"))
                .hasMessage("A schedule has at least one row, such as “dusk 23:00 100%”");
    }

    /** By hand, on the clock: the night runs from 16:00 to 08:00, what is before the curfew is early, the rest late. */
    @ParameterizedTest(name = "{0}, curfew {1}: {2} before, {3} after")
    @CsvSource(delimiter = '|', textBlock = """
            dusk 23:00 100%; 23:00 dawn 30%          | 23:00 | 100  | 30
            dusk 23:00 100%; 23:00 dawn 30%          | 22:00 | 100  | 100
            dusk 23:00 100%; 23:00 dawn 30%          | 23:30 | 100  | 30
            dusk 21:30 100%                          | 22:00 | 100  | 0
            dusk 22:30 100%                          | 22:00 | 100  | 100
            16:00 22:00 100% Mon-Sat                 | 22:00 | 100  | 0
            12:00 15:30 100%                         | 22:00 | 0    | 0
            06:00 23:00 100%                         | 23:00 | 100  | 100
            08:00 23:00 100%                         | 23:00 | 100  | 0
            06:00 24:00 80%                          | 23:00 | 80   | 80
            23:30 05:00 60%                          | 23:00 | 0    | 60
            dusk dawn sensed idle 25% active 100%    | 22:00 | 100  | 100
            dusk dawn 20%; 21:00 22:30 70% season Jun | 22:00 | 70   | 70
            dusk dawn 100%                           | 12:30 | none | 100
            dusk dawn 100%                           | 08:30 | 100  | none
            dusk 01:00 100%                          | 00:30 | 100  | 100
            dusk 01:00 100%                          | 01:00 | 100  | 0
            """)
    void giveTheWorstMomentBeforeAndAfterTheCurfew(String rows, String curfew, String early, String late) {
        Hours hours = Hours.read(rows);
        assertThat(percent(hours.early(LocalTime.parse(curfew)))).isEqualTo(early);
        assertThat(percent(hours.late(LocalTime.parse(curfew)))).isEqualTo(late);
    }

    private static String percent(Optional<Hours.Worst> worst) {
        return worst.map(one -> one.percent().toPlainString()).orElse("none");
    }
}
