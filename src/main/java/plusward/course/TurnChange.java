package plusward.course;

import java.time.LocalDate;
import java.util.Optional;
import plusward.exam.TurnCondition;
import plusward.optics.PrismDioptres;

/**
 * A reading against the last one taken under the same condition: like is compared with like only.
 *
 * <p>Turns in Δ, inward positive. Worked example: {@code E(T) 14} after {@code E 8} has risen by 6 Δ, which is likely real.
 *
 * @param condition distance or near, and through what
 * @param since the day of the earlier reading
 * @param before the earlier reading, inward positive
 * @param after this reading
 * @param glassesChanged true when the two were not taken through the same pair of glasses, which is then said
 */
public record TurnChange(
        TurnCondition condition, LocalDate since, PrismDioptres before, PrismDioptres after, boolean glassesChanged) {

    /** Empty when the visit lacks the reading, or no earlier visit has it. */
    public static Optional<TurnChange> at(Visit visit, TurnCondition condition) {
        PrismDioptres after = visit.exam().turns().signedAt(condition);
        if (after == null) {
            return Optional.empty();
        }
        return visit.lastBefore(earlier -> earlier.exam().turns().signedAt(condition) != null)
                .flatMap(earlier -> Optional.ofNullable(earlier.exam().turns().signedAt(condition))
                        .map(before -> new TurnChange(
                                condition,
                                earlier.date(),
                                before,
                                after,
                                condition.isCorrected() && !Worn.isSamePair(earlier.glasses(), visit.glasses()))));
    }

    /** Further inward positive. */
    public PrismDioptres amount() {
        return after.minus(before);
    }

    public boolean isReal() {
        return Repeatability.isReal(before, after);
    }

    public boolean isExtrapolated() {
        return Repeatability.isExtrapolated(before, after);
    }
}
