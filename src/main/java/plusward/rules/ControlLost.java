package plusward.rules;

import java.util.List;
import java.util.Optional;
import plusward.course.Control;
import plusward.course.CycloplegicInForce;
import plusward.course.Limits;
import plusward.course.Pattern;
import plusward.course.PatternKind;
import plusward.course.Visit;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;

/**
 * The pattern turns to lost control at this visit: held before, now breaking at distance by a real rise.
 *
 * <p>Undecided when the turn was held before and the distance reading is missing, or distance breaks and no cycloplegic refraction of
 * the last 24 months tells the pattern.
 */
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
    public List<Weight> weights() {
        return List.of(Weight.ACT);
    }

    @Override
    public Finding judge(Situation situation) {
        if (!situation.state().isAssessable()) {
            return missing(Sentences.joined(situation.control().because()));
        }
        Pattern now = Pattern.at(situation.visit(), situation.limits());
        if (now.kind() != PatternKind.LOST_CONTROL) {
            return cannotTell(situation) ? missing(Reason.of("finding.control-lost.unknown")) : not();
        }
        return wasLost(situation)
                ? notApplicable("lost-before")
                : met(Weight.ACT, evidence(situation), Ladder.reasons(situation), Sentences.joined(now.because()));
    }

    private static boolean wasLost(Situation situation) {
        return situation
                .visit()
                .before()
                .findFirst()
                .map(before -> Pattern.at(before, situation.limits()).kind())
                .filter(PatternKind.LOST_CONTROL::equals)
                .isPresent();
    }

    private static boolean cannotTell(Situation situation) {
        Visit visit = situation.visit();
        boolean distanceMissing = visit.exam().turns().horizontalAt(TurnCondition.CC_DISTANCE) == null;
        boolean noRefraction =
                distanceBreaks(situation) && CycloplegicInForce.at(visit).isEmpty();
        return (distanceMissing || noRefraction)
                && lastHeld(visit, situation.limits()).isPresent();
    }

    private static boolean distanceBreaks(Situation situation) {
        return Control.breaks(
                situation.visit().exam().turns().horizontalAt(TurnCondition.CC_DISTANCE), situation.limits());
    }

    private static Optional<Visit> lastHeld(Visit visit, Limits limits) {
        return visit.lastBefore(each -> Control.at(each, limits).state().isHeld());
    }

    private static Evidence evidence(Situation situation) {
        Visit held = lastHeld(situation.visit(), situation.limits()).orElseThrow();
        return ReadingEvidence.judged(situation)
                .and("heldOn", held.date())
                .and("distanceThen", held.exam().turns().signedAt(TurnCondition.CC_DISTANCE));
    }
}
