package plusward.course;

import plusward.exam.TurnCondition;
import plusward.optics.Dioptres;
import plusward.optics.PrismDioptres;

/**
 * What a turn is predicted to measure with other glasses.
 *
 * <p>predicted = measured + slope × (focusing then − focusing now), where focusing is never below 0. The 95 % interval is that
 * of one further measurement: ± 1.96 √(variance of the reading + more² × variance of the slope + 2 more × their covariance +
 * variance of the further reading), with the repeatability of {@link Repeatability} for both readings. It covers the noise of
 * measuring and the uncertainty of the slope, and not that a child may change.
 *
 * <p>Worked example: 14 Δ at near through the distance part, slope 4 Δ/D from other visits with variance 1, and 1.00 D less
 * focusing: 14 − 4 = 10 Δ; sd of each reading 3.3/1.96 = 1.68, so ± 1.96 √(2.83 + 1 + 2.83) = ± 5.1 Δ.
 *
 * @param condition which turn
 * @param focusingNow the focusing at which it was measured, D
 * @param focusingThen the focusing that the other glasses leave, D
 * @param turn the prediction with its interval, inward positive
 */
public record PredictedTurn(
        TurnCondition condition, Dioptres focusingNow, Dioptres focusingThen, Estimate<PrismDioptres> turn) {

    /** Where the prediction and its interval lie against the limit of a held turn. */
    public enum Side {
        /** The whole interval lies within the limit. */
        WITHIN,
        /** The prediction lies within the limit, and its interval crosses it. */
        LIKELY_WITHIN,
        /** The prediction lies over the limit, and its interval crosses it. */
        LIKELY_OVER,
        /** The whole interval lies over the limit. */
        OVER
    }

    static PredictedTurn of(FocusReading reading, FocusSlope slope, Dioptres then) {
        double more = then.minus(reading.accommodation()).amount();
        PrismDioptres expected = slope.expected(reading, more);
        double again = Repeatability.standardDeviation(
                        expected, reading.condition().viewing())
                .amount();
        double deviation = Math.sqrt(slope.varianceOf(reading, more) + again * again);
        return new PredictedTurn(
                reading.condition(),
                reading.accommodation(),
                then,
                Estimate.around(expected.amount(), deviation, PrismDioptres::of));
    }

    /** Against the limit inward; an outward turn over the limit is a matter of its own, see {@link #mayTurnOut}. */
    public Side against(PrismDioptres limit) {
        if (turn.value().isOver(limit)) {
            return turn.low().isOver(limit) ? Side.OVER : Side.LIKELY_OVER;
        }
        return turn.high().isOver(limit) ? Side.LIKELY_WITHIN : Side.WITHIN;
    }

    /** True when the interval reaches an outward turn over the limit. */
    public boolean mayTurnOut(PrismDioptres limit) {
        return turn.low().isUnder(limit.times(-1));
    }
}
