package plusward.optics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class PowerVectorTests {

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            S D  | C D   | A ° | M D  | J0 D  | J45 D  | source
            5.00 | -2.00 | 30  | 4.00 | 0.500 | 0.866  | Thibos, Wheeler, Horner, Optom Vis Sci 1997;74:367
            2.00 | -1.50 | 90  | 1.25 | -0.75 | 0      | Thibos, Wheeler, Horner, Optom Vis Sci 1997;74:367
            3.00 | 2.00  | 120 | 4.00 | 0.500 | 0.866  | the first row transposed: the same vector
            3.00 | 0     | 180 | 3.00 | 0     | 0      | no cylinder
            0    | -1.00 | 135 | -0.5 | 0     | -0.500 | −(C/2) sin 2A = 0.5 × sin 270
            """)
    void componentsOfALens(double s, double c, int a, double m, double j0, double j45, String source) {
        PowerVector vector = Lens.of(s, c, a).powerVector();
        assertThat(vector.m().inDioptres()).as(source).isEqualTo(m, within(1e-9));
        assertThat(vector.j0().inDioptres()).as(source).isEqualTo(j0, within(5e-4));
        assertThat(vector.j45().inDioptres()).as(source).isEqualTo(j45, within(5e-4));
    }

    @Test
    void meanOfTwoObliqueRefractionsIsTakenByComponent() {
        // M 3.5 and 3.5; J0 0.5 cos 20 = 0.470; J45 cancels: S 3.5 + 0.470, C −0.940 (Thibos et al. 1997)
        PowerVector mean = PowerVector.mean(
                List.of(Lens.of(4, -1, 10).powerVector(), Lens.of(4, -1, 170).powerVector()));
        assertThat(mean.toLens()).hasToString("+3.97 -0.94 x 180");
    }

    @Test
    void meanOfOneIsItself() {
        PowerVector one = Lens.of(4, -1, 10).powerVector();
        assertThat(PowerVector.mean(List.of(one))).isEqualTo(one);
    }

    @Test
    void nothingHasNoMean() {
        assertThatIllegalArgumentException().isThrownBy(() -> PowerVector.mean(List.of()));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            S D  | C D   | A ° | S' D | C' D  | A' ° | change D | source
            3.00 | -1.00 | 180 | 3.00 | -1.00 | 90   | 1.00     | ΔJ0 = 0.5 + 0.5; hidden by SE; Thibos et al. 1997
            3.00 | 0     | 180 | 3.50 | 0     | 180  | 0.50     | spheres: the difference of M
            4.50 | -1.00 | 180 | 3.50 | 1.00  | 90   | 0        | one lens in two forms
            3.00 | -1.00 | 180 | 3.00 | -1.00 | 45   | 0.707    | √(0.5² + 0.5²)
            """)
    void distanceBetweenRefractions(
            double s, double c, int a, double s2, double c2, int a2, double change, String source) {
        PowerVector before = Lens.of(s, c, a).powerVector();
        PowerVector after = Lens.of(s2, c2, a2).powerVector();
        assertThat(before.distanceTo(after).inDioptres()).as(source).isEqualTo(change, within(5e-4));
        assertThat(after.distanceTo(before)).isEqualTo(before.distanceTo(after));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            S D   | C D   | A ° | lens                | source
            5.00  | -2.00 | 30  | +5.00 -2.00 x 30    | there and back
            3.00  | 2.00  | 120 | +5.00 -2.00 x 30    | back in minus-cylinder form
            2.00  | -1.50 | 90  | +2.00 -1.50 x 90    | there and back
            -1.00 | -0.25 | 180 | -1.00 -0.25 x 180   | axis 0 comes back as 180
            1.00  | -0.25 | 179 | +1.00 -0.25 x 179   | negative half angle
            0     | 0     | 180 | plano               | no power
            """)
    void comesBackAsALens(double s, double c, int a, String lens, String source) {
        assertThat(Lens.of(s, c, a).powerVector().toLens()).as(source).hasToString(lens);
    }

    /** M² + J0² + J45² = S² + SC + C²/2: the length of the vector is the blur of the lens (Thibos et al. 1997). */
    @Test
    void identitiesHoldForAnyLens() {
        Random random = new Random(1997);
        IntStream.range(0, 2000).forEach(i -> {
            double s = (random.nextInt(241) - 120) / 4.0;
            double c = (random.nextInt(121) - 60) / 4.0;
            Lens lens = Lens.of(s, c, random.nextInt(181));
            PowerVector vector = lens.powerVector();
            double length = vector.distanceTo(Lens.PLANO.powerVector()).inDioptres();
            assertThat(length * length).as("%s", lens).isEqualTo(s * s + s * c + c * c / 2, within(1e-5));
            assertThat(vector.distanceTo(lens.transposed().powerVector()).inDioptres())
                    .isLessThan(1e-8);
            assertThat(vector.toLens()).hasToString(lens.inMinusCylinder().toString());
        });
    }
}
