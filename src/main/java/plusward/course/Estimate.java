package plusward.course;

import java.util.function.DoubleFunction;
import plusward.optics.Quantity;

/**
 * A value computed from measurements, with its 95 % interval: value ± 1.96 standard deviations, unless its maker says otherwise.
 *
 * <p>All three in the unit of the quantity. The interval covers the noise of the measurements and not the model's own
 * faults.
 *
 * @param <Q> the quantity estimated
 */
public record Estimate<Q extends Quantity<Q>>(Q value, Q low, Q high) {

    /** The factor from a standard deviation to a 95 % interval of a normal distribution. */
    static final double NORMAL_95 = 1.96;

    /** The value with 1.96 standard deviations either way. */
    static <Q extends Quantity<Q>> Estimate<Q> around(double value, double standardDeviation, DoubleFunction<Q> unit) {
        return within(value, NORMAL_95 * standardDeviation, unit);
    }

    /** The value with this much either way. */
    static <Q extends Quantity<Q>> Estimate<Q> within(double value, double half, DoubleFunction<Q> unit) {
        return new Estimate<>(unit.apply(value), unit.apply(value - half), unit.apply(value + half));
    }

    /** True when the whole interval lies below this. */
    public boolean isWhollyBelow(Q other) {
        return high.isUnder(other);
    }
}
