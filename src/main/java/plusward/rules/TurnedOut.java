package plusward.rules;

import java.util.List;
import plusward.course.ControlState;
import plusward.exam.TurnCondition;
import plusward.optics.PrismDioptres;

/** With the glasses a manifest or intermittent exo over the limit. */
final class TurnedOut implements Rule {

    @Override
    public String code() {
        return "turned-out";
    }

    @Override
    public Source source() {
        return Source.JAAPOS_2014;
    }

    @Override
    public List<Weight> weights() {
        return List.of(Weight.ACT);
    }

    @Override
    public Finding judge(Situation situation) {
        if (!situation.visit().glasses().areWorn()) {
            return notApplicable("no-glasses");
        }
        OutwardReadings readings = OutwardReadings.of(situation);
        if (situation.state() != ControlState.TURNED_OUT) {
            return readings.areIncomplete() ? missing() : not();
        }
        Limit<PrismDioptres> limit = Limit.atMost(situation.limits().turn());
        List<TurnCondition> out = readings.showing().toList();
        return met(Weight.ACT, readings.evidence(out).limit(limit), checks(3), readings.listed(out), limit);
    }
}
