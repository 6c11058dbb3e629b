package plusward.course;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.exam.Reason;
import plusward.optics.Dioptres;
import plusward.optics.PrismDioptres;
import plusward.optics.PrismPerDioptre;

class GradientAcaTests {

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            without (Δ) | with (Δ) | plus (D) | ratio (Δ/D) | source
            30          | 6        | 3.00     | 8.0         | (30 - 6)/3, definition of the gradient
            14          | 6        | 2.00     | 4.0         | (14 - 6)/2
            6           | -3       | 3.00     | 3.0         | (6 + 3)/3, from eso to exo
            6           | 10       | 2.00     | -2.0        | (6 - 10)/2, reported as it is
            12          | 12       | 1.00     | 0.0         | no effect of plus
            """)
    void the_gradient_is_the_change_over_the_added_plus(
            double without, double with, double plus, double ratio, String source) {
        var estimate = GradientAca.estimate(PrismDioptres.of(without), PrismDioptres.of(with), Dioptres.of(plus));
        assertThat(estimate.value()).as(source).isEqualTo(PrismPerDioptre.of(ratio));
    }

    /** Limits of one near reading: 8.3 Δ over 20 Δ, 3.3 Δ to 20 Δ (PEDIG 2009); they add in squares. */
    @Test
    void its_interval_comes_from_both_readings() {
        var estimate = GradientAca.estimate(PrismDioptres.of(30), PrismDioptres.of(6), Dioptres.of(3));
        double half = Math.sqrt(8.3 * 8.3 + 3.3 * 3.3) / 3;
        assertThat(estimate.low().amount()).isCloseTo(8 - half, within(1e-8));
        assertThat(estimate.high().amount()).isCloseTo(8 + half, within(1e-8));
    }

    @Test
    void each_gradient_that_exists_is_reported_and_the_one_over_the_add_comes_first() {
        Visit visit = CourseText.visit(
                "worn_add=2.50", "turn_cc_near=ET 20", "turn_add_near=E 10", "trial_plus=3.00", "turn_trial_near=E 5");
        assertThat(ratio(GradientAca.overAdd(visit).orElseThrow())).isEqualTo((20 - 10) / 2.5);
        assertThat(ratio(GradientAca.overTrial(visit).orElseThrow())).isEqualTo((20 - 5) / 3.0);
        assertThat(GradientAca.at(visit)).isEqualTo(GradientAca.overAdd(visit));
        assertThat(GradientAca.at(visit).orElseThrow().from())
                .isEqualTo(Reason.of("aca.gradient", Reason.of("condition.add-near"), Dioptres.of(2.5)));
    }

    @Test
    void without_an_add_the_trial_plus_serves() {
        Visit visit = CourseText.visit("turn_cc_near=ET 20", "trial_plus=3.00", "turn_trial_near=E 5");
        assertThat(GradientAca.at(visit)).isPresent().isEqualTo(GradientAca.overTrial(visit));
        assertThat(GradientAca.at(visit).orElseThrow().from())
                .isEqualTo(Reason.of("aca.gradient", Reason.of("condition.trial-near"), Dioptres.of(3)));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            turn_cc_near | worn_add | turn_add_near | why
                         | 2.50     | E 10          | no reading without the add
            ET 20        | 2.50     |               | no reading through the add
            ET 20        |          | E 10          | no add on record
            ET 20        | 0        | E 10          | an add of 0 is none
            RHT 4        | 2.50     | E 10          | only a vertical turn
            """)
    void with_a_part_missing_there_is_none(String near, String add, String through, String why) {
        Visit visit = CourseText.visit(
                "turn_cc_near=" + text(near), "worn_add=" + text(add), "turn_add_near=" + text(through));
        assertThat(GradientAca.at(visit)).as(why).isEmpty();
    }

    private static double ratio(AcaEstimate estimate) {
        return estimate.ratio().value().amount();
    }

    private static String text(String cell) {
        return cell == null ? "" : cell;
    }
}
