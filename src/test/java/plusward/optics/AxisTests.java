package plusward.optics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class AxisTests {

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            given ° | axis ° | perpendicular ° | mirrored ° | source
            0       | 180    | 90              | 180        | 0 is read as 180
            1       | 1      | 91              | 179        | axis ± 90, 180 − axis
            10      | 10     | 100             | 170        | axis ± 90, 180 − axis
            89      | 89     | 179             | 91         | axis ± 90, 180 − axis
            90      | 90     | 180             | 90         | axis ± 90, 180 − axis
            91      | 91     | 1               | 89         | axis ± 90, 180 − axis
            179     | 179    | 89              | 1          | axis ± 90, 180 − axis
            180     | 180    | 90              | 180        | axis ± 90, 180 − axis
            """)
    void staysWithin1To180(int given, int axis, int perpendicular, int mirrored, String source) {
        assertThat(Axis.of(given).inDegrees()).as(source).isEqualTo(axis);
        assertThat(Axis.of(given).perpendicular()).as(source).isEqualTo(Axis.of(perpendicular));
        assertThat(Axis.of(given).mirrored()).as(source).isEqualTo(Axis.of(mirrored));
    }

    @ParameterizedTest
    @ValueSource(ints = {-1, 181, Integer.MIN_VALUE, Integer.MAX_VALUE})
    void refusesWhatNoTrialFrameShows(int degrees) {
        assertThatIllegalArgumentException().isThrownBy(() -> Axis.of(degrees));
    }

    @Test
    void printsTheDegreesAlone() {
        assertThat(Axis.of(0)).hasToString("180");
        assertThat(Axis.of(7)).hasToString("7");
        assertThat(Axis.HORIZONTAL).isEqualTo(Axis.of(180));
    }
}
