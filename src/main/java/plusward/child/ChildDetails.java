package plusward.child;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;

/**
 * What the clinic writes down of a child, valid by construction where ChildReader made it.
 *
 * @param clinicNumber the clinic's own number, unique
 * @param turnFirstSeenMonths age in whole months at which a turn was first seen, 0 to 216; absent when not known
 * @param handoutLanguage {@code en} or {@code es}
 */
public record ChildDetails(
        String clinicNumber,
        @Nullable String givenName,
        @Nullable String familyName,
        LocalDate bornOn,
        @Nullable Integer turnFirstSeenMonths,
        String handoutLanguage,
        @Nullable String note) {}
