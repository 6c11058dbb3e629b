package plusward.rules;

import java.util.List;
import plusward.course.CycloplegicInForce;
import plusward.course.Worn;
import plusward.exam.PerEye;
import plusward.optics.Dioptres;

/** Worn plus exceeds the cycloplegic refraction in force by more than 0.50 D, in an eye. */
final class PlusOver implements Rule {

    private static final Limit<Dioptres> OVER = Limit.atMost(Worn.FULL_WITHIN);

    @Override
    public String code() {
        return "plus-over";
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
        PerEye<Dioptres> overBy = Worn.shortBy(situation.visit()).map(eye -> eye.times(-1));
        if (overBy.measured().anyMatch(OVER::isCrossedBy)) {
            CycloplegicInForce found = CycloplegicInForce.at(situation.visit()).orElseThrow();
            return met(
                    Weight.LOOK,
                    Evidence.of("cycloplegicOn", found.takenOn())
                            .andEyes("cycloplegic", found.equivalent())
                            .andEyes("worn", Worn.equivalent(situation.visit().glasses()))
                            .andEyes(overBy)
                            .limit(OVER),
                    checks(2),
                    EyeValues.of(overBy),
                    found.takenOn(),
                    OVER);
        }
        return overBy.isComplete() ? not(OVER) : missing();
    }
}
