package plusward.rules;

import java.util.List;
import plusward.course.CycloplegicInForce;
import plusward.course.Worn;
import plusward.exam.PerEye;
import plusward.exam.Reason;
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
    public Finding judge(Situation situation) {
        PerEye<Dioptres> shortBy = Worn.shortBy(situation.visit());
        if (shortBy.measured().anyMatch(SHORT::isCrossedBy)) {
            return met(situation, shortBy);
        }
        return shortBy.isComplete()
                ? new Finding.NotMet(code(), Reason.of("finding.plus-short.not", SHORT))
                : new Finding.Undecided(code(), Reason.of("finding.plus-short.missing"));
    }

    private Finding met(Situation situation, PerEye<Dioptres> shortBy) {
        CycloplegicInForce found = CycloplegicInForce.at(situation.visit()).orElseThrow();
        Evidence evidence =
                Evidence.of("cycloplegicOn", found.takenOn()).andEyes(shortBy).limit(SHORT);
        return new Finding.Met(
                code(),
                situation.actWhenNotHeld(),
                Reason.of("finding.plus-short.met", EyeValues.of(shortBy), found.takenOn(), SHORT),
                evidence.values(),
                List.of(Reason.of("finding.plus-short.check.1"), Reason.of("finding.plus-short.check.2")),
                source());
    }
}
