package plusward.rules;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import plusward.course.DioptresPerYear;
import plusward.course.Trend;
import plusward.exam.Eye;
import plusward.exam.Reason;

/** The 95 % interval of an eye's trend of hyperopia lies wholly below 0, our own choice of what is a fall (common practice, no source). */
final class HyperopiaFalling implements Rule {

    @Override
    public String code() {
        return "hyperopia-falling";
    }

    @Override
    public Source source() {
        return Source.COMMON_PRACTICE;
    }

    @Override
    public List<Weight> weights() {
        return List.of(Weight.NOTE);
    }

    @Override
    public Finding judge(Situation situation) {
        Optional<Trend> right = Trend.at(situation.visit(), Eye.RIGHT);
        Optional<Trend> left = Trend.at(situation.visit(), Eye.LEFT);
        List<Reason> falling = Stream.concat(falling("right", right).stream(), falling("left", left).stream())
                .toList();
        if (falling.isEmpty()) {
            return right.isPresent() && left.isPresent() ? not() : missing();
        }
        Evidence evidence = Evidence.of("right", slope(right))
                .and("rightHigh", high(right))
                .and("left", slope(left))
                .and("leftHigh", high(left))
                .and("limit", DioptresPerYear.ZERO);
        return met(Weight.NOTE, evidence, checks(1), Sentences.listed(falling));
    }

    private static @Nullable DioptresPerYear slope(Optional<Trend> trend) {
        return trend.map(each -> each.slope().value()).orElse(null);
    }

    private static @Nullable DioptresPerYear high(Optional<Trend> trend) {
        return trend.map(each -> each.slope().high()).orElse(null);
    }

    private static Optional<Reason> falling(String eye, Optional<Trend> trend) {
        return trend.filter(each -> each.slope().isWhollyBelow(DioptresPerYear.ZERO))
                .map(each -> Reason.of(
                        "finding.hyperopia-falling." + eye,
                        each.slope().value(),
                        each.slope().low(),
                        each.slope().high(),
                        each.n()));
    }
}
