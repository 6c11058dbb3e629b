package plusward.optics;

import java.util.Locale;

/**
 * An amount with a unit: the common face of {@link Dioptres}, {@link PrismDioptres}, {@link Millimetres} and the others.
 *
 * <p>Every quantity is finite, is never negative zero, and is kept on a grid of 10<sup>−9</sup> of its unit, so that
 * differences of typed values such as 5.13 − 5.00 compare with a limit of 0.13 as a person would compare them.
 *
 * <p>Refused with {@link IllegalArgumentException}: an amount, or the result of a calculation, that is not a finite number.
 *
 * @param <Q> the quantity itself, so that only like is added to like and compared with like
 */
public interface Quantity<Q extends Quantity<Q>> extends Comparable<Q> {

    /** The number alone, in the quantity's own unit. */
    double amount();

    /** The unit as the trade writes it, for example {@code D} or {@code Δ}. */
    String unit();

    /** A quantity of the same kind with this amount, in the same unit. */
    Q withAmount(double amount);

    /** The sum, signs respected: inward 10 Δ and outward 4 Δ are inward 6 Δ. */
    default Q plus(Q other) {
        return withAmount(amount() + other.amount());
    }

    /** The difference, signs respected: 5.13 − 5.00 is 0.13, to the last digit. */
    default Q minus(Q other) {
        return withAmount(amount() - other.amount());
    }

    /** So many times this amount; a factor of −1 turns the sign. */
    default Q times(double factor) {
        return withAmount(amount() * factor);
    }

    /** The size without its sign. */
    default Q size() {
        return withAmount(Math.abs(amount()));
    }

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
     * The nearest point of the grid of 10<sup>−9</sup>; negative zero becomes zero.
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

    /** With so many decimals and a minus where there is one: {@code 11.3}, {@code -4.0}; never {@code -0.0}. */
    static String fixed(double value, int decimals) {
        return withoutSignOfZero(String.format(Locale.ROOT, "%." + decimals + "f", value));
    }

    /** With so many decimals and always a sign, as the trade writes lenses: {@code +3.50}; what prints as 0 has none. */
    static String signed(double value, int decimals) {
        return withoutSignOfZero(String.format(Locale.ROOT, "%+." + decimals + "f", value));
    }

    private static String withoutSignOfZero(String printed) {
        return Double.parseDouble(printed) == 0 ? printed.replaceFirst("^[+-]", "") : printed;
    }
}
