package plusward.rules;

import java.time.LocalDate;
import java.time.temporal.ChronoUnit;
import java.util.List;

/** The day set for the next visit has passed; only for the latest visit, on the day of the judgement. */
final class VisitOverdue implements Rule {

    @Override
    public String code() {
        return "visit-overdue";
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
        if (!situation.visit().isLatest()) {
            return notApplicable("not-latest");
        }
        LocalDate due = situation.visit().exam().nextVisit();
        if (due == null) {
            return missing();
        }
        int days = Math.toIntExact(ChronoUnit.DAYS.between(due, situation.on()));
        int limit = situation.limits().overdueDays();
        Evidence evidence = Evidence.of("due", due).and("days", days).and("limitDays", limit);
        return days > 0 ? met(days > limit ? Weight.ACT : Weight.LOOK, evidence, checks(1), due, days) : not(due);
    }
}
