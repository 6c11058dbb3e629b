package plusward.exam;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import plusward.optics.PrismDioptres;

class PrismReadingTests {

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            one Δ | other Δ | total Δ | printed | source
            25    |         | 25      | 25      | one prism
            2.5   |         | 2.5     | 2.5     | to 0.1 Δ
            0     |         | 0       | 0       | none
            150   |         | 150     | 150     | the largest
            30    | 25      | 59.46   | 30+25   | 55/(1 − 750/10⁴)
            20    | 20      | 41.67   | 20+20   | 40/(1 − 400/10⁴)
            50    | 57.1    | 149.89  | 50+57.1 | just below the largest: 107.1/0.7145
            """)
    void totalOfOneOrTwoPrisms(double one, Double other, double total, String printed, String source) {
        PrismReading reading = new PrismReading(PrismDioptres.of(one), other == null ? null : PrismDioptres.of(other));
        assertThat(reading.total().inPrismDioptres()).as(source).isEqualTo(total, within(0.01));
        assertThat(reading).as(source).hasToString(printed);
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            one Δ | other Δ | source
            50    | 57.2    | together 150.2: 107.2/0.714
            -1    | 5       | negative
            5     | -1      | negative
            151   | 5       | one alone too large
            5     | 151     | the other alone too large
            100   | 100     | a right angle
            150   | 150     | beyond a right angle
            5     | 5.05    | finer than 0.1
            """)
    void refusesWhatPrismsCannotMeasure(double one, double other, String source) {
        assertThatIllegalArgumentException()
                .as(source)
                .isThrownBy(() -> new PrismReading(PrismDioptres.of(one), PrismDioptres.of(other)));
    }

    @ParameterizedTest
    @ValueSource(doubles = {-0.1, 150.1, 25.55})
    void refusesOnePrismOutsideItsRangeOrSteps(double one) {
        assertThatIllegalArgumentException().isThrownBy(() -> PrismReading.of(one));
    }
}
