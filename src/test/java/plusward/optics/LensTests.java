package plusward.optics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class LensTests {

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            S D  | C D   | A ° | SE D   | source
            4.50 | -1.00 | 180 | 4.00   | definition S + C/2: 4.50 − 0.50
            3.50 | 1.00  | 90  | 4.00   | definition S + C/2: 3.50 + 0.50
            3.00 | 0     | 180 | 3.00   | definition: no cylinder
            0    | -0.25 | 45  | -0.125 | definition S + C/2, not rounded
            """)
    void sphericalEquivalentIsSphereAndHalfTheCylinder(double s, double c, int a, double equivalent, String source) {
        assertThat(Lens.of(s, c, a).sphericalEquivalent()).as(source).isEqualTo(Dioptres.of(equivalent));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            S D  | C D   | A ° | S' D | C' D | A' ° | source
            4.50 | -1.00 | 180 | 3.50 | 1.00 | 90   | definition: S + C, −C, axis ± 90
            2.00 | -1.50 | 90  | 0.50 | 1.50 | 180  | definition: S + C, −C, axis ± 90
            5.00 | -2.00 | 30  | 3.00 | 2.00 | 120  | definition: S + C, −C, axis ± 90
            5.00 | -2.00 | 91  | 3.00 | 2.00 | 1    | definition: S + C, −C, axis ± 90
            """)
    void transposedIsTheSameLensInTheOtherForm(double s, double c, int a, double s2, double c2, int a2, String source) {
        Lens minus = Lens.of(s, c, a);
        Lens plus = Lens.of(s2, c2, a2);
        assertThat(minus.transposed()).as(source).isEqualTo(plus);
        assertThat(plus.transposed()).as(source).isEqualTo(minus);
        assertThat(minus.inPlusCylinder()).isEqualTo(plus);
        assertThat(plus.inMinusCylinder()).isEqualTo(minus);
        assertThat(minus.inMinusCylinder()).isSameAs(minus);
        assertThat(plus.inPlusCylinder()).isSameAs(plus);
        assertThat(minus.isSamePowerAs(plus)).isTrue();
        assertThat(minus).isNotEqualTo(plus);
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            S D  | C D   | A ° | source
            4.49 | -1.00 | 180 | sphere differs
            4.50 | -1.01 | 180 | cylinder differs
            4.50 | -1.00 | 179 | axis differs
            3.50 | 1.00  | 180 | cylinder form without its turned axis
            """)
    void anotherPowerIsNotTheSame(double s, double c, int a, String source) {
        assertThat(Lens.of(4.50, -1.00, 180).isSamePowerAs(Lens.of(s, c, a)))
                .as(source)
                .isFalse();
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            S D  | C D   | A ° | meridian ° | power D | source
            5.00 | -2.00 | 180 | 180        | 5.00    | along the axis it is S
            5.00 | -2.00 | 180 | 90         | 3.00    | across the axis it is S + C
            5.00 | -2.00 | 90  | 180        | 3.00    | S + C sin²A in the horizontal meridian
            5.00 | -2.00 | 30  | 180        | 4.50    | 5 − 2 sin²30 = 5 − 2 × 0.25
            5.00 | -2.00 | 45  | 180        | 4.00    | 5 − 2 sin²45 = 5 − 2 × 0.5
            """)
    void powerAlongAMeridian(double s, double c, int a, int meridian, double power, String source) {
        assertThat(Lens.of(s, c, a).powerAlong(Axis.of(meridian)).inDioptres())
                .as(source)
                .isEqualTo(power, within(1e-9));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            S D    | C D    | A ° | printed              | source
            3.50   | -0.75  | 180 | +3.50 -0.75 x 180    | the trade's notation
            3.50   | 0      | 90  | +3.50                | no cylinder
            0      | 0      | 10  | plano                | no power
            0      | -0.50  | 90  | plano -0.50 x 90     | the trade's notation
            3.00   | 1.00   | 90  | +3.00 +1.00 x 90     | plus-cylinder kept as typed
            -0.001 | -0.002 | 7   | plano                | rounds to nothing
            -12.25 | -3.5   | 0   | -12.25 -3.50 x 180   | axis 0 is 180
            """)
    void printsTheTradesNotation(double s, double c, int a, String printed, String source) {
        assertThat(Lens.of(s, c, a)).as(source).hasToString(printed);
    }

    @Test
    void withoutCylinderTheAxisMeansNothing() {
        assertThat(Lens.of(3, 0, 37)).isEqualTo(Lens.sphere(Dioptres.of(3)));
        assertThat(Lens.PLANO).isEqualTo(Lens.of(0, 0, 1));
    }

    @Test
    void mirroredIsTheLensOfTheOtherEyeAndTwiceTheSame() {
        assertThat(Lens.of(4, -1, 10).mirrored()).isEqualTo(Lens.of(4, -1, 170));
        assertThat(Lens.of(4, -1, 10).mirrored().mirrored()).isEqualTo(Lens.of(4, -1, 10));
    }
}
