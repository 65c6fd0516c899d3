package skytally.geometry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

@DisplayName("How a luminaire hangs")
class AttitudeTest {

    @ParameterizedTest(name = "bearing {0}°, tilt {1}°: nadir axis to ({2}, {3}, {4})")
    @CsvSource({
        "0, 0, 0, 0, -1",
        "0, 90, 0, 1, 0",
        "90, 90, 1, 0, 0",
        "180, 90, 0, -1, 0",
        "90, 180, 0, 0, 1",
        "270, 45, -0.7071067812, 0, -0.7071067812",
    })
    void tiltLeansTheNadirAxisTowardTheBearing(double bearing, double tilt, double x, double y, double z) {
        Direction axis = new Attitude(bearing, tilt, 0).rotation().turn(Direction.DOWN);
        assertThat(axis.x()).isCloseTo(x, within(1e-9));
        assertThat(axis.y()).isCloseTo(y, within(1e-9));
        assertThat(axis.z()).isCloseTo(z, within(1e-9));
    }

    @Test
    void theStreetSideLooksAlongTheBearing() {
        Direction street = new Attitude(123, 0, 0).rotation().turn(new Direction(1, 0, 0));
        assertThat(street.angleTo(Direction.toward(Math.toRadians(123), 0))).isCloseTo(0, within(1e-9));
    }

    @Test
    void aPositiveRollRaisesTheLeftSide() {
        assertThat(new Attitude(40, 0, 10)
                        .rotation()
                        .turn(new Direction(0, 1, 0))
                        .z())
                .isCloseTo(Math.sin(Math.toRadians(10)), within(1e-12));
    }

    /** There and back, over a grid of attitudes and directions; a turn keeps lengths and angles. */
    @Test
    void turningBackUndoesTheTurn() {
        Direction first = Direction.of(0.3, -0.5, 0.8);
        Direction second = Direction.of(-0.9, 0.1, 0.2);
        for (double bearing = -360; bearing <= 360; bearing += 45) {
            for (double tilt = 0; tilt <= 180; tilt += 22.5) {
                for (double roll = -180; roll <= 180; roll += 30) {
                    Rotation hang = new Attitude(bearing, tilt, roll).rotation();
                    assertThat(hang.turnBack(hang.turn(first)).angleTo(first)).isCloseTo(0, within(1e-14));
                    assertThat(hang.turn(hang.turnBack(second)).angleTo(second)).isCloseTo(0, within(1e-14));
                    assertThat(hang.turn(first).angleTo(hang.turn(second)))
                            .isCloseTo(first.angleTo(second), within(1e-14));
                }
            }
        }
    }

    @Test
    void aFullTurnOfTheBearingChangesNothing() {
        Direction any = Direction.of(0.3, -0.5, 0.8);
        assertThat(new Attitude(-90, 40, 10)
                        .rotation()
                        .turn(any)
                        .angleTo(new Attitude(270, 40, 10).rotation().turn(any)))
                .isCloseTo(0, within(1e-14));
    }

    @Test
    void refusesWhatIsNoAttitude() {
        assertThatThrownBy(() -> new Attitude(0, -1, 0)).hasMessageContaining("Tilt must be 0 to 180");
        assertThatThrownBy(() -> new Attitude(0, Double.NaN, 0)).hasMessageContaining("Tilt");
        assertThatThrownBy(() -> new Direction(1, 1, 0)).hasMessageContaining("length 1");
    }
}
