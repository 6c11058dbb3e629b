package plusward.rules;

import java.util.List;
import plusward.exam.PerEye;
import plusward.optics.Dioptres;
import plusward.optics.Lens;

/** At this visit's cycloplegic refraction the eyes differ by 1.00 D or more. */
final class UnequalHyperopia implements Rule {

    private static final Limit<Dioptres> UNEQUAL = Limit.under(Dioptres.of(1.00));

    @Override
    public String code() {
        return "unequal-hyperopia";
    }

    @Override
    public Source source() {
        return Source.COMMON_PRACTICE;
    }

    @Override
    public List<Weight> weights() {
        return List.of(Weight.NOTE);
    }

    @Override
    public Finding judge(Situation situation) {
        PerEye<Lens> refraction = situation.visit().exam().cycloplegic().refraction();
        if (refraction.isEmpty()) {
            return notApplicable("no-cycloplegic-today");
        }
        PerEye<Dioptres> equivalent = refraction.map(Lens::sphericalEquivalent);
        Dioptres right = equivalent.right();
        Dioptres left = equivalent.left();
        if (right == null || left == null) {
            return missing();
        }
        Dioptres difference = right.minus(left).size();
        Evidence evidence = Evidence.none()
                .andEyes(equivalent)
                .and("difference", difference)
                .limit(UNEQUAL);
        return UNEQUAL.isCrossedBy(difference)
                ? met(Weight.NOTE, evidence, checks(1), right, left, new Size(difference))
                : not(new Size(difference), new Size(UNEQUAL.bound()));
    }
}
