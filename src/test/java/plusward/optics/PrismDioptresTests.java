package plusward.optics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class PrismDioptresTests {

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            turn Δ | angle ° | source
            20     | 11.310  | definition Δ = 100 tan θ
            100    | 45      | definition: tan 45 = 1
            0      | 0       | definition
            -20    | -11.310 | outward is negative
            """)
    void angleOfATurn(double turn, double angle, String source) {
        assertThat(PrismDioptres.of(turn).toAngle().inDegrees()).as(source).isEqualTo(angle, within(5e-4));
        assertThat(PrismDioptres.ofAngle(PrismDioptres.of(turn).toAngle()).inPrismDioptres())
                .as(source)
                .isEqualTo(turn, within(1e-6));
    }

    @ParameterizedTest
    @ValueSource(doubles = {90, -90, 90.1, 180})
    void noPrismTurnsByARightAngle(double degrees) {
        assertThatIllegalArgumentException().isThrownBy(() -> PrismDioptres.ofAngle(Degrees.of(degrees)));
    }

    @ParameterizedTest
    @ValueSource(doubles = {89.9, -89.9})
    void justUnderARightAngleStillHasAPrism(double degrees) {
        // 100 tan 89.9 = 57 296
        assertThat(PrismDioptres.ofAngle(Degrees.of(degrees)).size().inPrismDioptres())
                .isEqualTo(57_295.7, within(0.1));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            one Δ | other Δ | together Δ | source
            20    | 20      | 41.67      | (a+b)/(1 − ab/10⁴) = 40/0.96; split, not stacked: Thompson, Guyton, Ophthalmology 1983;90:204
            30    | 30      | 65.93      | 60/0.91
            40    | 5       | 45.92      | 45/0.98
            30    | 25      | 59.46      | 55/0.925
            30    | 0       | 30         | one prism alone
            """)
    void prismsBeforeBothEyesAddAsAngles(double one, double other, double together, String source) {
        PrismDioptres a = PrismDioptres.of(one);
        PrismDioptres b = PrismDioptres.of(other);
        assertThat(a.withPrismBeforeOtherEye(b).inPrismDioptres()).as(source).isEqualTo(together, within(0.005));
        assertThat(b.withPrismBeforeOtherEye(a)).as(source).isEqualTo(a.withPrismBeforeOtherEye(b));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            turn Δ | printed | source
            25     | 25      | whole
            41.67  | 41.7    | one decimal
            12.5   | 12.5    | one decimal
            -8     | -8      | outward
            99.96  | 100     | rounds up to a whole number
            """)
    void printsADecimalOnlyWhereThereIsOne(double turn, String printed, String source) {
        assertThat(PrismDioptres.of(turn)).as(source).hasToString(printed);
    }
}
