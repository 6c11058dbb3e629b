package plusward.course;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import plusward.exam.Examination;
import plusward.exam.Glasses;
import plusward.optics.Age;

/** A visit in its course: what was measured, and the way back to earlier visits. It cannot look forward. */
public final class Visit {

    private final Course course;
    private final int index;

    Visit(Course course, int index) {
        this.course = course;
        this.index = index;
    }

    public Examination exam() {
        return course.examinations().get(index);
    }

    public Patient patient() {
        return course.patient();
    }

    public LocalDate date() {
        return exam().date();
    }

    /** The child's age on the day of the visit. */
    public Age age() {
        return patient().ageOn(date());
    }

    public Glasses glasses() {
        return exam().glasses();
    }

    /** True when no visit follows. */
    public boolean isLatest() {
        return index == course.examinations().size() - 1;
    }

    /** The earlier visits, latest first. */
    public Stream<Visit> before() {
        return IntStream.range(0, index).map(i -> index - 1 - i).mapToObj(i -> new Visit(course, i));
    }

    /** This visit and the earlier ones, latest first. */
    public Stream<Visit> upToHere() {
        return Stream.concat(Stream.of(this), before());
    }

    /** This visit and the earlier ones, oldest first. */
    public List<Visit> fromFirst() {
        return IntStream.rangeClosed(0, index)
                .mapToObj(i -> new Visit(course, i))
                .toList();
    }

    /** The latest earlier visit of which this holds; empty when there is none. */
    public Optional<Visit> lastBefore(Predicate<Visit> condition) {
        return before().filter(condition).findFirst();
    }

    @Override
    public String toString() {
        return patient().clinicNumber() + " on " + date();
    }
}
