package plusward.optics;

/**
 * An amount with a unit: the common face of {@link Dioptres}, {@link PrismDioptres}, {@link Millimetres} and the others.
 *
 * <p>Every quantity is finite, is never negative zero, and is kept on a grid of 10<sup>−9</sup> of its unit, so that
 * differences of typed values such as 5.13 − 5.00 compare with a limit of 0.13 as a person would compare them.
 *
 * @param <Q> the quantity itself, so that only like is compared with like
 */
public interface Quantity<Q extends Quantity<Q>> extends Comparable<Q> {

    /** The number alone, in the quantity's own unit. */
    double amount();

    /** The unit as the trade writes it, for example {@code D} or {@code Δ}. */
    String unit();

    /** True when this is strictly more than the other. */
    default boolean isOver(Q other) {
        return compareTo(other) > 0;
    }

    /** True when this is strictly less than the other. */
    default boolean isUnder(Q other) {
        return compareTo(other) < 0;
    }

    @Override
    default int compareTo(Q other) {
        return Double.compare(amount(), other.amount());
    }

    /**
     * The nearest point of the grid.
     *
     * @throws IllegalArgumentException when the value is not a finite number
     */
    static double onGrid(double value) {
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException("not a finite number: " + value);
        }
        double snapped = Math.rint(value * 1e9) / 1e9;
        return Double.isFinite(snapped) ? snapped + 0.0 : value;
    }
}
