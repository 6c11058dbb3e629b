package plusward.course;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.exam.Viewing;
import plusward.optics.Dioptres;
import plusward.optics.PrismDioptres;

class RepeatabilityTests {

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            turn (Δ) | at       | one (Δ) | difference (Δ) | source
            20.1     | DISTANCE | 7.3     | 10.4           | PEDIG, Arch Ophthalmol 2009;127:59
            20.01    | NEAR     | 8.3     | 11.7           | PEDIG 2009
            20       | DISTANCE | 4.1     | 5.8            | PEDIG 2009: 10 to 20 Δ
            20       | NEAR     | 3.3     | 4.7            | PEDIG 2009: 10 to 20 Δ
            10       | DISTANCE | 4.1     | 5.8            | PEDIG 2009
            9        | NEAR     | 3.3     | 4.7            | extrapolated: as 10 to 20 Δ
            -25      | DISTANCE | 7.3     | 10.4           | the size counts, not the direction
            -8       | NEAR     | 3.3     | 4.7            | the same
            """)
    void a_reading_and_a_difference_have_their_published_limits(
            double turn, Viewing at, double one, double difference, String source) {
        PrismDioptres reading = PrismDioptres.of(turn);
        assertThat(Repeatability.limitOfOne(reading, at)).as(source).isEqualTo(PrismDioptres.of(one));
        assertThat(Repeatability.limitOfDifference(reading, at)).as(source).isEqualTo(PrismDioptres.of(difference));
        assertThat(Repeatability.standardDeviation(reading, at).amount()).isCloseTo(one / 1.96, within(1e-9));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            before (Δ) | after (Δ) | real  | from (Δ) | source
            14         | 20        | true  | 6        | PEDIG 2009
            14         | 19        | false | 6        | PEDIG 2009
            20         | 14        | true  | 6        | a fall counts like a rise
            30         | 42        | true  | 12       | PEDIG 2009
            30         | 41        | false | 12       | PEDIG 2009
            18         | 26        | false | 12       | the larger angle rules
            14         | 26        | true  | 12       | the larger angle rules
            26         | 15        | false | 12       | the larger angle rules, whichever comes first
            14         | 20.01     | false | 12       | over 20 Δ
            2          | 8         | true  | 6        | extrapolated under 10 Δ
            2          | 7         | false | 6        | extrapolated under 10 Δ
            -3         | 3         | true  | 6        | from exo to eso
            -8         | -14       | true  | 6        | exo
            -26        | -15       | false | 12       | exo: the larger size rules
            10         | 10        | false | 6        | no change
            """)
    void a_change_is_real_from_the_published_amount(
            double before, double after, boolean real, double from, String source) {
        PrismDioptres first = PrismDioptres.of(before);
        PrismDioptres second = PrismDioptres.of(after);
        assertThat(Repeatability.isReal(first, second)).as(source).isEqualTo(real);
        assertThat(Repeatability.realFrom(first, second)).as(source).isEqualTo(PrismDioptres.of(from));
        assertThat(Repeatability.isRealRise(first, second)).as(source).isEqualTo(real && after > before);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            before (Δ) | after (Δ) | extrapolated | source
            9          | 4         | true         | nothing was published under 10 Δ
            9.9        | 9.9       | true         | the same
            10         | 4         | false        | the larger angle was studied
            4          | 10        | false        | the same
            -12        | 4         | false        | the size counts
            """)
    void below_ten_prism_dioptres_is_called_extrapolated(
            double before, double after, boolean extrapolated, String source) {
        assertThat(Repeatability.isExtrapolated(PrismDioptres.of(before), PrismDioptres.of(after)))
                .as(source)
                .isEqualTo(extrapolated);
    }

    /** Harvey et al., Optom Vis Sci 2000;77:140. */
    @Test
    void a_cycloplegic_refraction_repeats_within_its_published_distance() {
        assertThat(Repeatability.CYCLOPLEGIC).isEqualTo(Dioptres.of(0.41));
    }
}
