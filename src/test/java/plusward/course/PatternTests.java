package plusward.course;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.List;
import java.util.Objects;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.exam.Reason;
import plusward.optics.Dioptres;
import plusward.optics.PrismDioptres;

class PatternTests {

    private static final String BORN = "2019-05-02";

    /** One visit on 2025-03-14. Eight weeks before it is 2025-01-17. Turns without glasses at distance, then near. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            H     | worn  | since      | cc distance | cc near | sc distance | sc near | kind                | because                         | source
            +4.00 |       | 2025-01-17 | ET 20       | ET 20   | ET 40       | ET 40   | undetermined        | no-assessable-visit             | no glasses, so nothing to judge
                  | +4.00 | 2025-01-17 | E 2         | E 4     | ET 40       | ET 40   | undetermined        | no-cycloplegic                  | no refraction
                  | +4.00 | 2025-01-17 | XT 12       | E 4     | ET 40       | ET 40   | undetermined        | no-cycloplegic                  | no refraction comes first
            +4.00 | +4.00 | 2025-01-17 | XT 10.1     | E 4     | ET 40       | ET 40   | turned-out          | turned-out                      | exo over 10 Δ
            +4.00 | +4.00 | 2025-01-17 | XT 10       | X 4     | ET 40       | ET 40   | fully-accommodative | held-with-plus                  | exo at 10 Δ
            +4.00 | +3.00 | 2025-03-01 | XT 12       | ET 30   | ET 40       | ET 40   | turned-out          | turned-out                      | before plus and settling are asked
            +4.00 | +3.50 | 2025-01-17 | ET 12       | ET 14   | ET 20       | ET 20   | partly-accommodative | plus-lowers                    | 0.50 D short is full plus
            +4.00 | +3.49 | 2025-01-17 | ET 12       | ET 14   | ET 20       | ET 20   | undetermined        | plus-short                      | 0.51 D short is not
            +4.00 | +4.00 | 2025-01-18 | ET 12       | ET 14   | ET 20       | ET 20   | undetermined        | too-soon                        | a day under 8 weeks: series of 75
            +4.00 | +3.49 | 2025-01-18 | ET 12       | ET 14   | ET 20       | ET 20   | undetermined        | plus-short too-soon             | both, and both are said
            +4.00 | +3.49 | 2025-01-18 | ET 10       | ET 10   | ET 20       | ET 20   | fully-accommodative | held-with-plus                  | nothing breaks, so neither is asked
            +4.00 | +4.00 |            | ET 12       | ET 14   | ET 20       | ET 20   | partly-accommodative | plus-lowers worn-since-unknown | unknown counts as settled, and is said
            +4.00 | +4.00 | 2025-01-17 | E 2         | E 12    | ET 20       | ET 20   | convergence-excess  | near-gap                        | 12 − 2 = 10: Ludwig 1988
            +4.00 | +4.00 | 2025-01-17 | E 2         | E 11.9  | ET 20       | ET 20   | fully-accommodative | held-with-plus                  | 9.9
            +4.00 | +4.00 | 2025-01-17 | ET 10       | ET 20   | ET 40       | ET 40   | convergence-excess  | near-gap                        | near breaks, distance holds at its limit
            +4.00 | +4.00 | 2025-01-17 | ET 10.1     | ET 21   | ET 30       | ET 40   | partly-accommodative | plus-lowers                    | distance breaks: no convergence excess
            +4.00 | +4.00 | 2025-01-17 | ET 14 |  | ET 20 | | partly-accommodative | plus-lowers | near unknown
            +4.00 | +4.00 | 2025-01-17 |             | ET 21   | ET 40       | ET 40   | partly-accommodative | plus-lowers                    | distance unknown is not holding
            +4.00 | +4.00 | 2025-01-17 | ET 14       | ET 14   | ET 20       | ET 14   | partly-accommodative | plus-lowers                    | 20 − 14 = 6 is real (PEDIG 2009)
            +4.00 | +4.00 | 2025-01-17 | ET 14       | ET 14   | ET 14       | ET 20   | partly-accommodative | plus-lowers                    | real at near only
            +4.00 | +4.00 | 2025-01-17 | ET 14       | ET 14   | ET 19       | ET 19   | non-accommodative   | plus-does-not-lower             | 19 − 14 = 5 is noise
            +4.00 | +4.00 | 2025-01-17 | ET 30       | ET 30   | ET 42       | ET 30   | partly-accommodative | plus-lowers                    | 42 − 30 = 12 is real over 20 Δ
            +4.00 | +4.00 | 2025-01-17 | ET 30       | ET 30   | ET 41       | ET 41   | non-accommodative   | plus-does-not-lower             | 11 is noise over 20 Δ
            +4.00 | +4.00 | 2025-01-17 | ET 42       | ET 42   | ET 30       | ET 30   | non-accommodative   | plus-does-not-lower             | more turn with plus is no lowering
            +4.00 | +4.00 | 2025-01-17 | ET 14       | ET 9    |             | ET 30   | undetermined        | no-uncorrected-turn             | sc near says nothing of distance
            +4.00 | +4.00 | 2025-01-17 | ET 14       | ET 14   |             |         | undetermined        | no-uncorrected-turn             | never measured without
            """)
    void the_first_pattern_that_fits_is_given_with_its_reasons(
            String hyperopia,
            String worn,
            String since,
            String ccDistance,
            String ccNear,
            String scDistance,
            String scNear,
            String kind,
            String because,
            String source) {
        Visit visit = CourseText.visit(
                "cycloplegic_right=" + text(hyperopia),
                "cycloplegic_left=" + text(hyperopia),
                "worn_right=" + text(worn),
                "worn_left=" + text(worn),
                "worn_since=" + text(since),
                "turn_cc_distance=" + text(ccDistance),
                "turn_cc_near=" + text(ccNear),
                "turn_sc_distance=" + text(scDistance),
                "turn_sc_near=" + text(scNear));
        Pattern pattern = Pattern.at(visit, Limits.DEFAULT);
        assertThat(pattern.kind().code()).as(source).isEqualTo(kind);
        assertThat(reasons(pattern)).as(source).isEqualTo(because);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            H left | worn left | kind                 | because      | source
            +4.50  | +4.00     | partly-accommodative | plus-lowers  | 0.50 D short in the left eye is full
            +4.51  | +4.00     | undetermined         | plus-short   | 0.51 D short in the left eye alone
                   | +4.00     | undetermined         | plus-unknown | the left eye was not refracted
            +4.00  |           | undetermined         | plus-unknown | no left lens on record
            """)
    void full_plus_is_asked_of_each_eye(String hyperopia, String worn, String kind, String because, String source) {
        Visit visit = CourseText.visit(
                "cycloplegic_right=+4.00",
                "cycloplegic_left=" + text(hyperopia),
                "worn_right=+4.00",
                "worn_left=" + text(worn),
                "worn_since=2025-01-01",
                "turn_cc_distance=ET 12",
                "turn_cc_near=ET 12",
                "turn_sc_distance=ET 20");
        Pattern pattern = Pattern.at(visit, Limits.DEFAULT);
        assertThat(pattern.kind().code()).as(source).isEqualTo(kind);
        assertThat(reasons(pattern)).as(source).isEqualTo(because);
    }

    /** An earlier visit on 2024-03-14, then 2025-03-14; deterioration: Ludwig 1988; a real rise: PEDIG 2009. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            then distance | then near | now distance | now near | kind                 | source
            ET 6          | ET 6      | ET 12        | ET 12    | lost-control         | 12 − 6 = 6 is real
            ET 7          | ET 7      | ET 12        | ET 12    | partly-accommodative | 12 − 7 = 5 is noise
            ET 9          | ET 9      | ET 21        | ET 21    | lost-control         | 21 − 9 = 12 is real over 20 Δ
            ET 10         | ET 10     | ET 21        | ET 21    | partly-accommodative | 21 − 10 = 11 is noise over 20 Δ
            X 4           | X 4       | ET 12        | ET 12    | lost-control         | from exo: 12 + 4 = 16
            E 4           | E 4       | ET 4         | ET 20    | convergence-excess   | only near breaks
            E 4           | E 4       | ET 10        | ET 10    | fully-accommodative  | nothing breaks
            E 4           | E 4       | E 30         | E 30     | fully-accommodative  | latent never breaks
            ET 4          | ET 12     | ET 20        | ET 20    | partly-accommodative | was never held
            ET 4          |           | ET 20        | ET 20    | partly-accommodative | was never known to be held
            E 30          | E 30      | ET 20        | ET 20    | partly-accommodative | did not rise: it was as large, latent
            """)
    void control_is_lost_when_a_held_distance_turn_rises_by_a_real_amount(
            String thenDistance, String thenNear, String nowDistance, String nowNear, String kind, String source) {
        Course course = CourseText.course(BORN, """
                visit_date | cycloplegic_right | cycloplegic_left | worn_right | worn_left | worn_since | turn_cc_distance | turn_cc_near | turn_sc_distance
                2024-03-14 | +4.00             | +4.00            | +4.00      | +4.00     | 2023-12-01 | %s               | %s           |
                2025-03-14 |                   |                  | +4.00      | +4.00     | 2023-12-01 | %s               | %s           | ET 50
                """.formatted(thenDistance, text(thenNear), nowDistance, nowNear));
        assertThat(Pattern.of(course, Limits.DEFAULT).kind().code()).as(source).isEqualTo(kind);
    }

    @Test
    void the_rise_counts_from_the_last_time_it_was_held() {
        Pattern pattern = Pattern.of(CourseText.course(BORN, """
                visit_date | cycloplegic_right | cycloplegic_left | worn_right | worn_left | turn_cc_distance | turn_cc_near
                2024-01-01 | +4.00             | +4.00            | +4.00      | +4.00     | ET 2             | ET 2
                2024-06-01 |                   |                  | +4.00      | +4.00     | ET 9             | ET 9
                2025-01-01 |                   |                  | +4.00      | +4.00     | ET 14            | ET 14
                """), Limits.DEFAULT);
        assertThat(pattern.kind()).isEqualTo(PatternKind.UNDETERMINED);
    }

    @Test
    void control_lost_after_being_held_through_an_add_is_lost_though_the_plus_is_short() {
        Pattern pattern = Pattern.of(CourseText.course(BORN, """
                visit_date | cycloplegic_right | worn_right | worn_add | worn_since | turn_cc_distance | turn_cc_near | turn_add_near
                2024-06-01 | +4.00             | +4.00      | 2.50     | 2024-01-01 | E 4              | ET 14        | E 4
                2025-01-01 | +6.00             | +4.00      | 2.50     | 2024-12-31 | ET 14            | ET 20        | E 4
                """), Limits.DEFAULT);
        assertThat(pattern.kind()).isEqualTo(PatternKind.LOST_CONTROL);
        assertThat(pattern.because().get(1))
                .isEqualTo(Reason.of(
                        "pattern.rose-since",
                        LocalDate.parse("2024-06-01"),
                        PrismDioptres.of(4),
                        PrismDioptres.of(14),
                        PrismDioptres.of(6)));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            sc near | add near | kind                 | source
            ET 40   | ET 12    | partly-accommodative | 40 − 12 through the add
            ET 12   | ET 12    | non-accommodative    | no lowering, even through the add
                    | ET 12    | undetermined         | without glasses near was not measured
            """)
    void with_an_add_the_effect_at_near_is_that_of_plus_and_add(
            String scNear, String addNear, String kind, String source) {
        Visit visit = CourseText.visit(
                "cycloplegic_right=+4.00",
                "cycloplegic_left=+4.00",
                "worn_right=+4.00",
                "worn_left=+4.00",
                "worn_add=2.50",
                "turn_cc_distance=ET 8",
                "turn_cc_near=ET 17",
                "turn_add_near=" + addNear,
                "turn_sc_near=" + text(scNear));
        assertThat(Pattern.at(visit, Limits.DEFAULT).kind().code()).as(source).isEqualTo(kind);
    }

    @Test
    void held_through_an_add_without_a_gap_of_10_is_fully_accommodative() {
        Visit visit = CourseText.visit(
                "cycloplegic_right=+4.00",
                "worn_right=+4.00",
                "worn_add=2.50",
                "turn_cc_distance=ET 6",
                "turn_cc_near=ET 15",
                "turn_add_near=E 2");
        assertThat(Control.at(visit, Limits.DEFAULT).state()).isEqualTo(ControlState.HELD_THROUGH_ADD);
        assertThat(Pattern.at(visit, Limits.DEFAULT).kind()).isEqualTo(PatternKind.FULLY_ACCOMMODATIVE);
    }

    @Test
    void it_is_judged_at_the_latest_visit_at_which_control_can_be() {
        Course course = CourseText.course(BORN, """
                visit_date | cycloplegic_right | worn_right | turn_cc_distance | turn_cc_near
                2023-06-01 | +4.00             | +4.00      | E 4              | E 4
                2024-06-01 |                   | +4.00      | E 4              |
                """);
        Pattern pattern = Pattern.of(course, Limits.DEFAULT);
        assertThat(pattern.kind()).isEqualTo(PatternKind.FULLY_ACCOMMODATIVE);
        assertThat(pattern.because().get(0))
                .isEqualTo(
                        Reason.of("pattern.judged-at", LocalDate.parse("2023-06-01"), Reason.of("control.state.held")));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            refracted  | kind                | source
            2023-03-14 | fully-accommodative | 24 calendar months
            2023-03-13 | undetermined        | a day more
            """)
    void a_refraction_serves_for_24_months(String refracted, String kind, String source) {
        Course course = CourseText.course(BORN, """
                visit_date | cycloplegic_right | worn_right | turn_cc_distance | turn_cc_near
                %s         | +4.00             |            |                  |
                2025-03-14 |                   | +4.00      | E 4              | E 4
                """.formatted(refracted));
        assertThat(Pattern.of(course, Limits.DEFAULT).kind().code()).as(source).isEqualTo(kind);
    }

    @Test
    void a_child_without_a_visit_has_no_pattern_yet() {
        Pattern pattern = Pattern.of(new Course(CourseText.patient(BORN), List.of()), Limits.DEFAULT);
        assertThat(pattern)
                .isEqualTo(new Pattern(PatternKind.UNDETERMINED, List.of(Reason.of("pattern.no-assessable-visit"))));
    }

    @Test
    void the_reasons_carry_their_numbers() {
        Visit partly = CourseText.visit(
                "cycloplegic_right=+4.00",
                "cycloplegic_left=+4.00",
                "worn_right=+4.00",
                "worn_left=+4.00",
                "worn_since=2025-01-01",
                "turn_cc_distance=ET 14",
                "turn_cc_near=ET 9",
                "turn_sc_distance=ET 30");
        assertThat(Pattern.at(partly, Limits.DEFAULT).because().get(1))
                .isEqualTo(Reason.of(
                        "pattern.plus-lowers",
                        PrismDioptres.of(30),
                        PrismDioptres.of(14),
                        PrismDioptres.of(12),
                        Reason.of("condition.cc-distance")));
        Visit excess = CourseText.visit(
                "cycloplegic_right=+4.00", "worn_right=+4.00", "turn_cc_distance=E 2", "turn_cc_near=E 14");
        assertThat(Pattern.at(excess, Limits.DEFAULT).because().get(1))
                .isEqualTo(Reason.of("pattern.near-gap", PrismDioptres.of(12), PrismDioptres.of(10)));
    }

    @Test
    void short_plus_is_said_with_the_eye_that_is_shortest() {
        Visit visit = CourseText.visit(
                "cycloplegic_right=+4.00",
                "cycloplegic_left=+4.75",
                "worn_right=+3.25",
                "worn_left=+3.00",
                "turn_cc_distance=ET 14",
                "turn_cc_near=ET 14");
        assertThat(Pattern.at(visit, Limits.DEFAULT).because().get(1))
                .isEqualTo(Reason.of("pattern.plus-short", Dioptres.of(0.5), Dioptres.of(4.75 - 3.00)));
    }

    /** The keys after the visit it was judged at, without their common beginning. */
    private static String reasons(Pattern pattern) {
        return String.join(
                        " ",
                        pattern.because().stream()
                                .map(Reason::key)
                                .filter(key -> !key.equals("pattern.judged-at"))
                                .toList())
                .replace("pattern.", "");
    }

    private static String text(String cell) {
        return Objects.requireNonNullElse(cell, "");
    }
}
