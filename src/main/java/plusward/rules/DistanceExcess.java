package plusward.rules;

import plusward.exam.TurnCondition;
import plusward.exam.Turns;
import plusward.optics.PrismDioptres;

/**
 * With glasses an inward turn at distance exceeds near, both through the distance part, by 10 Δ or more (common practice, no
 * source, for the number). An outward turn, or none, at distance is never such an excess.
 */
final class DistanceExcess implements SuddenTurn {

    private static final Limit<PrismDioptres> EXCESS = Limit.under(PrismDioptres.of(10));

    @Override
    public Finding judge(Situation situation) {
        Turns turns = situation.visit().exam().turns();
        PrismDioptres distance = turns.signedAt(TurnCondition.CC_DISTANCE);
        PrismDioptres near = turns.signedAt(TurnCondition.CC_NEAR);
        boolean notInward = distance != null && !distance.isOver(PrismDioptres.ZERO);
        if (notInward || !situation.visit().glasses().areWorn()) {
            return not();
        }
        if (distance == null || near == null) {
            return unknown("distance-unknown");
        }
        PrismDioptres excess = distance.minus(near);
        Evidence evidence = Evidence.of("distance", distance).and("near", near).limit(EXCESS);
        return EXCESS.isCrossedBy(excess) ? raised(evidence, "distance", distance, near, excess) : not();
    }
}
