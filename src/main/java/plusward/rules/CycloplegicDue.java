package plusward.rules;

import java.time.LocalDate;
import java.time.Period;
import java.util.List;
import plusward.course.CycloplegicInForce;
import plusward.exam.Reason;

/** The last cycloplegic refraction is over 12 months old, or over 3 months while the turn is not held; judged on the day of the visit. */
final class CycloplegicDue implements Rule {

    /** The interval while the turn is not held: 3 months (common practice, no source). */
    private static final int MONTHS_WHEN_NOT_HELD = 3;

    @Override
    public String code() {
        return "cycloplegic-due";
    }

    @Override
    public Source source() {
        return Source.AAO_PPP_2022;
    }

    @Override
    public List<Weight> weights() {
        return List.of(Weight.ACT, Weight.LOOK);
    }

    @Override
    public Finding judge(Situation situation) {
        return CycloplegicInForce.latest(situation.visit())
                .map(last -> judge(situation, last.takenOn()))
                .orElseGet(() -> never(situation));
    }

    private Finding judge(Situation situation, LocalDate takenOn) {
        int months = months(situation);
        LocalDate visited = situation.visit().date();
        return takenOn.plusMonths(months).isBefore(visited)
                ? met(
                        situation.actWhenNotHeld(),
                        Evidence.of("cycloplegicOn", takenOn).and("limitMonths", months),
                        checks(1),
                        takenOn,
                        Period.between(takenOn, visited).toTotalMonths(),
                        months)
                : not(takenOn, months);
    }

    private Finding never(Situation situation) {
        return new Finding.Met(
                code(),
                situation.actWhenNotHeld(),
                Reason.of("finding.cycloplegic-due.never"),
                Evidence.of("limitMonths", months(situation)).values(),
                checks(1),
                source());
    }

    private static int months(Situation situation) {
        int usual = situation.limits().cycloplegicMonths();
        return situation.state().isNotHeld() ? Math.min(MONTHS_WHEN_NOT_HELD, usual) : usual;
    }
}
