package plusward.optics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class AmplitudeTests {

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            age y | least D | mean D | most D | source
            6     | 13.5    | 16.7   | 22.6   | Hofstetter, Optom World 1950 (secondary sources): 15 − 1.5, 18.5 − 1.8, 25 − 2.4
            0     | 15      | 18.5   | 25     | the constants of the lines
            60    | 0       | 0.5    | 1      | 15 − 15, 18.5 − 18, 25 − 24
            63    | 0       | 0      | 0      | never below 0: 25 − 25.2
            """)
    void amplitudeByAge(double age, double least, double mean, double most, String source) {
        assertThat(Amplitude.least(Age.of(age))).as(source).isEqualTo(Dioptres.of(least));
        assertThat(Amplitude.mean(Age.of(age))).as(source).isEqualTo(Dioptres.of(mean));
        assertThat(Amplitude.most(Age.of(age))).as(source).isEqualTo(Dioptres.of(most));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            age y | amplitude D | source
            10    | 14.0        | Donders' amplitudes
            15    | 12.0        | Donders' amplitudes
            """)
    void anOlderTableLiesBetweenLeastAndMost(double age, double amplitude, String source) {
        assertThat(Dioptres.of(amplitude))
                .as(source)
                .isBetween(Amplitude.least(Age.of(age)), Amplitude.most(Age.of(age)));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            age y | amplitude D | source
            3     | 7.33        | Anderson et al., IOVS 2008;49:2919: 7.33 − 0.0035 (a − 3)²
            6     | 7.2985      | 7.33 − 0.0035 × 9
            13    | 6.98        | 7.33 − 0.0035 × 100
            60    | 0           | never below 0: 7.33 − 11.37
            """)
    void objectiveMeanByAge(double age, double amplitude, String source) {
        assertThat(Amplitude.objectiveMean(Age.of(age))).as(source).isEqualTo(Dioptres.of(amplitude));
    }

    @Test
    void theObjectiveMeanIsTheLowerOneInChildren() {
        assertThat(Amplitude.objectiveMean(Age.of(6))).isLessThan(Amplitude.least(Age.of(6)));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            near point mm | amplitude D | source
            70            | 14.29       | definition 100/cm: 100/7, in the trade 14
            100           | 10          | definition 100/cm: 100/10
            0.1           | 10000       | just above 0
            """)
    void amplitudeFromTheNearPoint(double nearPoint, double amplitude, String source) {
        assertThat(Amplitude.fromNearPoint(Millimetres.of(nearPoint)).inDioptres())
                .as(source)
                .isEqualTo(amplitude, within(0.005));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, -1})
    void refusesANearPointOnOrBehindTheEye(double nearPoint) {
        assertThatIllegalArgumentException().isThrownBy(() -> Amplitude.fromNearPoint(Millimetres.of(nearPoint)));
    }
}
