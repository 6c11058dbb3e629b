package plusward.review;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import plusward.course.Trend;
import plusward.course.Visit;
import plusward.exam.Eye;
import plusward.exam.Reason;

/** How the hyperopia of each eye runs, with its uncertainty, or why that cannot be told. */
final class TrendSentences {

    private TrendSentences() {}

    static List<Reason> at(Visit visit) {
        return Stream.of(Eye.values())
                .map(eye ->
                        Trend.at(visit, eye).map(trend -> sentence(eye, trend)).or(() -> missing(eye)))
                .flatMap(Optional::stream)
                .toList();
    }

    private static Reason sentence(Eye eye, Trend trend) {
        return Reason.of(
                "review.trend." + (eye == Eye.RIGHT ? "right" : "left"),
                trend.slope().value(),
                trend.slope().low(),
                trend.slope().high(),
                trend.n(),
                trend.projectedAge(),
                trend.projected().value(),
                trend.projected().low(),
                trend.projected().high());
    }

    private static Optional<Reason> missing(Eye eye) {
        return Optional.of(Reason.of("review.trend.missing." + (eye == Eye.RIGHT ? "right" : "left")));
    }
}
