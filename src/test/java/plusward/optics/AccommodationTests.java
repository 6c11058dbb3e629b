package plusward.optics;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class AccommodationTests {

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            hyperopia D | worn D | extra plus D | distance D | near D | source
            4.00        | 0      | 0            | 4.00       | 7.00   | definition: H − F; H − F + 3
            4.00        | 4.00   | 0            | 0          | 3.00   | full plus: none at distance
            4.00        | 4.00   | 3.00         | 0          | 0      | an add of 3 D does all of near
            4.00        | 4.00   | 2.99         | 0          | 0.01   | just under
            4.00        | 4.00   | 3.01         | 0          | 0      | never below 0
            4.00        | 4.25   | 0            | 0          | 2.75   | over-plussed: never below 0, less at near
            4.00        | 3.75   | 0            | 0.25       | 3.25   | under-plussed
            -2.00       | 0      | 0            | 0          | 1.00   | myopia focuses less at near
            """)
    void focusingNeeded(double h, double worn, double extra, double distance, double near, String source) {
        assertThat(Accommodation.neededForDistance(Dioptres.of(h), Dioptres.of(worn)))
                .as(source)
                .isEqualTo(Dioptres.of(distance));
        assertThat(Accommodation.neededForNear(Dioptres.of(h), Dioptres.of(worn), Dioptres.of(extra)))
                .as(source)
                .isEqualTo(Dioptres.of(near));
    }
}
