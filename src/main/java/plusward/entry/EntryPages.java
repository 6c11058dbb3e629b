package plusward.entry;

import java.time.Clock;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.springframework.stereotype.Component;
import plusward.child.ChildCard;
import plusward.course.Course;
import plusward.draft.Draft;
import plusward.entry.EntryPage.Answer;
import plusward.entry.EntryPage.Kept;
import plusward.exam.Field;
import plusward.readback.ReadBack;
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
        return typed(child, null, form);
    }

    /** A visit as it is stored. */
    EntryPage stored(ChildCard child, RecordedVisit visit) {
        return typed(child, visit, VisitForm.of(visit));
    }

    EntryPage typed(ChildCard child, @Nullable RecordedVisit visit, VisitForm form) {
        List<RecordedVisit> others = visits.of(child).stream()
                .filter(each -> visit == null || each.id() != visit.id())
                .toList();
        LastTime last = LastTime.of(others.stream()
                .filter(each -> visit == null || each.date().isBefore(visit.date()))
                .toList());
        Course course = new Course(
                child.patient(), others.stream().map(RecordedVisit::examination).toList());
        ReadBack readBack = ReadBack.of(course, form.text(), today());
        return new EntryPage(child, visit, last, form, readBack, Answer.NONE, today());
    }

    /** A draft as it was kept. */
    EntryPage draft(ChildCard child, @Nullable RecordedVisit visit, Draft draft) {
        LocalDate begunFor = draft.place().begunFor();
        boolean another = draft.place().isNew() && !begunFor.equals(today());
        LocalDateTime at = LocalDateTime.ofInstant(draft.keptAt(), clock.getZone());
        Answer answer = new Answer(List.of(), List.of(), new Kept(at, begunFor, another));
        return typed(child, visit, VisitForm.of(draft)).with(answer);
    }

    /** What was typed, with the glasses of the visit before. */
    EntryPage withLastGlasses(ChildCard child, @Nullable RecordedVisit visit, VisitForm form) {
        Map<Field, String> glasses = typed(child, visit, form).last().glasses().orElse(Map.of());
        return typed(child, visit, form.with(glasses));
    }

    History history(RecordedVisit visit) {
        return History.of(visit, visits.changesOf(visit), clock.getZone());
    }

    LocalDateTime now() {
        return LocalDateTime.now(clock);
    }

    private LocalDate today() {
        return LocalDate.now(clock);
    }
}
