package plusward.course;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Objects;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.exam.Glasses;
import plusward.exam.PerEye;
import plusward.optics.Dioptres;

class WornTests {

    /** Full within 0.50 D of the cycloplegic refraction, in each eye: common practice, no source. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            worn right        | worn left | found right | found left | short right | short left | fullness | source
            +3.00             | +3.00     | +3.49       | +3.50      | 0.49        | 0.50       | FULL     | at the limit
            +3.00             | +3.00     | +3.50       | +3.51      | 0.50        | 0.51       | SHORT    | over it in the left eye
            +3.00             | +3.00     | +3.51       | +3.00      | 0.51        | 0          | SHORT    | over it in the right eye
            +3.00             | +3.00     | +2.00       | +1.00      | -1          | -2         | FULL     | too much plus is not short
            +3.00 -1.00 x 180 | +3.00     | +3.01       | +3.00      | 0.51        | 0          | SHORT    | spherical equivalent +2.50
            +3.00             |           | +3.00       | +3.00      | 0           |            | UNKNOWN  | no left lens
            +3.00             | +3.00     | +3.00       |            | 0           |            | UNKNOWN  | left eye not refracted
                              | +3.00     | +3.00       | +3.00      |             | 0          | UNKNOWN  | no right lens
            +3.00             |           | +4.00       | +4.00      | 1.00        |            | SHORT    | one eye short is short
            +3.00             | +3.00     |             | +3.75      |             | 0.75       | SHORT    | one eye short is short
                              |           | +3.00       | +3.00      |             |            | UNKNOWN  | no glasses
            """)
    void plus_is_full_when_neither_eye_is_more_than_half_a_dioptre_short(
            String wornRight,
            String wornLeft,
            String foundRight,
            String foundLeft,
            Double shortRight,
            Double shortLeft,
            Worn.Fullness fullness,
            String source) {
        Visit visit = CourseText.visit(
                "worn_right=" + text(wornRight),
                "worn_left=" + text(wornLeft),
                "cycloplegic_right=" + text(foundRight),
                "cycloplegic_left=" + text(foundLeft));
        assertThat(Worn.fullness(visit)).as(source).isEqualTo(fullness);
        assertThat(Worn.shortBy(visit)).as(source).isEqualTo(new PerEye<>(dioptres(shortRight), dioptres(shortLeft)));
    }

    @Test
    void without_a_refraction_in_force_fullness_is_not_known() {
        Visit visit = CourseText.visit("worn_right=+3.00", "worn_left=+3.00");
        assertThat(Worn.fullness(visit)).isEqualTo(Worn.Fullness.UNKNOWN);
        assertThat(Worn.shortBy(visit)).isEqualTo(PerEye.none());
    }

    @Test
    void the_plus_worn_is_the_mean_of_the_lenses_on_record() {
        assertThat(Worn.meanEquivalent(glasses("worn_right=+3.00", "worn_left=+4.00 -1.00 x 90")))
                .contains(Dioptres.of((3.00 + 3.50) / 2));
        assertThat(Worn.meanEquivalent(glasses("worn_left=+4.00"))).contains(Dioptres.of(4));
        assertThat(Worn.meanEquivalent(glasses("worn_add=2.50"))).isEmpty();
    }

    @Test
    void of_no_eye_there_is_no_mean() {
        assertThatThrownBy(() -> Worn.mean(PerEye.none())).isInstanceOf(IllegalArgumentException.class);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            one right         | one left | one add | one since  | other right       | other left | other add | other since | powers | pair  | source
            +3.00             | +3.50    | 2.50    | 2024-01-01 | +3.00             | +3.50      | 2.50      | 2024-01-01  | true   | true  | alike
            +3.00 -1.00 x 180 | +3.50    |         | 2024-01-01 | +2.00 +1.00 x 90  | +3.50      |           | 2024-01-01  | true   | true  | the other cylinder form
            +3.00             | +3.50    | 0       | 2024-01-01 | +3.00             | +3.50      |           | 2024-01-01  | true   | true  | an add of 0 is none
            +3.00             | +3.50    |         | 2024-01-01 | +3.00             | +3.50      |           | 2024-06-01  | true   | false | made again with the same powers
            +3.00             | +3.50    |         |            | +3.00             | +3.50      |           | 2024-06-01  | true   | true  | one date unknown tells nothing
            +3.00             | +3.50    |         | 2024-01-01 | +3.00             | +3.50      |           |             | true   | true  | the other unknown tells nothing
            +3.00             | +3.50    |         | 2024-01-01 | +3.25             | +3.50      |           | 2024-01-01  | false  | false | right lens differs
            +3.00             | +3.50    |         | 2024-01-01 | +3.00             | +3.75      |           | 2024-01-01  | false  | false | left lens differs
            +3.00             | +3.50    | 2.50    | 2024-01-01 | +3.00             | +3.50      | 2.00      | 2024-01-01  | false  | false | add differs
            +3.00             | +3.50    |         | 2024-01-01 | +3.00             |            |           | 2024-01-01  | false  | false | no left lens now
            +3.00             |          |         | 2024-01-01 | +3.00             | +3.50      |           | 2024-01-01  | false  | false | no left lens before
            +3.00             |          |         | 2024-01-01 | +3.00             |            |           | 2024-01-01  | true   | true  | no left lens at all
            """)
    void glasses_are_the_same_by_their_powers_and_a_pair_also_by_its_date(
            String right,
            String left,
            String add,
            String since,
            String otherRight,
            String otherLeft,
            String otherAdd,
            String otherSince,
            boolean powers,
            boolean pair,
            String source) {
        Glasses one = worn(right, left, add, since);
        Glasses other = worn(otherRight, otherLeft, otherAdd, otherSince);
        assertThat(Worn.isSame(one, other)).as(source).isEqualTo(powers);
        assertThat(Worn.isSamePair(one, other)).as(source).isEqualTo(pair);
    }

    /** Eight weeks before 2025-03-14 is 2025-01-17: a series of 75 children, 81 % in control within 2 months. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            since      | weeks | settling | source
            2025-01-16 | 8     | SETTLED  | a day over 8 weeks
            2025-01-17 | 8     | SETTLED  | 8 weeks to the day
            2025-01-18 | 8     | TOO_SOON | a day under 8 weeks
            2025-01-18 | 7     | SETTLED  | under the clinic's own limit
            2025-03-14 | 0     | SETTLED  | a clinic that does not wait
                       | 8     | UNKNOWN  | not on record
            """)
    void a_turn_settles_in_the_weeks_of_the_limit(String since, int weeks, Settling settling, String source) {
        Limits limits = Limits.DEFAULT;
        Limits own = new Limits(limits.turn(), limits.segmentTolerance(), limits.pupil(), limits.wear(), weeks, 12, 90);
        Visit visit = CourseText.visit("worn_right=+3.00", "worn_since=" + text(since));
        assertThat(Settling.at(visit, own)).as(source).isEqualTo(settling);
    }

    private static Glasses worn(String right, String left, String add, String since) {
        return glasses(
                "worn_right=" + text(right),
                "worn_left=" + text(left),
                "worn_add=" + text(add),
                "worn_since=" + text(since));
    }

    private static Glasses glasses(String... entries) {
        return CourseText.visit(entries).glasses();
    }

    private static Dioptres dioptres(Double value) {
        return value == null ? null : Dioptres.of(value);
    }

    private static String text(String cell) {
        return Objects.requireNonNullElse(cell, "");
    }
}
