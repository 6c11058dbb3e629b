package plusward.entry;

import java.time.Clock;
import java.time.LocalDate;
import java.util.List;
import java.util.function.Supplier;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import org.springframework.dao.DataIntegrityViolationException;
import org.springframework.dao.OptimisticLockingFailureException;
import org.springframework.stereotype.Component;
import plusward.child.ChildCard;
import plusward.course.Course;
import plusward.exam.Examination;
import plusward.exam.ExaminationReader;
import plusward.exam.Field;
import plusward.exam.Reason;
import plusward.rules.Suspicion;
import plusward.visit.Correction;
import plusward.visit.RecordedVisit;
import plusward.visit.VisitChange;
import plusward.visit.Visits;

/** Takes a typed visit and stores it, or says everything that is wrong with it, or asks about what is unlikely. */
@Component
class EntryDesk {

    private static final int LONGEST_WHY = 200;

    private final Visits visits;
    private final Clock clock;

    EntryDesk(Visits visits, Clock clock) {
        this.visits = visits;
        this.clock = clock;
    }

    Outcome record(ChildCard child, VisitForm form) {
        return judged(child, null, form, (examination, confirmed) -> visits.record(child, examination, confirmed));
    }

    /**
     * Corrects a visit, if it still stands at the version that was read.
     *
     * @param stored the visit as it stands now
     */
    Outcome correct(ChildCard child, RecordedVisit stored, VisitForm form) {
        try {
            return judged(child, stored, form, (examination, confirmed) -> {
                String why = form.why().strip();
                return visits.correct(child, new Correction(stored.id(), form.version(), examination, why, confirmed));
            });
        } catch (OptimisticLockingFailureException overtaken) {
            return new Outcome.Overtaken(visits.find(child, stored.id()).orElse(stored));
        }
    }

    /** How a visit is stored that is neither refused nor in doubt. */
    private interface Store {
        RecordedVisit store(Examination examination, List<Suspicion> confirmed);
    }

    private Outcome judged(ChildCard child, @Nullable RecordedVisit stored, VisitForm form, Store store) {
        ExaminationReader.Result read = ExaminationReader.read(form.text());
        Examination examination = read.examination();
        Stream<Refused> unread = read.refusals().stream().map(Refused::of);
        Stream<Refused> wrong = examination == null ? Stream.empty() : wrong(examination, child, stored);
        List<Refused> refused = Stream.of(unread, wrong, why(examination, stored, form))
                .flatMap(each -> each)
                .toList();
        if (examination == null || !refused.isEmpty()) {
            return new Outcome.Refusals(refused);
        }
        List<Suspicion> suspicions = suspicions(child, stored, examination);
        List<Suspicion> open =
                suspicions.stream().filter(each -> !form.hasConfirmed(each)).toList();
        return open.isEmpty()
                ? stored(() -> store.store(examination, suspicions), examination, child)
                : new Outcome.Doubts(open);
    }

    private Stream<Refused> wrong(Examination examination, ChildCard child, @Nullable RecordedVisit stored) {
        Stream<Refused> secondVisit = visits.findOn(child, examination.date()).stream()
                .filter(other -> stored == null || other.id() != stored.id())
                .map(EntryDesk::secondVisit);
        return Stream.concat(secondVisit, VisitDates.check(examination, child, LocalDate.now(clock)).stream());
    }

    /** A correction says why, unless it changes nothing. */
    private static Stream<Refused> why(
            @Nullable Examination examination, @Nullable RecordedVisit stored, VisitForm form) {
        boolean changes = stored != null && !stored.examination().equals(examination);
        String why = form.why().strip();
        if (changes && why.isEmpty()) {
            return Stream.of(why(Reason.of("entry.why.missing")));
        }
        if (why.chars().anyMatch(Character::isISOControl)) {
            return Stream.of(why(Reason.of("entry.why.control")));
        }
        return why.length() > LONGEST_WHY ? Stream.of(why(Reason.of("entry.why.long", why.length()))) : Stream.empty();
    }

    private static Refused why(Reason problem) {
        return new Refused(Refused.WHY, problem, Reason.of("entry.why.accepted"), null);
    }

    /** What is unlikely about a visit among the child's others, less what was confirmed when it was stored before. */
    private List<Suspicion> suspicions(ChildCard child, @Nullable RecordedVisit stored, Examination examination) {
        List<Examination> others = visits.of(child).stream()
                .filter(each -> stored == null || each.id() != stored.id())
                .map(RecordedVisit::examination)
                .toList();
        List<VisitChange> known = stored == null ? List.of() : visits.changesOf(stored);
        return Suspicion.at(new Course(child.patient(), others).with(examination)).stream()
                .filter(each -> known.stream().noneMatch(change -> confirms(change, each)))
                .toList();
    }

    private static boolean confirms(VisitChange change, Suspicion suspicion) {
        return change.kind() == VisitChange.Kind.CONFIRMED
                && change.field() == suspicion.field()
                && change.after().equals(suspicion.written())
                && change.why().equals(suspicion.code());
    }

    /** Two people may store a visit of the same day at once: the database lets one through. */
    private Outcome stored(Supplier<RecordedVisit> save, Examination examination, ChildCard child) {
        try {
            return new Outcome.Saved(save.get());
        } catch (DataIntegrityViolationException refusedByTheDatabase) {
            return visits.findOn(child, examination.date())
                    .map(other -> new Outcome.Refusals(List.of(secondVisit(other))))
                    .orElseThrow(() -> refusedByTheDatabase);
        }
    }

    private static Refused secondVisit(RecordedVisit other) {
        Reason problem = Reason.of("entry.date.second-visit", other.date());
        return new Refused(Field.VISIT_DATE.column(), problem, Reason.of("entry.date.other-day"), other.id());
    }
}
