package plusward.course;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import plusward.optics.Age;

/**
 * What of a child bears on reading the measurements.
 *
 * @param clinicNumber the clinic's own number
 * @param bornOn day of birth
 * @param turnFirstSeenMonths age in whole months at which a turn was first seen; absent when not known
 */
public record Patient(
        String clinicNumber, LocalDate bornOn, @Nullable Integer turnFirstSeenMonths) {

    /** The child's age on a day, in years of 365.2425 days. */
    public Age ageOn(LocalDate day) {
        return Age.between(bornOn, day);
    }
}
