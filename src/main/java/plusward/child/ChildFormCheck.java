package plusward.child;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.util.Set;
import java.util.regex.Pattern;
import org.springframework.validation.BindingResult;

/** Finds everything that is wrong with a typed child, in the order of the page. */
final class ChildFormCheck {

    private static final Set<String> LANGUAGES = Set.of("en", "es");
    private static final Pattern LINE = Pattern.compile("\\P{Cntrl}{0,80}");
    private static final Pattern NOTE = Pattern.compile("[\\P{Cntrl}\\n\\t]{0,4000}");
    private static final Pattern MONTHS = Pattern.compile("\\d{0,3}");
    private static final int MOST_MONTHS = 216;
    private static final LocalDate EARLIEST = LocalDate.of(1900, 1, 1);

    private final BindingResult errors;

    private ChildFormCheck(BindingResult errors) {
        this.errors = errors;
    }

    static void check(ChildForm form, LocalDate today, BindingResult errors) {
        ChildFormCheck check = new ChildFormCheck(errors);
        check.that(ChildDetails.isClinicNumber(form.getClinicNumber().strip()), "clinicNumber", "child.number.refused");
        check.that(LINE.matcher(form.getGivenName().strip()).matches(), "givenName", "child.given-name.refused");
        check.that(LINE.matcher(form.getFamilyName().strip()).matches(), "familyName", "child.family-name.refused");
        check.date(form.getBornOn().strip(), today);
        check.that(isAge(form.getTurnFirstSeenMonths().strip()), "turnFirstSeenMonths", "child.onset.refused");
        check.that(LANGUAGES.contains(form.getHandoutLanguage()), "handoutLanguage", "child.language.refused");
        String note = form.getNote().replace("\r\n", "\n").strip();
        check.that(NOTE.matcher(note).matches(), "note", "child.note.refused");
    }

    private void that(boolean good, String field, String otherwise) {
        if (!good) {
            errors.rejectValue(field, otherwise);
        }
    }

    private void date(String typed, LocalDate today) {
        try {
            LocalDate born = LocalDate.parse(typed);
            that(!born.isAfter(today), "bornOn", "child.born.future");
            that(!born.isBefore(EARLIEST), "bornOn", "child.born.early");
        } catch (DateTimeException notADate) {
            errors.rejectValue("bornOn", "child.born.refused");
        }
    }

    private static boolean isAge(String months) {
        return MONTHS.matcher(months).matches() && (months.isEmpty() || Integer.parseInt(months) <= MOST_MONTHS);
    }
}
