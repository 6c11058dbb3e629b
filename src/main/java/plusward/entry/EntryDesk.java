package plusward.entry;

import java.time.Clock;
import java.time.LocalDate;
import java.util.List;
import java.util.function.Supplier;
import java.util.stream.Stream;
import org.springframework.dao.DataIntegrityViolationException;
import org.springframework.dao.OptimisticLockingFailureException;
import org.springframework.stereotype.Component;
import plusward.child.ChildCard;
import plusward.exam.Examination;
import plusward.exam.ExaminationReader;
import plusward.exam.Field;
import plusward.exam.Reason;
import plusward.visit.RecordedVisit;
import plusward.visit.Visits;

/** Takes a typed visit and stores it, or says everything that is wrong with it. */
@Component
class EntryDesk {

    private final Visits visits;
    private final Clock clock;

    EntryDesk(Visits visits, Clock clock) {
        this.visits = visits;
        this.clock = clock;
    }

    Outcome record(ChildCard child, VisitForm form) {
        ExaminationReader.Result read = ExaminationReader.read(form.text());
        Examination examination = read.examination();
        if (examination == null) {
            return refused(read);
        }
        List<Refused> wrong = wrong(examination, child, -1);
        return wrong.isEmpty()
                ? stored(() -> visits.record(child, examination), examination, child)
                : new Outcome.Refusals(wrong);
    }

    /**
     * Corrects a visit, if it still stands at the version that was read.
     *
     * @param stored the visit as it stands now
     */
    Outcome correct(ChildCard child, RecordedVisit stored, VisitForm form) {
        ExaminationReader.Result read = ExaminationReader.read(form.text());
        Examination examination = read.examination();
        if (examination == null) {
            return refused(read);
        }
        List<Refused> wrong = wrong(examination, child, stored.id());
        if (!wrong.isEmpty()) {
            return new Outcome.Refusals(wrong);
        }
        try {
            return stored(() -> visits.correct(child, stored.id(), form.version(), examination), examination, child);
        } catch (OptimisticLockingFailureException overtaken) {
            return new Outcome.Overtaken(visits.find(child, stored.id()).orElse(stored));
        }
    }

    private static Outcome refused(ExaminationReader.Result read) {
        return new Outcome.Refusals(read.refusals().stream().map(Refused::of).toList());
    }

    private List<Refused> wrong(Examination examination, ChildCard child, long own) {
        Stream<Refused> secondVisit = visits.findOn(child, examination.date()).stream()
                .filter(other -> other.id() != own)
                .map(EntryDesk::secondVisit);
        return Stream.concat(secondVisit, VisitDates.check(examination, child, LocalDate.now(clock)).stream())
                .toList();
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
        return new Refused(Field.VISIT_DATE, problem, Reason.of("entry.date.other-day"), other.id());
    }
}
