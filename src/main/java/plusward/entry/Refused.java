package plusward.entry;

import org.jspecify.annotations.Nullable;
import plusward.exam.Field;
import plusward.exam.Reason;
import plusward.exam.Refusal;

/**
 * An entry whose text cannot be stored.
 *
 * @param name the name of the input: a field's column, or {@code why}
 * @param problem what is wrong with it
 * @param accepted what to enter instead
 * @param visit the visit that stands in the way; absent where none does
 */
record Refused(
        String name,
        Reason problem,
        Reason accepted,
        @Nullable Long visit) {

    /** The reason for a correction. */
    static final String WHY = "why";

    static Refused of(Refusal refusal) {
        return of(refusal.field(), refusal.problem().reason(), refusal.problem().accepted());
    }

    static Refused of(Field field, Reason problem, Reason accepted) {
        return new Refused(field.column(), problem, accepted, null);
    }
}
