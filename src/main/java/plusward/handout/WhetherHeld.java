package plusward.handout;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import plusward.course.Control;
import plusward.course.ControlState;
import plusward.course.PatternKind;
import plusward.exam.HorizontalTurn;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;

/** Do the glasses hold the turn? Plain, and not frightening. */
final class WhetherHeld implements Paragraph {

    @Override
    public List<Reason> say(SheetFacts facts) {
        return switch (facts.control().state()) {
            case HELD, HELD_THROUGH_ADD -> held(facts);
            case TURNED_OUT -> List.of(facts.sentence("held.out"), facts.sentence("held.look-at-why"));
            case NOT_HELD_DISTANCE, NOT_HELD_NEAR, NOT_HELD_BOTH -> notHeld(facts);
            case NOT_ASSESSABLE -> notKnown(facts);
        };
    }

    private static List<Reason> held(SheetFacts facts) {
        String add = facts.control().state() == ControlState.HELD_THROUGH_ADD ? ".through-add" : "";
        boolean shows = judged(facts).map(facts::turn).anyMatch(turn -> turn != null && shows(turn));
        return List.of(facts.sentence("held" + add + (shows ? ".nearly" : ".straight")));
    }

    private static List<Reason> notHeld(SheetFacts facts) {
        List<Reason> said = new ArrayList<>();
        if (facts.control().state() == ControlState.NOT_HELD_BOTH) {
            said.add(facts.sentence("held.neither" + now(facts)));
        } else {
            said.addAll(judged(facts).map(condition -> at(facts, condition)).toList());
        }
        said.add(facts.sentence("held.look-at-why"));
        return said;
    }

    /** What once was held is not "not yet" held. */
    private static String now(SheetFacts facts) {
        return facts.pattern().kind() == PatternKind.LOST_CONTROL ? ".now" : "";
    }

    private static List<Reason> notKnown(SheetFacts facts) {
        if (!facts.visit().glasses().areWorn()) {
            return List.of(facts.sentence("held.no-glasses"));
        }
        return judged(facts).allMatch(condition -> facts.turn(condition) == null)
                ? List.of(facts.sentence("held.not-measured"))
                : judged(facts).map(condition -> at(facts, condition)).toList();
    }

    private static Reason at(SheetFacts facts, TurnCondition condition) {
        HorizontalTurn turn = facts.turn(condition);
        String answer = turn == null ? "missing" : Control.breaks(turn, facts.limits()) ? "no" + now(facts) : "yes";
        return facts.sentence("held.at." + answer, Phrases.where(condition));
    }

    private static boolean shows(HorizontalTurn turn) {
        return turn.phase().shows();
    }

    private static Stream<TurnCondition> judged(SheetFacts facts) {
        return Stream.of(TurnCondition.CC_DISTANCE, Control.nearAsJudged(facts.visit()));
    }
}
