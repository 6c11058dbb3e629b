package plusward.course;

import plusward.optics.Quantity;

/**
 * A value computed from measurements, with its 95 % interval. Low and high are what the value may reasonably be.
 *
 * @param <Q> the quantity estimated
 */
public record Estimate<Q extends Quantity<Q>>(Q value, Q low, Q high) {

    /** The factor from a standard deviation to a 95 % interval of a normal distribution. */
    static final double NORMAL_95 = 1.96;

    /** True when the whole interval lies below this. */
    public boolean isWhollyBelow(Q other) {
        return high.isUnder(other);
    }
}
