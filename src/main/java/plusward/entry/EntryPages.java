package plusward.entry;

import java.time.Clock;
import java.time.LocalDate;
import java.util.Comparator;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.springframework.stereotype.Component;
import plusward.child.ChildCard;
import plusward.exam.Field;
import plusward.visit.RecordedVisit;
import plusward.visit.Visits;
import plusward.web.Screen;

/** Lays out the entry page. */
@Component
class EntryPages {

    private final Visits visits;
    private final Screen screen;
    private final Clock clock;

    EntryPages(Visits visits, Screen screen, Clock clock) {
        this.visits = visits;
        this.screen = screen;
        this.clock = clock;
    }

    /** A new visit: today, by whoever is signed in. */
    EntryPage blank(ChildCard child) {
        VisitForm form = VisitForm.blank()
                .with(Field.VISIT_DATE, today().toString())
                .with(Field.EXAMINER, screen.signedInName());
        return typed(child, null, form, List.of());
    }

    /** A visit as it is stored. */
    EntryPage stored(ChildCard child, RecordedVisit visit) {
        return typed(child, visit, VisitForm.of(visit), List.of());
    }

    EntryPage typed(ChildCard child, @Nullable RecordedVisit visit, VisitForm form, List<Refused> refused) {
        return new EntryPage(child, visit, last(child, visit), form, refused, today());
    }

    /** What was typed, with the glasses of the visit before. */
    EntryPage withLastGlasses(ChildCard child, @Nullable RecordedVisit visit, VisitForm form) {
        RecordedVisit last = last(child, visit);
        VisitForm copied = last == null ? form : form.withGlassesOf(last.examination());
        return new EntryPage(child, visit, last, copied, List.of(), today());
    }

    History history(RecordedVisit visit) {
        return History.of(visit, clock.getZone());
    }

    private LocalDate today() {
        return LocalDate.now(clock);
    }

    private @Nullable RecordedVisit last(ChildCard child, @Nullable RecordedVisit visit) {
        return visits.of(child).stream()
                .filter(each -> visit == null || each.date().isBefore(visit.date()))
                .max(Comparator.comparing(RecordedVisit::date))
                .orElse(null);
    }
}
