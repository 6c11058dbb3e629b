package plusward.recall;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import plusward.child.ChildCard;
import plusward.course.Course;
import plusward.course.Limits;
import plusward.course.Visit;
import plusward.rules.Finding;
import plusward.rules.Rulebook;
import plusward.rules.Weight;

/**
 * A child that needs a look, and why.
 *
 * @param first the heaviest finding of the latest visit, which gives the one-line reason
 * @param others how many more findings ask for a decision or a look
 * @param rank place of the first finding in the order of urgency
 * @param seenOn the latest visit
 * @param dueOn when the child should come again; absent when no visit was set
 */
record LookRow(
        ChildCard child,
        Finding.Met first,
        int others,
        int rank,
        LocalDate seenOn,
        @Nullable LocalDate dueOn) {

    /** Empty when nothing at the latest visit asks for a decision or a look. */
    static Optional<LookRow> of(ChildCard child, Course course, LocalDate on, Limits limits) {
        return course.latest().flatMap(visit -> of(child, visit, on, limits));
    }

    private static Optional<LookRow> of(ChildCard child, Visit visit, LocalDate on, Limits limits) {
        List<Finding> all = Rulebook.judge(visit, on, limits);
        List<Finding.Met> asking = Rulebook.met(visit, on, limits).stream()
                .filter(finding -> finding.weight() != Weight.NOTE)
                .toList();
        return asking.stream()
                .findFirst()
                .map(first -> new LookRow(
                        child,
                        first,
                        asking.size() - 1,
                        all.indexOf(first),
                        visit.date(),
                        visit.exam().nextVisit()));
    }
}
