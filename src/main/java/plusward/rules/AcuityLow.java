package plusward.rules;

import java.time.Period;
import java.util.List;
import plusward.course.Visit;
import plusward.exam.Acuity;
import plusward.exam.PerEye;
import plusward.optics.LogMar;

/** With glasses an eye sees worse than the referral criterion for the age; from 36 months. */
final class AcuityLow implements Rule {

    /** From 60 months on (from memory). */
    private static final Criterion FROM_FIVE = new Criterion(32);
    /** From 48 to 59 months. */
    private static final Criterion AT_FOUR = new Criterion(40);
    /** From 36 to 47 months. */
    private static final Criterion AT_THREE = new Criterion(50);

    private static final int YOUNGEST_MONTHS = 36;

    /** The worst line that passes, 20 over the denominator. */
    record Criterion(int denominator) {

        Limit<LogMar> limit() {
            return Limit.atMost(LogMar.ofSnellen(20, denominator));
        }

        boolean isMissedBy(Acuity acuity) {
            return acuity.isBelowTheChart()
                    || acuity.logMar().filter(limit()::isCrossedBy).isPresent();
        }
    }

    @Override
    public String code() {
        return "acuity-low";
    }

    @Override
    public Source source() {
        return Source.ACUITY_REFERRAL;
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
        Visit visit = situation.visit();
        long months = Period.between(visit.patient().bornOn(), visit.date()).toTotalMonths();
        return months < YOUNGEST_MONTHS
                ? notApplicable("too-young")
                : judge(visit.exam().acuities().each(), criterion(months));
    }

    private static Criterion criterion(long months) {
        if (months < 48) {
            return AT_THREE;
        }
        return months < 60 ? AT_FOUR : FROM_FIVE;
    }

    private Finding judge(PerEye<Acuity> acuity, Criterion criterion) {
        if (acuity.measured().noneMatch(criterion::isMissedBy)) {
            boolean known = acuity.measured().filter(AcuityLow::isKnown).count() == 2;
            return known ? not("20/" + criterion.denominator()) : missing();
        }
        Evidence evidence = Evidence.none().written(acuity).limit(criterion.limit());
        PerEye<Acuity> low = acuity.map(each -> criterion.isMissedBy(each) ? each : null);
        return met(Weight.LOOK, evidence, checks(2), EyeValues.written(low), "20/" + criterion.denominator());
    }

    private static boolean isKnown(Acuity acuity) {
        return acuity.isBelowTheChart() || acuity.logMar().isPresent();
    }
}
