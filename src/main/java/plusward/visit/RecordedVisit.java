package plusward.visit;

import java.time.Instant;
import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import plusward.exam.Examination;

/**
 * A visit as it is kept: the examination, and who entered and changed it when.
 *
 * @param version rises with each correction, so that a correction of an older state is noticed
 * @param enteredBy the account name; absent when the application stored it by itself
 * @param changedBy the account of the last change, which is the entry itself when there was no other
 */
public record RecordedVisit(
        long id,
        int version,
        Examination examination,
        @Nullable String enteredBy,
        Instant enteredAt,
        @Nullable String changedBy,
        Instant changedAt) {

    public LocalDate date() {
        return examination.date();
    }

    /** True when it was corrected since it was entered. */
    public boolean isChanged() {
        return version > 0;
    }
}
