package plusward.course;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.course.PlusTrial.Step;
import plusward.exam.TurnCondition;
import plusward.optics.Dioptres;
import plusward.optics.PrismDioptres;

class PlusTrialTests {

    /**
     * The worked example of the model: hyperopia +3.00, worn +3.00, add +2.00; turns 14 and 26 without glasses, 2 and 14 with,
     * 6 through the add. The slope is 4 Δ for each dioptre.
     */
    private static final String[] WORKED_EXAMPLE = {
        "cycloplegic_right=+3.00",
        "cycloplegic_left=+3.00",
        "worn_right=+3.00",
        "worn_left=+3.00",
        "worn_add=+2.00",
        "turn_sc_distance=ET 14",
        "turn_sc_near=ET 26",
        "turn_cc_distance=E 2",
        "turn_cc_near=ET 14",
        "turn_add_near=E 6"
    };

    /** Distance focusing = 3.00 − plus, near = distance + 3.00 − add, neither below 0. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            change (D) | distance (Δ) | near (Δ) | through the add (Δ) | source
            -1.00      | 6            | 18       | 10                  | 1.00 D more focusing everywhere: + 4 Δ
            -0.50      | 4            | 16       | 8                   | 0.50 D more: + 2 Δ
            -0.25      | 3            | 15       | 7                   | 0.25 D more: + 1 Δ
            0.00       | 2            | 14       | 6                   | as measured
            0.25       | 2            | 13       | 5                   | distance already needs no focusing; near 0.25 D less
            0.50       | 2            | 12       | 4                   | 0.50 D less at near, the most that is not refused
            """)
    void aChangeOfPlusMovesTheTurnBySlopeTimesFocusing(
            double change, double distance, double near, double add, String source) {
        Step step = step(PlusTrial.at(CourseText.visit(WORKED_EXAMPLE)).steps(), change);
        assertThat(step.refused()).isNull();
        assertThat(expected(step, TurnCondition.CC_DISTANCE)).as(source).isCloseTo(distance, within(1e-6));
        assertThat(expected(step, TurnCondition.CC_NEAR)).as(source).isCloseTo(near, within(1e-6));
        assertThat(expected(step, TurnCondition.ADD_NEAR)).as(source).isCloseTo(add, within(1e-6));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            add (D) | through the add (Δ) | source
            1.00    | 10                  | 6 Δ through +2.00; 1.00 D more focusing: + 4 Δ
            2.00    | 6                   | as measured
            2.50    | 4                   | 0.50 D less: − 2 Δ
            3.00    | 2                   | no focusing is left: 6 − 4 × 1.00
            3.50    | 2                   | none was left before
            """)
    void anotherAddMovesTheTurnThroughIt(double add, double through, String source) {
        Step step = PlusTrial.at(CourseText.visit(WORKED_EXAMPLE)).adds().stream()
                .filter(each -> each.add().equals(Dioptres.of(add)))
                .findFirst()
                .orElseThrow();
        assertThat(expected(step, TurnCondition.ADD_NEAR)).as(source).isCloseTo(through, within(1e-6));
        assertThat(expected(step, TurnCondition.CC_NEAR))
                .as("through the distance part")
                .isCloseTo(14, within(1e-6));
    }

    @Test
    void withoutAnAddThereIsNoTurnThroughIt() {
        Step none = PlusTrial.at(CourseText.visit(WORKED_EXAMPLE)).adds().get(0);
        assertThat(none.add()).isEqualTo(Dioptres.ZERO);
        assertThat(none.at(TurnCondition.ADD_NEAR)).isEmpty();
    }

    /** Trial plus +3.00 lowers near from 30 to 6: slope 24/3 = 8 Δ/D. Through an add of +1.00: 30 − 8 = 22. */
    @Test
    void anAddThatIsNotWornYetIsPredictedFromNearWithTheGlasses() {
        PlusTrial trial = PlusTrial.at(CourseText.visit(
                "cycloplegic_right=+4.00",
                "worn_right=+4.00",
                "turn_cc_near=ET 30",
                "trial_plus=+3.00",
                "turn_trial_near=E 6"));
        assertThat(trial.slope().value().amount()).isCloseTo(8, within(1e-6));
        Step one = trial.adds().get(4);
        assertThat(one.add()).isEqualTo(Dioptres.of(1));
        assertThat(expected(one, TurnCondition.ADD_NEAR)).isCloseTo(22, within(1e-6));
        assertThat(one.at(TurnCondition.CC_DISTANCE))
                .as("distance was not measured")
                .isEmpty();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            worn  | change (D) | refused | source
            +3.00 | 0.50       |         | 0.50 D over the cycloplegic refraction is allowed
            +3.00 | 0.75       | prediction.too-much-plus.right | 0.75 D over it
            +2.50 | 1.00       |         | 0.50 D short, so 1.00 D more is 0.50 D over
            +2.25 | 1.00       |         | 0.25 D over
            +3.25 | 0.25       |         | 0.50 D over
            +3.25 | 0.50       | prediction.too-much-plus.right | 0.75 D over
            """)
    void morePlusThanTheRefractionAndHalfADioptreIsRefused(String worn, double change, String refused, String source) {
        PlusTrial trial = PlusTrial.at(CourseText.visit(
                "cycloplegic_right=+3.00",
                "cycloplegic_left=+3.00",
                "worn_right=" + worn,
                "worn_left=" + worn,
                "turn_sc_distance=ET 14",
                "turn_cc_distance=E 2"));
        Step step = step(trial.steps(), change);
        assertThat(step.refused() == null ? null : step.refused().key())
                .as(source)
                .isEqualTo(refused);
        assertThat(step.turns().isEmpty()).isEqualTo(refused != null);
    }

    @Test
    void theLeftEyeIsGuardedToo() {
        PlusTrial trial = PlusTrial.at(CourseText.visit(
                "cycloplegic_right=+4.00",
                "cycloplegic_left=+3.00",
                "worn_right=+3.00",
                "worn_left=+3.00",
                "turn_sc_distance=ET 14",
                "turn_cc_distance=E 2"));
        assertThat(step(trial.steps(), 0.75).refused().key()).isEqualTo("prediction.too-much-plus.left");
    }

    /**
     * At 5.87 years Hofstetter's least amplitude is 15 − 0.25 × 5.87 = 13.5 D, three quarters of it 10.15 D: no child of this
     * age is refused by it below +10 D of hyperopia. At 60 years it is 0.
     */
    @Test
    void moreFocusingThanIsKeptUpIsRefused() {
        Course course = CourseText.course("1966-01-01", """
                visit_date | cycloplegic_right | worn_right | turn_cc_near | trial_plus | turn_trial_near
                2025-03-14 | +3.00             | +3.00      | ET 14        | +1.00      | E 10
                """);
        PlusTrial trial = PlusTrial.at(course.latest().orElseThrow());
        assertThat(step(trial.steps(), -0.25).refused().key()).isEqualTo("prediction.too-much-focusing");
        assertThat(step(trial.steps(), 0).refused()).isNull();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            without                                             | refusal                     | source
            worn_right worn_left worn_add                       | prediction.no-glasses       | no glasses
            cycloplegic_right cycloplegic_left                  | prediction.no-cycloplegic   | no refraction
            turn_cc_distance turn_cc_near turn_add_near         | prediction.no-turn          | no turn with the glasses
            turn_sc_distance turn_sc_near turn_add_near         | prediction.no-slope         | only near and distance with: no slope
            """)
    void whatIsMissingIsSaid(String without, String refusal, String source) {
        String[] left = List.of(WORKED_EXAMPLE).stream()
                .filter(entry -> !List.of(without.split(" ", -1)).contains(entry.substring(0, entry.indexOf('='))))
                .toArray(String[]::new);
        PlusTrial trial = PlusTrial.at(CourseText.visit(left));
        assertThat(trial.refusals()).as(source).extracting(each -> each.key()).contains(refusal);
        assertThat(trial.steps()).isEmpty();
        assertThat(trial.slope()).isNull();
    }

    /** Turns of 2 and 14 without less focusing would need a slope below 0: 14 through less plus, 2 through none. */
    @Test
    void aSlopeBelowZeroIsNotUsed() {
        PlusTrial trial = PlusTrial.at(CourseText.visit(
                "cycloplegic_right=+3.00", "worn_right=+3.00", "turn_sc_distance=E 2", "turn_cc_distance=ET 14"));
        assertThat(trial.refusals()).extracting(each -> each.key()).containsExactly("prediction.no-slope");
    }

    /**
     * Distance with the glasses 14, sd 4.1/1.96; without glasses 26 at 3.00 D more, sd 7.3/1.96. Slope (26 − 14)/3 = 4,
     * variance (2.0918² + 3.7245²)/9 = 2.0275. The slope falls as the reading rises: covariance −2.0918²/3 = −1.4586.
     * One dioptre less plus: 14 + 4 = 18; variance 4.3758 + 2.0275 − 2 × 1.4586 = 3.4861, a further reading 4.3758, in all
     * 7.8619: ± 1.96 × 2.8039 = ± 5.4957.
     */
    @Test
    void theIntervalCountsBothReadingsTheSlopeAndTheirCovariance() {
        PlusTrial trial = PlusTrial.at(CourseText.visit(
                "cycloplegic_right=+3.00", "worn_right=+3.00", "turn_sc_distance=ET 26", "turn_cc_distance=ET 14"));
        Estimate<PrismDioptres> turn = step(trial.steps(), -1)
                .at(TurnCondition.CC_DISTANCE)
                .orElseThrow()
                .turn();
        assertThat(turn.value().amount()).isCloseTo(18, within(1e-6));
        assertThat(turn.high().minus(turn.value()).amount()).isCloseTo(5.4957, within(1e-3));
        assertThat(turn.value().minus(turn.low()).amount()).isCloseTo(5.4957, within(1e-3));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            value | half | side          | source
            5     | 5    | WITHIN        | up to 10 at most
            5     | 5.01 | LIKELY_WITHIN | reaches over
            10    | 1    | LIKELY_WITHIN | the limit itself is held
            10.01 | 1    | LIKELY_OVER   | over, and down to 9.01
            11    | 1    | LIKELY_OVER   | down to the limit itself
            11.01 | 1    | OVER          | the whole interval is over
            """)
    void aPredictionStandsAgainstTheLimitWithItsInterval(
            double value, double half, PredictedTurn.Side side, String source) {
        assertThat(turn(value, half).against(PrismDioptres.of(10))).as(source).isEqualTo(side);
    }

    @Test
    void anIntervalThatReachesAnOutwardTurnOverTheLimitIsSaid() {
        assertThat(turn(-5, 5).mayTurnOut(PrismDioptres.of(10))).isFalse();
        assertThat(turn(-5, 5.01).mayTurnOut(PrismDioptres.of(10))).isTrue();
    }

    private static PredictedTurn turn(double value, double half) {
        return new PredictedTurn(
                TurnCondition.CC_NEAR, Dioptres.ZERO, Dioptres.ZERO, Estimate.within(value, half, PrismDioptres::of));
    }

    private static Step step(List<Step> steps, double change) {
        return steps.stream()
                .filter(each -> each.change().equals(Dioptres.of(change)))
                .findFirst()
                .orElseThrow();
    }

    private static double expected(Step step, TurnCondition condition) {
        return step.at(condition).orElseThrow().turn().value().amount();
    }
}
