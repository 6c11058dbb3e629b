package plusward.recall;

import java.time.LocalDate;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import plusward.child.ChildCard;
import plusward.course.Course;
import plusward.course.Limits;

/**
 * The children that need a look, in a stated order: what needs a decision before what needs a look, then in the order of the
 * rulebook, then who was seen longest ago, then by clinic number.
 */
final class LookList {

    private static final Comparator<LookRow> MOST_URGENT_FIRST = Comparator.comparing(
                    (LookRow row) -> row.first().weight())
            .thenComparing(LookRow::rank)
            .thenComparing(LookRow::seenOn)
            .thenComparing(row -> row.child().clinicNumber());

    private LookList() {}

    static List<LookRow> of(Map<ChildCard, Course> courses, LocalDate on, Limits limits) {
        return courses.entrySet().stream()
                .map(each -> LookRow.of(each.getKey(), each.getValue(), on, limits))
                .flatMap(Optional::stream)
                .sorted(MOST_URGENT_FIRST)
                .toList();
    }
}
