package plusward.course;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.exam.TurnCondition;
import plusward.optics.PrismDioptres;

class TurnChangeTests {

    private static final Course COURSE = CourseText.course("2019-05-02", """
            visit_date | worn_right | worn_since | turn_sc_distance | turn_cc_distance | turn_cc_near
            2023-03-14 |            |            | ET 30            |                  |
            2023-09-14 | +3.00      | 2023-04-01 | ET 25            | E 8              | E 8
            2024-03-14 | +3.00      | 2023-04-01 |                  |                  | RHT 4
            2024-09-14 | +3.00      | 2023-04-01 | ET 31            | E(T) 14          | E 4
            2025-03-14 | +3.50      | 2025-01-01 |                  | E 4              | E 9
            """);

    @Test
    void a_reading_is_compared_with_the_last_of_its_kind() {
        assertThat(TurnChange.at(COURSE.visits().get(3), TurnCondition.CC_DISTANCE))
                .contains(new TurnChange(
                        TurnCondition.CC_DISTANCE,
                        LocalDate.parse("2023-09-14"),
                        PrismDioptres.of(8),
                        PrismDioptres.of(14),
                        false));
    }

    @Test
    void a_visit_with_only_a_vertical_turn_is_passed_over() {
        assertThat(TurnChange.at(COURSE.visits().get(2), TurnCondition.CC_NEAR)).isEmpty();
        assertThat(TurnChange.at(COURSE.visits().get(3), TurnCondition.CC_NEAR)
                        .orElseThrow()
                        .before())
                .isEqualTo(PrismDioptres.of(8));
    }

    @Test
    void the_first_reading_has_nothing_to_compare_with() {
        assertThat(TurnChange.at(COURSE.visits().get(0), TurnCondition.SC_DISTANCE))
                .isEmpty();
        assertThat(TurnChange.at(COURSE.visits().get(1), TurnCondition.CC_DISTANCE))
                .isEmpty();
    }

    @Test
    void other_glasses_are_said_but_not_of_a_turn_without_glasses() {
        assertThat(change(4, TurnCondition.CC_DISTANCE).glassesChanged()).isTrue();
        assertThat(change(3, TurnCondition.CC_DISTANCE).glassesChanged()).isFalse();
        assertThat(change(1, TurnCondition.SC_DISTANCE).glassesChanged()).isFalse();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            visit | condition   | amount (Δ) | real  | extrapolated | source
            3     | CC_DISTANCE | 6          | true  | false        | 14 − 8, PEDIG 2009
            4     | CC_DISTANCE | -10        | true  | false        | 4 − 14
            1     | SC_DISTANCE | -5         | false | false        | 25 − 30, over 20 Δ from 12
            3     | SC_DISTANCE | 6          | false | false        | 31 − 25, over 20 Δ from 12
            3     | CC_NEAR     | -4         | false | true         | 4 − 8, both under 10 Δ
            4     | CC_NEAR     | 5          | false | true         | 9 − 4, both under 10 Δ
            """)
    void its_size_and_whether_it_is_real_follow(
            int visit, TurnCondition condition, double amount, boolean real, boolean extrapolated, String source) {
        TurnChange change = change(visit, condition);
        assertThat(change.amount()).as(source).isEqualTo(PrismDioptres.of(amount));
        assertThat(change.isReal()).as(source).isEqualTo(real);
        assertThat(change.isExtrapolated()).as(source).isEqualTo(extrapolated);
    }

    private static TurnChange change(int visit, TurnCondition condition) {
        return TurnChange.at(COURSE.visits().get(visit), condition).orElseThrow();
    }
}
