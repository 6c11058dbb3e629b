package plusward.rules;

import java.util.List;
import plusward.exam.TurnCondition;
import plusward.optics.PrismDioptres;

/** With the glasses a latent eso over the limit: held, but with effort. */
final class LargeLatentTurn implements Rule {

    @Override
    public String code() {
        return "large-latent-turn";
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
        Limit<PrismDioptres> limit = Limit.atMost(situation.limits().turn());
        List<TurnCondition> latent = readings.latentOver(limit).toList();
        if (latent.isEmpty()) {
            return readings.areIncomplete() ? missing() : not(limit);
        }
        return met(Weight.LOOK, readings.evidence(latent).limit(limit), checks(1), readings.listed(latent), limit);
    }
}
