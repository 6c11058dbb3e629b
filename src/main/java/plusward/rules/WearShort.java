package plusward.rules;

import java.util.List;
import plusward.exam.HoursPerDay;

/** The glasses are worn for fewer hours a day than the clinic asks for. */
final class WearShort implements Rule {

    @Override
    public String code() {
        return "wear-short";
    }

    @Override
    public Source source() {
        return Source.COMMON_PRACTICE;
    }

    @Override
    public List<Weight> weights() {
        return List.of(Weight.ACT, Weight.LOOK);
    }

    @Override
    public Finding judge(Situation situation) {
        if (!situation.visit().glasses().areWorn()) {
            return notApplicable("no-glasses");
        }
        HoursPerDay wear = situation.visit().glasses().wear();
        if (wear == null) {
            return missing();
        }
        Limit<HoursPerDay> limit = Limit.atLeast(situation.limits().wear());
        return limit.isCrossedBy(wear)
                ? met(situation.actWhenNotHeld(), Evidence.of("wear", wear).limit(limit), checks(2), wear, limit)
                : not(wear, limit);
    }
}
