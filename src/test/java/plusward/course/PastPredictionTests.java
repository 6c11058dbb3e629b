package plusward.course;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import plusward.exam.TurnCondition;
import plusward.optics.Dioptres;
import plusward.optics.PrismDioptres;

class PastPredictionTests {

    private static final String HEAD = "visit_date | cycloplegic_right | worn_right | worn_add | turn_sc_distance |"
            + " turn_cc_distance | turn_cc_near | turn_add_near\n";

    /**
     * Slope (14 − 2)/3 = 4 Δ/D at distance; near through the distance part at 3.00 D, through +2.00 at 1.00 D: 14 and 6 agree.
     * Then +2.50 is worn with +2.50: distance 0.50 D, 2 + 2 = 4; near 3.50 D, 16; through the add 1.00 D, as before 6.
     */
    @Test
    void aChangeOfGlassesIsPredictedFromTheVisitBefore() {
        List<PastPrediction> past = upToLast(HEAD + """
                2024-03-14 | +3.00 | +3.00 | 2.00 | ET 14 | E 2 | ET 14 | E 6
                2024-09-14 |       | +2.50 | 2.50 |       | E 5 | ET 17 | E 6
                """);
        assertThat(past)
                .extracting(each -> each.predicted().condition())
                .containsExactly(TurnCondition.CC_DISTANCE, TurnCondition.CC_NEAR, TurnCondition.ADD_NEAR);
        assertThat(past.stream().map(each -> each.predicted().turn().value().amount()))
                .usingComparatorForType((a, b) -> Math.abs(a - b) < 1e-6 ? 0 : Double.compare(a, b), Double.class)
                .containsExactly(4.0, 16.0, 6.0);
        assertThat(past.get(0).error().amount()).isCloseTo(1, within(1e-6));
        assertThat(past).allMatch(PastPrediction::isInside);
        assertThat(past.get(0).from()).isEqualTo("2024-03-14");
        assertThat(past.get(0).to()).isEqualTo("2024-09-14");
    }

    @Test
    void theSameGlassesAreNoPrediction() {
        assertThat(upToLast(HEAD + """
                2024-03-14 | +3.00 | +3.00 | 2.00 | ET 14 | E 2 | ET 14 | E 6
                2024-09-14 |       | +3.00 | 2.00 |       | E 5 | ET 17 | E 6
                """)).isEmpty();
    }

    @Test
    void withoutASlopeBeforeOrAMeasurementAfterThereIsNone() {
        assertThat(upToLast(HEAD + """
                2024-03-14 |       | +3.00 | 2.00 | ET 14 | E 2 | ET 14 | E 6
                2024-09-14 |       | +2.50 | 2.00 |       | E 5 | ET 17 | E 6
                """)).isEmpty();
        assertThat(upToLast(HEAD + """
                2024-03-14 | +3.00 | +3.00 |      | ET 14 | E 2 | ET 14 |
                2024-09-14 |       | +2.50 |      |       |     |       |
                """)).isEmpty();
    }

    @Test
    void glassesPutOnForTheFirstTimeAreNoChange() {
        assertThat(upToLast(HEAD + """
                2024-03-14 | +3.00 |       |      | ET 14 |     |       |
                2024-09-14 |       | +3.00 |      |       | E 5 | ET 17 |
                """)).isEmpty();
    }

    @Test
    void theEndsOfTheIntervalAreInside() {
        PredictedTurn predicted = new PredictedTurn(
                TurnCondition.CC_NEAR, Dioptres.ZERO, Dioptres.ZERO, Estimate.within(10, 5, PrismDioptres::of));
        assertThat(inside(predicted, 5)).isTrue();
        assertThat(inside(predicted, 15)).isTrue();
        assertThat(inside(predicted, 4.99)).isFalse();
        assertThat(inside(predicted, 15.01)).isFalse();
    }

    private static boolean inside(PredictedTurn predicted, double measured) {
        return new PastPrediction(CourseText.DAY, CourseText.DAY, predicted, PrismDioptres.of(measured)).isInside();
    }

    private static List<PastPrediction> upToLast(String table) {
        return PastPrediction.upTo(
                CourseText.course("2019-05-02", table).latest().orElseThrow());
    }
}
