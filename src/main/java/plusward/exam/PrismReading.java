package plusward.exam;

import org.jspecify.annotations.Nullable;
import plusward.optics.PrismDioptres;

/**
 * The prism that neutralised a turn: one prism, or one before each eye.
 *
 * <p>Prism dioptres in steps of 0.1 Δ, each 0 to 150 Δ and together at most 150 Δ. Two prisms do not add: 30 before one eye
 * and 25 before the other measure 59.5 Δ (see {@link PrismDioptres#withPrismBeforeOtherEye}). Prints as typed: {@code 25},
 * {@code 30+25}.
 *
 * <p>Refused with {@link IllegalArgumentException}: outside that range, or finer than that step.
 *
 * @param one the prism, or the one before the first eye
 * @param other the prism before the other eye; absent when there was only one
 */
public record PrismReading(PrismDioptres one, @Nullable PrismDioptres other) {

    /** The largest turn that is accepted; larger than any that prisms measure in practice (common practice, no source). */
    public static final PrismDioptres LARGEST = PrismDioptres.of(150);

    /** Where the sum of two prisms' angles would leave the range in which it has a meaning. */
    private static final double RIGHT_ANGLE = 10_000;

    public PrismReading {
        if (!isFitting(one) || (other != null && (!isFitting(other) || !inRange(together(one, other))))) {
            throw new IllegalArgumentException("prism not in steps of 0.1 from 0 to 150: " + one + ", " + other);
        }
    }

    /** One prism of so many prism dioptres. */
    public static PrismReading of(double prismDioptres) {
        return new PrismReading(PrismDioptres.of(prismDioptres), null);
    }

    /** The turn that this neutralises, without a sign. */
    public PrismDioptres total() {
        return other == null ? one : one.withPrismBeforeOtherEye(other);
    }

    private static PrismDioptres together(PrismDioptres one, PrismDioptres other) {
        return one.amount() * other.amount() < RIGHT_ANGLE ? one.withPrismBeforeOtherEye(other) : LARGEST.plus(LARGEST);
    }

    private static boolean isFitting(PrismDioptres prism) {
        return inRange(prism)
                && PrismDioptres.of(Math.rint(prism.amount() * 10) / 10).equals(prism);
    }

    private static boolean inRange(PrismDioptres prism) {
        return !prism.isUnder(PrismDioptres.ZERO) && !prism.isOver(LARGEST);
    }

    @Override
    public String toString() {
        return other == null ? one.toString() : one + "+" + other;
    }
}
