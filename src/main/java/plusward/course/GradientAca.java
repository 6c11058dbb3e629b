package plusward.course;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;
import plusward.exam.Turns;
import plusward.exam.Viewing;
import plusward.optics.Dioptres;
import plusward.optics.PrismDioptres;
import plusward.optics.PrismPerDioptre;

/**
 * The AC/A ratio by the gradient: (turn without − turn with)/added plus, both at near.
 *
 * <p>Over the add, from the reading through the distance part and the one through the segment; over a trial plus likewise.
 * The interval comes from the repeatability of both readings. Normal is under 5 Δ/D (Dickey and Scott 1988); medians near
 * 2.0 in normal subjects, and "no universal normal range" (Murray and Newsham 2018): so the ratio is reported, not labelled.
 * Worked example: near 30 Δ, through +3.00 near 6 Δ: 8.0 Δ/D.
 */
public final class GradientAca {

    private GradientAca() {}

    /** Over the add when it can be had, else over the trial plus; empty when neither can. */
    public static Optional<AcaEstimate> at(Visit visit) {
        return overAdd(visit).or(() -> overTrial(visit));
    }

    /** Needs an add on record, and both near readings. */
    public static Optional<AcaEstimate> overAdd(Visit visit) {
        return gradient(
                visit, TurnCondition.ADD_NEAR, visit.glasses().asOrdered().add());
    }

    /** Needs a trial plus, and both near readings. */
    public static Optional<AcaEstimate> overTrial(Visit visit) {
        return gradient(visit, TurnCondition.TRIAL_NEAR, visit.exam().turns().trialPlus());
    }

    private static Optional<AcaEstimate> gradient(Visit visit, TurnCondition through, @Nullable Dioptres plus) {
        Turns turns = visit.exam().turns();
        PrismDioptres without = turns.signedAt(TurnCondition.CC_NEAR);
        PrismDioptres with = turns.signedAt(through);
        if (without == null || with == null || plus == null || !plus.isOver(Dioptres.ZERO)) {
            return Optional.empty();
        }
        Reason from = Reason.of("aca.gradient", Reason.of(Control.key(through)), plus);
        return Optional.of(new AcaEstimate(estimate(without, with, plus), from));
    }

    static Estimate<PrismPerDioptre> estimate(PrismDioptres without, PrismDioptres with, Dioptres plus) {
        double ratio = without.minus(with).amount() / plus.amount();
        double spread = Math.hypot(sd(without), sd(with)) / plus.amount();
        return Estimate.around(ratio, spread, PrismPerDioptre::of);
    }

    private static double sd(PrismDioptres turn) {
        return Repeatability.standardDeviation(turn, Viewing.NEAR).amount();
    }
}
