package skytally.spectrum;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.function.DoubleUnaryOperator;
import java.util.stream.Stream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import skytally.Checks;

@DisplayName("Passbands and blackbodies against independent values")
class PassbandReferenceTest {

    private static final String CHECKS = "spectrum-checks.csv";

    /** First radiation constant for spectral radiance, 2 h c², W m² sr⁻¹ (CODATA 2018). */
    private static final double C1L = 1.191042972e-16;

    /** Stefan-Boltzmann constant, W m⁻² K⁻⁴ (CODATA 2018). */
    private static final double STEFAN_BOLTZMANN = 5.670374419e-8;

    /** CIE 1924 and 1951 observers at points of the table; 507 nm lies between two (1 nm tables: 0.4443, 1.000). */
    @ParameterizedTest(name = "{0} nm")
    @CsvSource(textBlock = """
            450, 0.038, 0.455
            507, 0.4443, 0.9999
            555, 1.000, 0.402
            600, 0.631, 0.03315
            650, 0.107, 0.000677
            379.9, 0, 0
            780.1, 0, 0
            """)
    void agreesWithTheCieTables(double wavelengthNm, double photopic, double scotopic) {
        assertThat(Passband.PHOTOPIC.at(wavelengthNm)).isCloseTo(photopic, within(1.5e-4));
        assertThat(Passband.SCOTOPIC.at(wavelengthNm)).isCloseTo(scotopic, within(1.5e-4));
    }

    @Test
    void johnsonVPeaksAt530() {
        assertThat(Passband.JOHNSON_V.at(530)).isEqualTo(1);
        assertThat(Passband.JOHNSON_B.at(420)).isEqualTo(1);
        assertThat(Passband.JOHNSON_R.at(800)).isEqualTo(0.14);
        assertThat(Passband.JOHNSON_V.at(505)).isCloseTo((0.458 + 0.78) / 2, within(1e-12));
    }

    @Test
    void refusesAWavelengthThatIsNoNumber() {
        assertThatThrownBy(() -> Passband.PHOTOPIC.at(Double.NaN)).isInstanceOf(IllegalArgumentException.class);
    }

    @Test
    void integralsOfTheObservers() {
        Checks.row(CHECKS, "Z09").isMatchedBy(Passband.PHOTOPIC.integralNm());
        Checks.row(CHECKS, "Z10").isMatchedBy(Passband.SCOTOPIC.integralNm());
    }

    /** 3631 Jy at every frequency: F_λ = F_ν c / λ². */
    @Test
    void flatInFrequency() {
        Checks.row(CHECKS, "Z07")
                .isMatchedBy(lux(wavelengthNm -> 3631e-26 * 2.99792458e17 / (wavelengthNm * wavelengthNm)));
    }

    @Test
    void flatInWavelength() {
        Checks.row(CHECKS, "Z08").isMatchedBy(lux(wavelengthNm -> 3.63e-11));
    }

    @Test
    void oneColour() {
        Checks.row(CHECKS, "W01").isMatchedBy(Spectrum.ofLine(555).luminousEfficacyLmPerW());
        Checks.row(CHECKS, "W02").isMatchedBy(10 * Spectrum.ofLine(555).luminousEfficacyLmPerW());
    }

    /** The peak of V′ lies at 507 nm, between two points of the table: 1700 by definition, which the cubic misses by 0.014 %. */
    @Test
    void scotopicPeak() {
        assertThat(Spectrum.ofLine(507).scotopicEfficacyLmPerW())
                .isCloseTo(Checks.row(CHECKS, "W03").expectedValue(), within(0.0002 * 1700));
    }

    @Test
    void equalEnergy() {
        Spectrum equal = Spectrum.ofContinuum(wavelengthNm -> 1);
        Checks.row(CHECKS, "W07").isMatchedBy(equal.luminousEfficacyLmPerW());
        Checks.row(CHECKS, "W08").isMatchedBy(equal.scotopicPhotopicRatio());
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("blackbodies")
    void blackbody(Checks.Row row) {
        double temperatureK = row.input("T");
        Spectrum blackbody = Spectrum.ofBlackbody(temperatureK);
        row.isMatchedBy(
                switch (row.id().substring(row.id().lastIndexOf('-') + 1)) {
                    case "SP" -> blackbody.scotopicPhotopicRatio();
                    case "LER" -> blackbody.luminousEfficacyLmPerW();
                    case "eff" -> Math.PI * luminance(temperatureK) / (STEFAN_BOLTZMANN * Math.pow(temperatureK, 4));
                    case "Pt" -> luminance(temperatureK);
                    default -> throw new AssertionError("No such quantity: " + row.id());
                });
    }

    static Stream<Checks.Row> blackbodies() {
        return Checks.of(CHECKS, "B-");
    }

    /** cd/m² of a blackbody: 683 ∫ L_λ V dλ with Planck's radiance in W m⁻² sr⁻¹ nm⁻¹. */
    private static double luminance(double temperatureK) {
        return lux(wavelengthNm -> 1e-9
                * C1L
                / Math.pow(wavelengthNm * 1e-9, 5)
                / Math.expm1(Component.Planck.C2_NM_K / (wavelengthNm * temperatureK)));
    }

    private static double lux(DoubleUnaryOperator densityPerNm) {
        double sum = 0;
        for (double wavelengthNm = 380; wavelengthNm < 780; wavelengthNm += 0.5) {
            sum += 0.5 * densityPerNm.applyAsDouble(wavelengthNm) * Passband.PHOTOPIC.at(wavelengthNm);
        }
        return Spectrum.CIE_KM_LM_PER_W * sum;
    }
}
