package plusward.rules;

import java.util.List;
import plusward.exam.Acuity;
import plusward.exam.PerEye;
import plusward.exam.Reason;
import plusward.optics.LogMar;

/**
 * With glasses one eye sees two lines or more worse than the other.
 *
 * <p>An eye that counts fingers or less is worse than any line, so beside an eye that reads a chart it is met, without a number.
 * Two eyes in words, or an eye that only fixes and follows, cannot be compared.
 */
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
    public List<Weight> weights() {
        return List.of(Weight.LOOK);
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
            return oneBelowTheChart(acuity) ? belowTheChart(acuity) : missing();
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
                : not(gap, GAP.bound());
    }

    private static boolean oneBelowTheChart(PerEye<Acuity> acuity) {
        return acuity.measured().anyMatch(Acuity::isBelowTheChart)
                && acuity.measured().anyMatch(each -> each.size() != null);
    }

    private Finding belowTheChart(PerEye<Acuity> acuity) {
        return new Finding.Met(
                code(),
                Weight.LOOK,
                Reason.of("finding.acuity-gap.below", EyeValues.written(acuity)),
                Evidence.none().written(acuity).limit(GAP).values(),
                checks(2),
                source());
    }
}
