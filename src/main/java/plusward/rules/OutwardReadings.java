package plusward.rules;

import java.util.List;
import java.util.stream.Stream;
import plusward.course.Control;
import plusward.exam.HorizontalTurn;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;
import plusward.exam.Turns;
import plusward.optics.PrismDioptres;

/** The readings with glasses, picked by what the rules about outward and latent turns ask for. */
record OutwardReadings(Turns turns, TurnCondition near) {

    private static final List<TurnCondition> WITH_GLASSES =
            List.of(TurnCondition.CC_DISTANCE, TurnCondition.CC_NEAR, TurnCondition.ADD_NEAR);

    static OutwardReadings of(Situation situation) {
        return new OutwardReadings(situation.visit().exam().turns(), Control.nearAsJudged(situation.visit()));
    }

    /** True when distance, or near as it is judged, was not measured: then nothing can be excluded. */
    boolean areIncomplete() {
        return turns.horizontalAt(TurnCondition.CC_DISTANCE) == null || turns.horizontalAt(near) == null;
    }

    /** Conditions at which an outward turn shows, manifest or intermittent. */
    Stream<TurnCondition> showing() {
        return WITH_GLASSES.stream().filter(condition -> {
            HorizontalTurn turn = turns.horizontalAt(condition);
            return turn != null && turn.phase().shows() && turn.signed().isUnder(PrismDioptres.ZERO);
        });
    }

    /** Conditions at which a latent inward turn crosses the limit. */
    Stream<TurnCondition> latentOver(Limit<PrismDioptres> limit) {
        return WITH_GLASSES.stream().filter(condition -> {
            HorizontalTurn turn = turns.horizontalAt(condition);
            return turn != null && !turn.phase().shows() && limit.isCrossedBy(turn.signed());
        });
    }

    /** "E(T) 14 at near, with glasses", each of them. */
    Reason listed(List<TurnCondition> conditions) {
        return Sentences.listed(conditions.stream().map(this::worded).toList());
    }

    private Reason worded(TurnCondition condition) {
        return Reason.of("finding.reading", String.valueOf(turns.at(condition)), Reason.of(Control.key(condition)));
    }

    Evidence evidence(List<TurnCondition> conditions) {
        Evidence evidence = Evidence.none();
        for (TurnCondition condition : conditions) {
            evidence.and(name(condition), turns.signedAt(condition));
        }
        return evidence;
    }

    private static String name(TurnCondition condition) {
        return switch (condition) {
            case CC_DISTANCE -> "distance";
            case CC_NEAR -> "near";
            case ADD_NEAR -> "nearThroughAdd";
            default -> "other";
        };
    }
}
