package plusward.entry;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import plusward.child.ChildCard;
import plusward.exam.Examination;
import plusward.exam.Field;
import plusward.exam.Reason;

/** What cannot be true of the dates of a visit: it lies within the child's life so far, and so do its glasses. */
final class VisitDates {

    private VisitDates() {}

    static List<Refused> check(Examination examination, ChildCard child, LocalDate today) {
        List<Refused> refused = new ArrayList<>();
        LocalDate date = examination.date();
        LocalDate born = child.bornOn();
        if (date.isBefore(born)) {
            refused.add(of(Field.VISIT_DATE, Reason.of("entry.date.before-birth", date, born), born, today));
        } else if (date.isAfter(today)) {
            refused.add(of(Field.VISIT_DATE, Reason.of("entry.date.future", date), born, today));
        }
        LocalDate since = examination.glasses().since();
        if (since != null && since.isBefore(born)) {
            refused.add(of(Field.WORN_SINCE, Reason.of("entry.date.before-birth", since, born), born, date));
        } else if (since != null && since.isAfter(date)) {
            refused.add(of(Field.WORN_SINCE, Reason.of("entry.date.after-visit", since, date), born, date));
        }
        return refused;
    }

    private static Refused of(Field field, Reason problem, LocalDate from, LocalDate to) {
        return Refused.of(field, problem, Reason.of("entry.date.between", from, to));
    }
}
