package plusward.handout;

import java.util.List;
import java.util.stream.Stream;
import plusward.course.ControlState;
import plusward.exam.HorizontalTurn;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;

/** What parents see when the glasses come off, and why the glasses stay on while the turn is not held. */
final class WithoutThem implements Paragraph {

    @Override
    public List<Reason> say(SheetFacts facts) {
        ControlState state = facts.control().state();
        if (state.isNotHeld()) {
            return List.of(facts.sentence("off.not-held"));
        }
        return state.isHeld() && turnsInWithout(facts) ? List.of(facts.sentence("off.held")) : List.of();
    }

    private static boolean turnsInWithout(SheetFacts facts) {
        return facts.visit()
                .upToHere()
                .anyMatch(visit -> Stream.of(TurnCondition.SC_DISTANCE, TurnCondition.SC_NEAR)
                        .map(visit.exam().turns()::horizontalAt)
                        .anyMatch(turn -> turn != null && showsInward(turn)));
    }

    private static boolean showsInward(HorizontalTurn turn) {
        return turn.phase().shows() && turn.direction() == HorizontalTurn.Direction.INWARD;
    }
}
