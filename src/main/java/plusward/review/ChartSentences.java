package plusward.review;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import plusward.course.Course;
import plusward.course.Visit;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;
import plusward.optics.PrismDioptres;

/** What chart one shows, said in words: where each turn with glasses began and where it is now. */
final class ChartSentences {

    private ChartSentences() {}

    static List<Reason> of(Course course) {
        return Stream.of(TurnCondition.CC_DISTANCE, TurnCondition.CC_NEAR, TurnCondition.ADD_NEAR)
                .map(condition -> sentence(course, condition))
                .flatMap(Optional::stream)
                .toList();
    }

    private static Optional<Reason> sentence(Course course, TurnCondition condition) {
        List<Visit> measured = course.visits().stream()
                .filter(visit -> turn(visit, condition).isPresent())
                .toList();
        if (measured.isEmpty()) {
            return Optional.empty();
        }
        Visit first = measured.get(0);
        Visit last = measured.get(measured.size() - 1);
        String key = "review.chart." + (measured.size() == 1 ? "once." : "course.") + DerivedParts.name(condition);
        return Optional.of(Reason.of(
                key,
                turn(first, condition).orElseThrow(),
                first.date(),
                turn(last, condition).orElseThrow(),
                last.date()));
    }

    private static Optional<PrismDioptres> turn(Visit visit, TurnCondition condition) {
        return Optional.ofNullable(visit.exam().turns().signedAt(condition));
    }
}
