package plusward.course;

import java.util.Optional;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;
import plusward.exam.Turns;
import plusward.exam.Viewing;
import plusward.optics.Millimetres;
import plusward.optics.PrismDioptres;
import plusward.optics.PrismPerDioptre;

/**
 * The AC/A ratio from the turns at distance and near: PD in cm + (near − distance)/3, both through the distance part.
 *
 * <p>Meant for full plus on; otherwise it is labelled. Where the pupil distance was not measured the usual one for the age
 * stands in and is labelled assumed. The interval comes from the repeatability of both readings; the pupil distance is taken
 * as exact. Worked examples: PD 50 mm, distance 5, near 20: 10 Δ/D; PD 60 mm, distance −2, near −8: 4 Δ/D.
 */
public final class HeterophoriaAca {

    private static final double NEAR_DEMAND = 3;

    private HeterophoriaAca() {}

    /** Empty unless both readings with the glasses are there. */
    public static Optional<AcaEstimate> at(Visit visit) {
        Turns turns = visit.exam().turns();
        PrismDioptres distance = turns.signedAt(TurnCondition.CC_DISTANCE);
        PrismDioptres near = turns.signedAt(TurnCondition.CC_NEAR);
        if (distance == null || near == null) {
            return Optional.empty();
        }
        Millimetres measured = visit.exam().pupilDistance();
        Millimetres pd = measured == null ? PupilDistance.usualAt(visit.age()) : measured;
        String pdKey = measured == null ? "aca.pd-assumed" : "aca.pd-measured";
        Reason plus = Reason.of(
                switch (Worn.fullness(visit)) {
                    case FULL -> "aca.full-plus";
                    case SHORT -> "aca.plus-short";
                    case UNKNOWN -> "aca.plus-unknown";
                });
        return Optional.of(new AcaEstimate(
                estimate(pd, distance, near), Reason.of("aca.heterophoria", Reason.of(pdKey, pd.unsigned()), plus)));
    }

    static Estimate<PrismPerDioptre> estimate(Millimetres pd, PrismDioptres distance, PrismDioptres near) {
        double ratio = pd.inCentimetres() + near.minus(distance).amount() / NEAR_DEMAND;
        double spread = Math.hypot(sd(distance, Viewing.DISTANCE), sd(near, Viewing.NEAR)) / NEAR_DEMAND;
        return Estimate.around(ratio, spread, PrismPerDioptre::of);
    }

    private static double sd(PrismDioptres turn, Viewing viewing) {
        return Repeatability.standardDeviation(turn, viewing).amount();
    }
}
