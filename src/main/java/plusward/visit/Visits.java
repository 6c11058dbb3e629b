package plusward.visit;

import static java.util.stream.Collectors.groupingBy;
import static java.util.stream.Collectors.toMap;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import org.springframework.orm.ObjectOptimisticLockingFailureException;
import org.springframework.stereotype.Service;
import org.springframework.transaction.annotation.Transactional;
import plusward.child.ChildCard;
import plusward.course.Course;
import plusward.exam.Examination;
import plusward.rules.Suspicion;

/** The visits of the clinic's children: the door of this feature. */
@Service
public class Visits {

    /** Beyond this many children it is cheaper to read all visits than to name the children. */
    private static final int FEW = 500;

    private final VisitRepository repository;
    private final ChangeRepository changes;

    Visits(VisitRepository repository, ChangeRepository changes) {
        this.repository = repository;
        this.changes = changes;
    }

    /** The child's examinations in order. */
    @Transactional(readOnly = true)
    public Course courseOf(ChildCard child) {
        return course(child, repository.findByChildIdOrderByVisitDate(child.id()));
    }

    /** The course of each of these children by the child's id, in one query; a child without visits has an empty one. */
    @Transactional(readOnly = true)
    public Map<Long, Course> coursesOf(Collection<ChildCard> children) {
        Map<Long, List<VisitRow>> byChild = rowsOf(children);
        return children.stream()
                .collect(toMap(ChildCard::id, child -> course(child, byChild.getOrDefault(child.id(), List.of()))));
    }

    /** The child's visits with their ids, oldest first. */
    @Transactional(readOnly = true)
    public List<RecordedVisit> of(ChildCard child) {
        return repository.findByChildIdOrderByVisitDate(child.id()).stream()
                .map(VisitRow::recorded)
                .toList();
    }

    /** That visit, if it is one of this child's. */
    @Transactional(readOnly = true)
    public Optional<RecordedVisit> find(ChildCard child, long id) {
        return repository.findByIdAndChildId(id, child.id()).map(VisitRow::recorded);
    }

    /** The child's visit of that day; there is at most one. */
    @Transactional(readOnly = true)
    public Optional<RecordedVisit> findOn(ChildCard child, LocalDate day) {
        return repository.findByChildIdAndVisitDate(child.id(), day).map(VisitRow::recorded);
    }

    /**
     * Stores a new visit.
     *
     * @param confirmed what was asked about while it was typed, and said to be right
     * @throws org.springframework.dao.DataIntegrityViolationException when the child has a visit on that day
     */
    @Transactional
    public RecordedVisit record(ChildCard child, Examination examination, List<Suspicion> confirmed) {
        RecordedVisit stored =
                repository.saveAndFlush(new VisitRow(child.id(), examination)).recorded();
        keepConfirmed(stored.id(), confirmed);
        return stored;
    }

    /**
     * Replaces what was stored of a visit, and keeps for each field what it was, who changed it, when and why. The visit is
     * written before its changes: the other way round two who correct it at once would wait for one another.
     *
     * @throws org.springframework.dao.OptimisticLockingFailureException when it was changed since, or is gone
     * @throws org.springframework.dao.DataIntegrityViolationException when the child has another visit on that day
     */
    @Transactional
    public RecordedVisit correct(ChildCard child, Correction correction) {
        long id = correction.visitId();
        VisitRow row = repository
                .findByIdAndChildId(id, child.id())
                .filter(each -> each.isAt(correction.version()))
                .orElseThrow(() -> new ObjectOptimisticLockingFailureException(VisitRow.class, id));
        List<ChangeRow> made = ChangeRow.between(id, row.examination(), correction.examination(), correction.why());
        row.become(correction.examination());
        RecordedVisit corrected = repository.saveAndFlush(row).recorded();
        changes.saveAll(made);
        keepConfirmed(id, correction.confirmed());
        return corrected;
    }

    private void keepConfirmed(long visitId, List<Suspicion> confirmed) {
        changes.saveAll(confirmed.stream()
                .map(suspicion -> ChangeRow.confirming(visitId, suspicion))
                .toList());
    }

    /** What was changed in a visit since it was stored, and what was confirmed; the latest first. */
    @Transactional(readOnly = true)
    public List<VisitChange> changesOf(RecordedVisit visit) {
        return changes.findByVisitIdOrderByIdDesc(visit.id()).stream()
                .map(ChangeRow::change)
                .toList();
    }

    /** Stores several visits of a child at once, as {@link #bringIn(Map)} does. */
    @Transactional
    public void bringIn(ChildCard child, Collection<Examination> examinations) {
        bringIn(Map.of(child, examinations));
    }

    /** Stores many at once: a visit of a day on which the child is known to have one is replaced, the others are new. */
    @Transactional
    public void bringIn(Map<ChildCard, ? extends Collection<Examination>> visits) {
        Map<Long, List<VisitRow>> known = rowsOf(visits.keySet());
        List<VisitRow> rows = new ArrayList<>();
        List<ChangeRow> made = new ArrayList<>();
        visits.forEach((child, examinations) -> {
            Map<LocalDate, VisitRow> byDate = known.getOrDefault(child.id(), List.of()).stream()
                    .collect(toMap(row -> row.examination().date(), Function.identity()));
            examinations.forEach(each -> rows.add(row(child, each, byDate.get(each.date()), made)));
        });
        repository.saveAll(rows);
        repository.flush();
        changes.saveAll(made);
    }

    private static VisitRow row(
            ChildCard child, Examination examination, @Nullable VisitRow known, List<ChangeRow> made) {
        if (known == null) {
            return new VisitRow(child.id(), examination);
        }
        made.addAll(ChangeRow.between(known.id(), known.examination(), examination, null));
        known.become(examination);
        return known;
    }

    private Map<Long, List<VisitRow>> rowsOf(Collection<ChildCard> children) {
        List<Long> ids = children.stream().map(ChildCard::id).toList();
        List<VisitRow> rows = ids.size() > FEW ? repository.findAll() : repository.findByChildIdIn(ids);
        return rows.stream().collect(groupingBy(VisitRow::childId));
    }

    private static Course course(ChildCard child, List<VisitRow> rows) {
        return new Course(
                child.patient(), rows.stream().map(VisitRow::examination).toList());
    }
}
