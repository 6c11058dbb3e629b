package plusward.rules;

import java.util.List;
import plusward.course.ControlState;
import plusward.exam.TurnCondition;
import plusward.optics.PrismDioptres;

/** With the glasses a manifest or intermittent exo up to the limit. */
final class LeaningOut implements Rule {

    @Override
    public String code() {
        return "leaning-out";
    }

    @Override
    public Source source() {
        return Source.COMMON_PRACTICE;
    }

    @Override
    public List<Weight> weights() {
        return List.of(Weight.LOOK);
    }

    @Override
    public Finding judge(Situation situation) {
        if (!situation.visit().glasses().areWorn()) {
            return notApplicable("no-glasses");
        }
        OutwardReadings readings = OutwardReadings.of(situation);
        List<TurnCondition> out = readings.showing().toList();
        if (out.isEmpty()) {
            return readings.areIncomplete() ? missing() : not();
        }
        Limit<PrismDioptres> limit = Limit.atMost(situation.limits().turn());
        return situation.state() == ControlState.TURNED_OUT
                ? notApplicable("turned-out")
                : met(Weight.LOOK, readings.evidence(out).limit(limit), checks(2), readings.listed(out), limit);
    }
}
