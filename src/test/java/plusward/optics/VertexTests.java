package plusward.optics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class VertexTests {

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            S D   | C D   | A ° | d mm | S' D   | C' D   | source
            5.00  | 0     | 180 | 12   | 5.319  | 0      | F/(1 − dF) = 5/0.94, paraxial optics
            6.00  | -2.00 | 180 | 12   | 6.466  | -2.264 | 6/0.928 and 4/0.952
            -5.00 | 0     | 180 | 12   | -4.717 | 0      | −5/1.06: minus lenses weaken
            5.00  | 0     | 180 | 0    | 5.00   | 0      | no distance, no effect
            """)
    void powerAtTheCornea(double s, double c, int a, double d, double s2, double c2, String source) {
        Lens atCornea = Vertex.atCornea(Lens.of(s, c, a), Millimetres.of(d));
        assertThat(atCornea.sphere().inDioptres()).as(source).isEqualTo(s2, within(5e-4));
        assertThat(atCornea.cylinder().inDioptres()).as(source).isEqualTo(c2, within(5e-4));
        assertThat(atCornea.axis()).as(source).isEqualTo(Axis.of(a));
    }

    @Test
    void refusesALensWhoseFocusFallsOnOrBeforeTheCornea() {
        // 1 − 0.010 × 100 = 0
        assertThatIllegalArgumentException().isThrownBy(() -> atTenMillimetres(100));
        assertThatIllegalArgumentException().isThrownBy(() -> atTenMillimetres(101));
        // 99/(1 − 0.99)
        assertThat(atTenMillimetres(99).sphere().inDioptres()).isEqualTo(9900, within(1e-3));
    }

    private static Lens atTenMillimetres(double power) {
        return Vertex.atCornea(Lens.sphere(Dioptres.of(power)), Millimetres.of(10));
    }
}
