package plusward.rules;

import plusward.exam.Acuity;
import plusward.exam.PerEye;
import plusward.optics.LogMar;

/** With glasses one eye sees two lines or more worse than the other. */
final class AcuityGap implements Rule {

    /** Two lines: 0.20 logMAR (common practice, no source). */
    private static final Limit<LogMar> GAP = Limit.under(LogMar.of(0.20));

    @Override
    public String code() {
        return "acuity-gap";
    }

    @Override
    public Source source() {
        return Source.COMMON_PRACTICE;
    }

    @Override
    public Finding judge(Situation situation) {
        if (!situation.visit().glasses().areWorn()) {
            return notApplicable("no-glasses");
        }
        PerEye<Acuity> acuity = situation.visit().exam().acuities().each();
        PerEye<LogMar> size = acuity.map(Acuity::size);
        LogMar right = size.right();
        LogMar left = size.left();
        if (right == null || left == null) {
            return missing();
        }
        LogMar gap = right.minus(left).size();
        Evidence evidence = Evidence.none().andEyes(size).and("gap", gap).limit(GAP);
        return GAP.isCrossedBy(gap)
                ? met(
                        Weight.LOOK,
                        evidence,
                        checks(2),
                        String.valueOf(acuity.right()),
                        String.valueOf(acuity.left()),
                        gap)
                : not(gap, GAP);
    }
}
