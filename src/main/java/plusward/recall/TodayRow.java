package plusward.recall;

import java.time.LocalDate;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import plusward.child.ChildCard;
import plusward.course.Course;

/** A child who is expected today by the date set at the last visit, or who was seen today. */
record TodayRow(ChildCard child, boolean seen) {

    static List<TodayRow> of(Map<ChildCard, Course> courses, LocalDate today) {
        return courses.entrySet().stream()
                .filter(each -> isSeen(each.getValue(), today) || isExpected(each.getValue(), today))
                .map(each -> new TodayRow(each.getKey(), isSeen(each.getValue(), today)))
                .sorted(Comparator.comparing(row -> row.child().clinicNumber()))
                .toList();
    }

    private static boolean isSeen(Course course, LocalDate today) {
        return course.on(today).isPresent();
    }

    private static boolean isExpected(Course course, LocalDate today) {
        return course.latest()
                .map(visit -> today.equals(visit.exam().nextVisit()))
                .orElse(false);
    }
}
