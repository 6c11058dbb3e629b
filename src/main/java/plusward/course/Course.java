package plusward.course;

import java.time.LocalDate;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import plusward.exam.Examination;

/**
 * One child's examinations in order of date. The order in which they are given does not matter.
 *
 * <p>Refused with {@link IllegalArgumentException}: two examinations on one day.
 */
public record Course(Patient patient, List<Examination> examinations) {

    public Course {
        examinations = examinations.stream()
                .sorted(Comparator.comparing(Examination::date))
                .toList();
        Set<LocalDate> days = new HashSet<>();
        if (!examinations.stream().map(Examination::date).allMatch(days::add)) {
            throw new IllegalArgumentException("two examinations on one day");
        }
    }

    /** The visits, oldest first. */
    public List<Visit> visits() {
        return IntStream.range(0, examinations.size())
                .mapToObj(index -> new Visit(this, index))
                .toList();
    }

    /** The latest visit; empty when there is none yet. */
    public Optional<Visit> latest() {
        return examinations.isEmpty() ? Optional.empty() : Optional.of(new Visit(this, examinations.size() - 1));
    }

    /** The visit of that day; empty when there is none. */
    public Optional<Visit> on(LocalDate day) {
        return visits().stream().filter(visit -> visit.date().equals(day)).findFirst();
    }

    /** An examination as a visit among these; one of the same day gives way to it. */
    public Visit with(Examination examination) {
        Stream<Examination> others =
                examinations.stream().filter(each -> !each.date().equals(examination.date()));
        Course together = new Course(
                patient, Stream.concat(others, Stream.of(examination)).toList());
        return together.on(examination.date()).orElseThrow();
    }
}
