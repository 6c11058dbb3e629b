package plusward.child;

import java.time.LocalDate;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;

/**
 * What the clinic writes down of a child.
 *
 * <p>Refused with {@link IllegalArgumentException}: a clinic number that is not {@linkplain #isClinicNumber plain}.
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
        @Nullable String note) {

    private static final Pattern CLINIC_NUMBER = Pattern.compile("[\\p{L}\\p{N}./-]{1,20}");

    public ChildDetails {
        if (!isClinicNumber(clinicNumber)) {
            throw new IllegalArgumentException("not a plain clinic number");
        }
    }

    /** True for 1 to 20 letters, digits, dots, dashes and slashes: it stands in file names, addresses and tables. */
    public static boolean isClinicNumber(String text) {
        return CLINIC_NUMBER.matcher(text).matches();
    }
}
