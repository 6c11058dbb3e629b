package plusward.optics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class LogMarTests {

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            numerator | denominator | logMAR | source
            20        | 16          | -0.10  | Snellen and logMAR: Holladay, J Cataract Refract Surg 2004
            20        | 20          | 0.00   | Holladay 2004
            20        | 25          | 0.10   | Holladay 2004
            20        | 32          | 0.20   | Holladay 2004
            20        | 40          | 0.30   | Holladay 2004
            20        | 50          | 0.40   | Holladay 2004
            20        | 63          | 0.50   | Holladay 2004
            20        | 80          | 0.60   | Holladay 2004
            20        | 100         | 0.70   | Holladay 2004
            20        | 200         | 1.00   | Holladay 2004
            6         | 7.5         | 0.10   | the same fraction in metres
            0.8       | 1           | 0.10   | a decimal acuity
            """)
    void sizeOfAChartLine(double numerator, double denominator, double logMar, String source) {
        assertThat(LogMar.ofSnellen(numerator, denominator).inLogMar())
                .as(source)
                .isEqualTo(logMar, within(0.005));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            numerator | denominator | source
            0         | 20          | no distance
            20        | 0           | no letter
            -20       | 20          | negative
            20        | -20         | negative
            NaN       | 20          | not a number
            """)
    void refusesWhatIsNoFraction(double numerator, double denominator, String source) {
        assertThatIllegalArgumentException().as(source).isThrownBy(() -> LogMar.ofSnellen(numerator, denominator));
    }

    @Test
    void fiveLettersAreALine() {
        assertThat(LogMar.ONE_LETTER.times(5)).isEqualTo(LogMar.of(0.1));
        assertThat(LogMar.ZERO).isEqualTo(LogMar.ofSnellen(20, 20));
    }
}
