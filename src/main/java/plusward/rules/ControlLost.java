package plusward.rules;

import plusward.course.Limits;
import plusward.course.Pattern;
import plusward.course.PatternKind;
import plusward.course.Visit;

/** The pattern turns to lost control at this visit: held before, now breaking at distance by a real rise. */
final class ControlLost implements Rule {

    @Override
    public String code() {
        return "control-lost";
    }

    @Override
    public Source source() {
        return Source.LUDWIG_1988;
    }

    @Override
    public Finding judge(Situation situation) {
        if (!situation.state().isAssessable()) {
            return missing(Sentences.joined(situation.control().because()));
        }
        Pattern now = Pattern.at(situation.visit(), situation.limits());
        if (now.kind() != PatternKind.LOST_CONTROL) {
            return not();
        }
        return situation
                        .visit()
                        .before()
                        .findFirst()
                        .filter(before -> isLost(before, situation.limits()))
                        .isPresent()
                ? notApplicable("lost-before")
                : met(
                        Weight.ACT,
                        ReadingEvidence.judged(situation),
                        Ladder.reasons(situation),
                        Sentences.joined(now.because()));
    }

    private static boolean isLost(Visit visit, Limits limits) {
        return Pattern.at(visit, limits).kind() == PatternKind.LOST_CONTROL;
    }
}
