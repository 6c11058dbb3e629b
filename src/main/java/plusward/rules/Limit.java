package plusward.rules;

import plusward.optics.Quantity;

/**
 * A limit that decides and prints: the same object says whether a value crosses it and how it is written.
 *
 * @param side which values are allowed
 * @param bound the limit itself
 * @param <Q> the quantity that is limited
 */
public record Limit<Q extends Quantity<Q>>(Side side, Q bound) {

    /** Which values are allowed. */
    public enum Side {
        /** Up to and including the bound. */
        AT_MOST("≤"),
        /** Anything less than the bound. */
        UNDER("<"),
        /** The bound and more. */
        AT_LEAST("≥");

        private final String sign;

        Side(String sign) {
            this.sign = sign;
        }
    }

    public static <Q extends Quantity<Q>> Limit<Q> atMost(Q bound) {
        return new Limit<>(Side.AT_MOST, bound);
    }

    public static <Q extends Quantity<Q>> Limit<Q> under(Q bound) {
        return new Limit<>(Side.UNDER, bound);
    }

    public static <Q extends Quantity<Q>> Limit<Q> atLeast(Q bound) {
        return new Limit<>(Side.AT_LEAST, bound);
    }

    /** True when the value is not allowed. */
    public boolean isCrossedBy(Q value) {
        return switch (side) {
            case AT_MOST -> value.isOver(bound);
            case UNDER -> !value.isUnder(bound);
            case AT_LEAST -> value.isUnder(bound);
        };
    }

    /** As it is written beside a value: {@code ≤ 10 Δ}, {@code ≤ 0.50 D}. */
    @Override
    public String toString() {
        return side.sign + " " + new Size(bound);
    }
}
