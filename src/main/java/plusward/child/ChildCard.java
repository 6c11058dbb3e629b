package plusward.child;

import java.time.LocalDate;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import plusward.course.Patient;

/**
 * A registered child, as it stood when it was read.
 *
 * @param version rises with each correction, so that a correction of an older state is noticed
 */
public record ChildCard(
        long id,
        String clinicNumber,
        @Nullable String givenName,
        @Nullable String familyName,
        LocalDate bornOn,
        @Nullable Integer turnFirstSeenMonths,
        String handoutLanguage,
        @Nullable String note,
        int version) {

    /** What of this child bears on reading the measurements. */
    public Patient patient() {
        return new Patient(clinicNumber, bornOn, turnFirstSeenMonths);
    }

    public ChildDetails details() {
        return new ChildDetails(
                clinicNumber, givenName, familyName, bornOn, turnFirstSeenMonths, handoutLanguage, note);
    }

    /** Given and family name; the clinic number for a child whose name was not written down. */
    public String shownName() {
        return joined(" ", givenName, familyName);
    }

    /** Family name first, as lists are sorted. */
    public String listedName() {
        return joined(", ", familyName, givenName);
    }

    private String joined(String between, @Nullable String first, @Nullable String second) {
        String name = Stream.of(first == null ? "" : first, second == null ? "" : second)
                .filter(part -> !part.isBlank())
                .collect(Collectors.joining(between));
        return name.isEmpty() ? clinicNumber : name;
    }
}
