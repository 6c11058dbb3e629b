package plusward.rules;

import plusward.course.Control;
import plusward.exam.TurnCondition;
import plusward.exam.Turns;

/** The turns with glasses as evidence. */
final class ReadingEvidence {

    private ReadingEvidence() {}

    /** Distance, and near as it is judged, with the clinic's limit. */
    static Evidence judged(Situation situation) {
        Turns turns = situation.visit().exam().turns();
        TurnCondition near = Control.nearAsJudged(situation.visit());
        return Evidence.of("distance", turns.signedAt(TurnCondition.CC_DISTANCE))
                .and(near == TurnCondition.ADD_NEAR ? "nearThroughAdd" : "near", turns.signedAt(near))
                .limit(Limit.atMost(situation.limits().turn()));
    }
}
