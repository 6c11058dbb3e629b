package plusward.optics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import java.util.List;
import java.util.function.DoubleFunction;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class QuantityTests {

    /** One row for each quantity of this package: how it is made, its unit, and how 1.26 and what rounds to 0 print. */
    static Stream<Arguments> everyKind() {
        return Stream.of(
                kind(Dioptres::of, "D", "+1.26", "-1.26", "0.00"),
                kind(PrismDioptres::of, "Δ", "1.3", "-1.3", "0"),
                kind(Millimetres::of, "mm", "+1.26", "-1.26", "0.0"),
                kind(Degrees::of, "°", "1.3", "-1.3", "0.0"),
                kind(LogMar::of, "logMAR", "1.26", "-1.26", "0.00"),
                kind(PrismPerDioptre::of, "Δ/D", "1.3", "-1.3", "0.0"),
                kind(Age::of, "y", "1.3", "-1.3", "0.0"));
    }

    private static Arguments kind(DoubleFunction<Quantity<?>> of, String unit, String... printed) {
        return Arguments.of(of, unit, List.of(printed));
    }

    @ParameterizedTest(name = "{1}")
    @MethodSource("everyKind")
    void printsRoundedAndNeverAsMinusZero(DoubleFunction<Quantity<?>> of, String unit, List<String> printed) {
        assertThat(Stream.of(1.26, -1.26, 0.0, -0.0, -0.004, 0.004)
                        .map(amount -> of.apply(amount).toString()))
                .containsExactly(
                        printed.get(0), printed.get(1), printed.get(2), printed.get(2), printed.get(2), printed.get(2));
        assertThat(of.apply(1).unit()).isEqualTo(unit);
    }

    @ParameterizedTest(name = "{1}")
    @MethodSource("everyKind")
    void countsInItsOwnUnit(DoubleFunction<Quantity<?>> of, String unit, List<String> printed) {
        assertThat(of.apply(1.26).amount()).isEqualTo(1.26);
        assertThat(of.apply(-0.0)).as("one zero").isEqualTo(of.apply(0.0));
        assertThatIllegalArgumentException().isThrownBy(() -> of.apply(Double.NaN));
        assertThat(of.apply(2).withAmount(-3)).isEqualTo(of.apply(-3));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            a D   | b D   | a + b  | a - b  | source
            5.13  | 5.00  | 10.13  | 0.13   | decimal arithmetic
            0.1   | 0.2   | 0.3    | -0.1   | decimal arithmetic
            -2.25 | 1.50  | -0.75  | -3.75  | decimal arithmetic
            1     | -1    | 0      | 2      | decimal arithmetic
            """)
    void addsAndSubtractsAsAPersonWould(double a, double b, double sum, double difference, String source) {
        assertThat(Dioptres.of(a).plus(Dioptres.of(b))).as(source).isEqualTo(Dioptres.of(sum));
        assertThat(Dioptres.of(a).minus(Dioptres.of(b))).as(source).isEqualTo(Dioptres.of(difference));
    }

    @Test
    void timesMinusOneTurnsTheSignAndLeavesZeroAlone() {
        assertThat(PrismDioptres.of(8).times(-1)).isEqualTo(PrismDioptres.of(-8));
        assertThat(PrismDioptres.ZERO.times(-1)).isEqualTo(PrismDioptres.ZERO);
    }

    @Test
    void sizeHasNoSign() {
        assertThat(PrismDioptres.of(-8).size()).isEqualTo(PrismDioptres.of(8));
        assertThat(PrismDioptres.of(8).size()).isEqualTo(PrismDioptres.of(8));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            a Δ   | b Δ | over  | under | source
            9.99  | 10  | false | true  | just below
            10    | 10  | false | false | at the limit
            10.01 | 10  | true  | false | just above
            -11   | 10  | false | true  | signs count
            """)
    void overAndUnderAreStrict(double a, double b, boolean over, boolean under, String source) {
        assertThat(PrismDioptres.of(a).isOver(PrismDioptres.of(b))).as(source).isEqualTo(over);
        assertThat(PrismDioptres.of(a).isUnder(PrismDioptres.of(b))).as(source).isEqualTo(under);
    }

    @Test
    void aDifferenceOfTypedValuesIsNotOverTheLimitItEquals() {
        // in binary 5.13 - 5.00 is 0.12999999999999989 and 0.1 + 0.2 is 0.30000000000000004
        assertThat(Dioptres.of(5.13).minus(Dioptres.of(5.00)).isUnder(Dioptres.of(0.13)))
                .isFalse();
        assertThat(Dioptres.of(0.1).plus(Dioptres.of(0.2)).isOver(Dioptres.of(0.3)))
                .isFalse();
    }

    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void refusesWhatIsNotANumber(double value) {
        assertThatIllegalArgumentException().isThrownBy(() -> Dioptres.of(value));
    }

    @Test
    void keepsNumbersTooLargeForTheGridAndRefusesTheirOverflow() {
        assertThat(Dioptres.of(1e300).amount()).isEqualTo(1e300);
        assertThatIllegalArgumentException().isThrownBy(() -> Dioptres.of(1e308).times(10));
    }
}
