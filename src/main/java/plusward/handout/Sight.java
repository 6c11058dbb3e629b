package plusward.handout;

import plusward.course.Visit;
import plusward.exam.Acuity;
import plusward.exam.PerEye;

/** How well the child reads the chart: judged by the rulebook, never here. */
enum Sight {
    /** Both eyes were measured with glasses, and the rulebook found neither below what is looked for at this age. */
    GOOD,
    /** The rulebook found an eye below it. */
    LOW,
    /** Measured, but not to be judged: by one eye only, without glasses, or in a child too young. */
    MEASURED,
    NOT_MEASURED;

    /** Referral criteria by chart begin here, as in the finding {@code acuity-low}. */
    private static final int JUDGED_FROM_MONTHS = 36;

    static Sight of(SheetFacts facts) {
        PerEye<Acuity> read = read(facts.visit());
        if (facts.found("acuity-low")) {
            return LOW;
        }
        if (read.isEmpty()) {
            return NOT_MEASURED;
        }
        return isJudged(facts.visit()) && facts.ruledOut("acuity-low") ? GOOD : MEASURED;
    }

    private static boolean isJudged(Visit visit) {
        return visit.glasses().areWorn()
                && withGlasses(visit).isComplete()
                && !visit.patient().bornOn().plusMonths(JUDGED_FROM_MONTHS).isAfter(visit.date());
    }

    /** What was read off a chart, with the glasses where it was measured with them, else without; no chart, no value. */
    static PerEye<Acuity> read(Visit visit) {
        PerEye<Acuity> with = withGlasses(visit);
        return with.isEmpty() ? onChart(visit.exam().acuitiesUncorrected().each()) : with;
    }

    static PerEye<Acuity> withGlasses(Visit visit) {
        return onChart(visit.exam().acuities().each());
    }

    private static PerEye<Acuity> onChart(PerEye<Acuity> eyes) {
        return eyes.map(each -> each.logMar().isPresent() ? each : null);
    }
}
