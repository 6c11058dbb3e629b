package plusward.rules;

import java.util.List;
import plusward.course.CycloplegicInForce;
import plusward.course.Worn;
import plusward.exam.PerEye;
import plusward.optics.Dioptres;

/** Worn plus falls more than 0.50 D short of the cycloplegic refraction in force, in an eye. */
final class PlusShort implements Rule {

    private static final Limit<Dioptres> SHORT = Limit.atMost(Worn.FULL_WITHIN);

    @Override
    public String code() {
        return "plus-short";
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
        PerEye<Dioptres> shortBy = Worn.shortBy(situation.visit());
        if (shortBy.measured().anyMatch(SHORT::isCrossedBy)) {
            CycloplegicInForce found = CycloplegicInForce.at(situation.visit()).orElseThrow();
            return met(
                    situation.actWhenNotHeld(),
                    Evidence.of("cycloplegicOn", found.takenOn())
                            .andEyes("cycloplegic", found.equivalent())
                            .andEyes("worn", Worn.equivalent(situation.visit().glasses()))
                            .andEyes(shortBy)
                            .limit(SHORT),
                    checks(2),
                    EyeValues.of(shortBy),
                    found.takenOn(),
                    SHORT);
        }
        return shortBy.isComplete() ? not(SHORT) : missing();
    }
}
