package plusward.rules;

import java.util.List;
import plusward.course.ControlState;
import plusward.course.Pattern;
import plusward.course.Worn;
import plusward.exam.TurnCondition;
import plusward.exam.Turns;
import plusward.optics.PrismDioptres;

/** With full plus on, near exceeds distance by 10 Δ or more: convergence excess. */
final class NearGap implements Rule {

    private static final Limit<PrismDioptres> GAP = Limit.under(Pattern.EXCESS_FROM);

    @Override
    public String code() {
        return "near-gap";
    }

    @Override
    public Source source() {
        return Source.LUDWIG_1988;
    }

    @Override
    public List<Weight> weights() {
        return List.of(Weight.ACT, Weight.LOOK);
    }

    @Override
    public Finding judge(Situation situation) {
        if (!situation.visit().glasses().areWorn()) {
            return notApplicable("no-glasses");
        }
        Turns turns = situation.visit().exam().turns();
        PrismDioptres distance = turns.signedAt(TurnCondition.CC_DISTANCE);
        PrismDioptres near = turns.signedAt(TurnCondition.CC_NEAR);
        return distance == null || near == null ? missing() : judge(situation, distance, near);
    }

    private Finding judge(Situation situation, PrismDioptres distance, PrismDioptres near) {
        PrismDioptres gap = near.minus(distance);
        if (!GAP.isCrossedBy(gap)) {
            return not(gap, GAP.bound());
        }
        Evidence evidence = Evidence.of("distance", distance)
                .and("near", near)
                .and("gap", gap)
                .limit(GAP);
        return switch (Worn.fullness(situation.visit())) {
            case SHORT -> notApplicable("plus-short");
            case UNKNOWN -> missing();
            case FULL -> met(weight(situation), evidence, checks(2), near, distance, gap, GAP.bound());
        };
    }

    private static Weight weight(Situation situation) {
        boolean nearNotHeld =
                situation.state() == ControlState.NOT_HELD_NEAR || situation.state() == ControlState.NOT_HELD_BOTH;
        return nearNotHeld && !situation.visit().glasses().haveAdd() ? Weight.ACT : Weight.LOOK;
    }
}
