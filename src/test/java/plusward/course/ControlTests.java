package plusward.course;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.exam.HoursPerDay;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;
import plusward.optics.Millimetres;
import plusward.optics.PrismDioptres;

class ControlTests {

    private static final String GLASSES = "worn_right=+3.00";

    /** The limit of 10 Δ: J AAPOS 2014;18:261. The limit of 8 Δ: Parks' monofixation. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            distance  | near      | limit (Δ) | state             | source
            ET 10     | ET 10     | 10        | held              | at the limit
            ET 9.9    | ET 9.9    | 10        | held              | under the limit
            ET 10.1   | ET 10     | 10        | not-held-distance | over the limit at distance
            ET 10     | ET 10.1   | 10        | not-held-near     | over the limit at near
            ET 10.1   | ET 10.1   | 10        | not-held-both     | over the limit at both
            E(T) 11   | E(T) 11   | 10        | not-held-both     | intermittent breaks like manifest
            E 40      | E 40      | 10        | held              | latent never breaks
            E 40      | ET 12     | 10        | not-held-near     | latent at distance only
            ortho     | ortho     | 10        | held              | no turn
            ET 8      | ET 8      | 8         | held              | at the other published limit
            ET 8.1    | ET 8      | 8         | not-held-distance | over the other published limit
            ET 10     | ET 10     | 8         | not-held-both     | over the other published limit
            XT 10     | X(T) 10   | 10        | held              | exo at the limit
            XT 10.1   | ET 4      | 10        | turned-out        | manifest exo over the limit
            ET 4      | X(T) 11   | 10        | turned-out        | intermittent exo over the limit
            XT 11     | ET 20     | 10        | turned-out        | turned out is asked first
            X 30      | X 30      | 10        | held              | latent exo is no turning out
            XT 8.1    | ortho     | 8         | turned-out        | exo over the other published limit
            """)
    void the_limit_is_the_largest_turn_that_counts_as_held(
            String distance, String near, double limit, String state, String source) {
        Visit visit = CourseText.visit(GLASSES, "turn_cc_distance=" + distance, "turn_cc_near=" + near);
        assertThat(Control.at(visit, limit(limit)).state().code()).as(source).isEqualTo(state);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            distance | ccNear | addNear | state             | because                                           | source
            ET 4     | ET 12  | ET 4    | held-through-add  | control.within, control.within, control.over      | only the add holds near
            ET 4     | ET 10  | ET 4    | held              | control.within, control.within                    | near holds without it too
            ET 4     |        | ET 4    | held              | control.within, control.within                    | near is judged through the add
            ET 4     | ET 12  | ET 11   | not-held-near     | control.within, control.over                      | not through the add either
            ET 12    | ET 20  | ET 4    | not-held-distance | control.over, control.within                      | near holds through the add
            ET 12    | ET 20  | ET 12   | not-held-both     | control.over, control.over                        | neither
            ET 4     | E 12   | ET 4    | held              | control.within, control.within                    | latent near never breaks
            ET 4     | ET 4   | X(T) 12 | turned-out        | control.out                                       | exo through the add
            ET 4     | X(T) 11 | ET 4   | turned-out        | control.out                                       | exo through the distance part
            """)
    void with_an_add_worn_near_is_judged_through_it(
            String distance, String ccNear, String addNear, String state, String because, String source) {
        Visit visit = CourseText.visit(
                GLASSES,
                "worn_add=2.50",
                turn("cc_distance", distance),
                turn("cc_near", ccNear),
                turn("add_near", addNear));
        Control control = Control.at(visit, Limits.DEFAULT);
        assertThat(control.state().code()).as(source).isEqualTo(state);
        assertThat(keys(control)).as(source).isEqualTo(because);
    }

    @Test
    void an_add_of_nothing_is_none() {
        Visit visit = CourseText.visit(
                GLASSES, "worn_add=0", "turn_cc_distance=E 4", "turn_cc_near=ET 12", "turn_add_near=E 4");
        assertThat(Control.nearAsJudged(visit)).isEqualTo(TurnCondition.CC_NEAR);
        assertThat(Control.at(visit, Limits.DEFAULT).state()).isEqualTo(ControlState.NOT_HELD_NEAR);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            glasses          | add  | distance | near  | through | state             | missing               | source
            worn_right=      |      | ET 20    | ET 20 |         | not-assessable    |                       | no glasses on record
            worn_right=+3.00 |      |          |       |         | not-assessable    |                       | no reading with glasses
            worn_right=+3.00 |      | RHT 4    |       |         | not-assessable    |                       | only a vertical turn
            worn_right=+3.00 |      | ET 4     |       |         | not-assessable    | condition.cc-near     | near was not measured
            worn_right=+3.00 |      |          | ET 4  |         | not-assessable    | condition.cc-distance | distance was not measured
            worn_right=+3.00 | 2.50 | ET 4     | ET 4  |         | not-assessable    | condition.add-near    | near through the add was not measured
            worn_right=+3.00 | 2.50 | ET 4     | ET 14 |         | not-assessable    | condition.add-near    | the add may hold it
            worn_right=+3.00 |      | ET 12    |       |         | not-held-distance | condition.cc-near     | one that breaks is enough
            worn_right=+3.00 |      |          | ET 12 |         | not-held-near     | condition.cc-distance | one that breaks is enough
            worn_right=+3.00 | 2.50 | ET 12    | ET 20 |         | not-held-distance | condition.add-near    | one that breaks is enough
            worn_left=+3.00  |      | ET 4     | ET 4  |         | held              |                       | one lens is glasses
            """)
    void a_missing_reading_is_said_and_never_taken_as_normal(
            String glasses,
            String add,
            String distance,
            String near,
            String through,
            String state,
            String missing,
            String source) {
        Visit visit = CourseText.visit(
                glasses,
                "worn_add=" + (add == null ? "" : add),
                turn("cc_distance", distance),
                turn("cc_near", near),
                turn("add_near", through));
        Control control = Control.at(visit, Limits.DEFAULT);
        assertThat(control.state().code()).as(source).isEqualTo(state);
        List<Reason> expected = missing == null ? List.of() : List.of(Reason.of("control.missing", Reason.of(missing)));
        assertThat(control.because().stream().filter(reason -> reason.key().equals("control.missing")))
                .as(source)
                .isEqualTo(expected);
    }

    @Test
    void without_glasses_and_without_readings_the_reasons_differ() {
        assertThat(keys(Control.at(CourseText.visit("turn_cc_distance=ET 4"), Limits.DEFAULT)))
                .isEqualTo("control.no-glasses");
        assertThat(keys(Control.at(CourseText.visit(GLASSES, "turn_sc_distance=ET 4"), Limits.DEFAULT)))
                .isEqualTo("control.no-reading");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            distance | limit (Δ) | borderline | wording            | source
            ET 7.9   | 10        | false      | control.within     | under 8 Δ
            ET 8     | 10        | true       | control.borderline | from 8 Δ (Parks' monofixation)
            E(T) 10  | 10        | true       | control.borderline | to 10 Δ (J AAPOS 2014;18:261)
            ET 10.1  | 10        | false      | control.over       | over 10 Δ
            E 9      | 10        | false      | control.within     | latent
            XT 9     | 10        | false      | control.within     | exo
            ET 9     | 8         | true       | control.over       | over the clinic's own limit, still near it
            """)
    void readings_from_8_to_10_are_called_borderline(
            String distance, double limit, boolean borderline, String wording, String source) {
        Visit visit = CourseText.visit(GLASSES, "turn_cc_distance=" + distance, "turn_cc_near=ortho");
        Control control = Control.at(visit, limit(limit));
        assertThat(control.borderline())
                .as(source)
                .isEqualTo(borderline ? List.of(TurnCondition.CC_DISTANCE) : List.of());
        assertThat(control.because().get(0))
                .as(source)
                .isEqualTo(Reason.of(wording, Reason.of("condition.cc-distance"), distance, PrismDioptres.of(limit)));
    }

    @Test
    void a_state_says_whether_it_is_held_not_held_or_not_to_be_judged() {
        assertThat(List.of(ControlState.values()).stream().filter(ControlState::isHeld))
                .containsExactly(ControlState.HELD, ControlState.HELD_THROUGH_ADD);
        assertThat(List.of(ControlState.values()).stream().filter(ControlState::isNotHeld))
                .containsExactly(
                        ControlState.NOT_HELD_DISTANCE, ControlState.NOT_HELD_NEAR, ControlState.NOT_HELD_BOTH);
        assertThat(List.of(ControlState.values()).stream().filter(state -> !state.isAssessable()))
                .containsExactly(ControlState.NOT_ASSESSABLE);
    }

    private static String turn(String column, String text) {
        return "turn_" + column + "=" + (text == null ? "" : text);
    }

    private static String keys(Control control) {
        return String.join(", ", control.because().stream().map(Reason::key).toList());
    }

    private static Limits limit(double turn) {
        return new Limits(PrismDioptres.of(turn), Millimetres.of(1), Millimetres.of(4.5), HoursPerDay.of(8), 8, 12, 90);
    }
}
