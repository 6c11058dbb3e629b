package plusward.exchange;

import java.time.LocalDate;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/**
 * The children whose visits can be brought in: those of the clinic and those of the file beside.
 *
 * @param stored the clinic's children, by clinic number
 * @param mentioned the clinic numbers in the file beside, its refused rows included; absent when that file could not be
 *     read at all, so that not each of its visits is called a stranger's
 * @param bornOn the days of birth in the file beside, which go before those stored
 */
record KnownChildren(
        Map<String, ChildFacts> stored,
        @Nullable Set<String> mentioned,
        Map<String, LocalDate> bornOn,
        LocalDate today) {

    boolean has(String clinicNumber) {
        return mentioned == null || mentioned.contains(clinicNumber) || stored.containsKey(clinicNumber);
    }

    @Nullable
    LocalDate bornOn(String clinicNumber) {
        LocalDate given = bornOn.get(clinicNumber);
        ChildFacts known = stored.get(clinicNumber);
        return given == null && known != null ? known.bornOn() : given;
    }
}
