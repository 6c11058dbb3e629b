package plusward.visit;

import java.time.Instant;
import org.jspecify.annotations.Nullable;
import plusward.exam.Field;

/**
 * One field of a visit that was changed after it was stored, or an unlikely text of it that was confirmed.
 *
 * @param at when
 * @param by the account; absent when the application did it by itself
 * @param before what stood there; empty when nothing did
 * @param after what stands there since; empty when it was taken away
 * @param why the reason that was given; the suspicion that was confirmed; empty for an import
 */
public record VisitChange(
        Instant at, @Nullable String by, Kind kind, Field field, String before, String after, String why) {

    /** How it came about. */
    public enum Kind {
        /** Typed anew by a person, who said why. */
        CORRECTED,
        /** Brought in with a file. */
        IMPORTED,
        /** Possible but unlikely, asked about, and said to be right. */
        CONFIRMED
    }
}
