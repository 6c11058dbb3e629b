package plusward.handout;

import java.time.LocalDate;
import plusward.exam.Eye;
import plusward.exam.HorizontalTurn;
import plusward.exam.Phase;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;

/** Parts of sentences, as values for other messages. */
final class Phrases {

    private Phrases() {}

    /** {@code the right} or {@code the left}, to stand before "eye" or "lens". */
    static Reason side(Eye eye) {
        return Reason.of(eye == Eye.RIGHT ? "handout.side.right" : "handout.side.left");
    }

    /** {@code 9 March 2026}. */
    static Reason date(LocalDate day) {
        Reason month = Reason.of("handout.month." + day.getMonthValue());
        return Reason.of("handout.date", day.getDayOfMonth(), month, day.getYear());
    }

    /** {@code far away}, {@code up close}, or up close through the lower part of the lenses. */
    static Reason where(TurnCondition condition) {
        return switch (condition) {
            case SC_DISTANCE, CC_DISTANCE -> Reason.of("handout.where.far");
            case ADD_NEAR -> Reason.of("handout.where.add");
            case SC_NEAR, CC_NEAR, TRIAL_NEAR -> Reason.of("handout.where.near");
        };
    }

    /** {@code 25 inward, at times}. */
    static Reason turn(HorizontalTurn turn) {
        if (turn.isOrtho()) {
            return Reason.of("handout.turn.none");
        }
        String way = turn.direction() == HorizontalTurn.Direction.INWARD ? "in" : "out";
        String size = turn.signed().size().toString();
        return Reason.of("handout.turn." + way + suffix(turn.phase()), size);
    }

    private static String suffix(Phase phase) {
        return switch (phase) {
            case MANIFEST -> "";
            case INTERMITTENT -> ".at-times";
            case LATENT -> ".hidden";
        };
    }
}
