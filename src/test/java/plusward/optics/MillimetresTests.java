package plusward.optics;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class MillimetresTests {

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            mm     | cm     | m        | printed | source
            -3.5   | -0.35  | -0.0035  | -3.5    | below the pupil centre
            2      | 0.2    | 0.002    | +2.0    | above the pupil centre
            0      | 0      | 0        | 0.0     | level
            0.25   | 0.025  | 0.00025  | +0.25   | a quarter
            10.10  | 1.01   | 0.0101   | +10.1   | no needless zero
            """)
    void isALengthWithASign(double millimetres, double centimetres, double metres, String printed, String source) {
        Millimetres length = Millimetres.of(millimetres);
        assertThat(length.inCentimetres()).as(source).isEqualTo(centimetres);
        assertThat(length.inMetres()).as(source).isEqualTo(metres);
        assertThat(length).as(source).hasToString(printed);
    }
}
