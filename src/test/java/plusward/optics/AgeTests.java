package plusward.optics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.time.LocalDate;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class AgeTests {

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            from       | to         | years  | printed | source
            2019-05-02 | 2025-03-14 | 5.87   | 5.9     | 2143 days / 365.2425
            2020-02-29 | 2020-02-29 | 0      | 0.0     | the same day
            2020-02-29 | 2021-02-28 | 1.00   | 1.0     | 365 days
            2025-03-14 | 2019-05-02 | -5.87  | -5.9    | backwards is negative
            """)
    void yearsBetweenTwoDays(LocalDate from, LocalDate to, double years, String printed, String source) {
        assertThat(Age.between(from, to).inYears()).as(source).isEqualTo(years, within(0.005));
        assertThat(Age.between(from, to)).as(source).hasToString(printed);
    }
}
