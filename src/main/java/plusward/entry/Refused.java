package plusward.entry;

import org.jspecify.annotations.Nullable;
import plusward.exam.Field;
import plusward.exam.Reason;
import plusward.exam.Refusal;

/**
 * A field whose text cannot be stored.
 *
 * @param problem what is wrong with it
 * @param accepted what to enter instead
 * @param visit the visit that stands in the way; absent where none does
 */
record Refused(
        Field field,
        Reason problem,
        Reason accepted,
        @Nullable Long visit) {

    static Refused of(Refusal refusal) {
        return new Refused(
                refusal.field(), refusal.problem().reason(), refusal.problem().accepted(), null);
    }
}
