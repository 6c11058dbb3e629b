package plusward.course;

import java.time.LocalDate;

/**
 * Whether the glasses were worn long enough for the turn to settle: 8 weeks by default (in a series of 75 children 81 % reached
 * control within 2 months of glasses, the rest later). Not knowing since when counts as settled, and is said.
 */
public enum Settling {
    /** Worn for the weeks or longer. */
    SETTLED,
    /** Worn for fewer weeks. */
    TOO_SOON,
    /** Since when is not on record. */
    UNKNOWN;

    /** On the day of the visit: the very day on which the weeks are full counts as settled. */
    public static Settling at(Visit visit, Limits limits) {
        LocalDate since = visit.glasses().since();
        if (since == null) {
            return UNKNOWN;
        }
        return since.plusWeeks(limits.settleWeeks()).isAfter(visit.date()) ? TOO_SOON : SETTLED;
    }
}
