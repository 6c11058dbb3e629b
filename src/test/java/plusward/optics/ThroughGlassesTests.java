package plusward.optics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ThroughGlassesTests {

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            read Δ | F D | true Δ | source
            30     | 5   | 34.3   | 30/(1 − 0.125); direction: Scattergood, Brown, Guyton, Am J Ophthalmol 1983;96:439; 2.5 % per D from memory
            30     | -5  | 26.7   | 30/1.125: minus reads large
            30     | 0   | 30     | no lens
            -30    | 5   | -34.3  | exo keeps its sign
            10     | 20  | 20     | at the limit: 10/0.5
            15     | -20 | 10     | at the limit: 15/1.5
            """)
    void theTurnBehindTheReading(double read, double power, double expected, String source) {
        assertThat(ThroughGlasses.trueTurn(PrismDioptres.of(read), Dioptres.of(power)))
                .as(source)
                .hasValueSatisfying(turn -> assertThat(turn.inPrismDioptres()).isEqualTo(expected, within(0.05)));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            F D | factor | source
            10  | 0.75   | 1 − 0.025 × 10; 2.5 % per D from memory
            -10 | 1.25   | 1 + 0.025 × 10
            0   | 1      | no lens
            """)
    void aReadingOfOneBecomes(double power, double factor, String source) {
        assertThat(ThroughGlasses.factor(Dioptres.of(power))).as(source).isEqualTo(factor, within(1e-12));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            F D    | source
            20.01  | just beyond the limit of 20 D (common practice, no source)
            -20.01 | just beyond the limit of −20 D
            40     | the factor would be 0
            """)
    void saysNothingBeyondTwentyDioptres(double power, String source) {
        assertThat(ThroughGlasses.trueTurn(PrismDioptres.of(30), Dioptres.of(power)))
                .as(source)
                .isEmpty();
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            R S D | R C D | R A ° | L S D | L C D | L A ° | F D | source
            5     | 0     | 180   | 5     | 0     | 180   | 5   | equal spheres
            4     | 0     | 180   | 6     | 0     | 180   | 5   | mean of both lenses
            6     | -2    | 90    | 6     | -2    | 180   | 5   | S + C sin²A: 4 and 6
            """)
    void horizontalPowerOfAPair(
            double rs, double rc, int ra, double ls, double lc, int la, double power, String source) {
        assertThat(ThroughGlasses.horizontalPower(Lens.of(rs, rc, ra), Lens.of(ls, lc, la)))
                .as(source)
                .isEqualTo(Dioptres.of(power));
    }
}
