package plusward.course;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import plusward.exam.HorizontalTurn;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;
import plusward.exam.Turns;
import plusward.optics.PrismDioptres;

/**
 * Is the turn held with the glasses, at one visit?
 *
 * <p>A reading breaks when it is a manifest or intermittent eso over the limit; a latent turn never breaks. With an add worn,
 * near is judged through the add, otherwise through the distance part. The limit is the clinic's: 10 Δ ("within 10 Δ", J
 * AAPOS 2014;18:261), or 8 Δ, the other published choice (Parks' monofixation). Readings from 8 to 10 Δ are called
 * borderline, whatever the limit.
 *
 * <p>The first that fits: no glasses on record, or no reading with them: cannot be judged; a manifest or intermittent exo over
 * the limit with the glasses: turned out; distance, near or both break: not held there; nothing breaks but a reading that the
 * judgement needs is missing: cannot be judged; an add is worn and near breaks without it: held through the add; else held.
 * Worked example: {@code ET 10} at distance and {@code ET 12} at near, no add, is not held at near.
 *
 * @param state the answer
 * @param because the readings and the limit that led to it, or what is missing
 * @param borderline the judged conditions whose reading shows and lies from 8 to 10 Δ
 */
public record Control(ControlState state, List<Reason> because, List<TurnCondition> borderline) {

    private static final PrismDioptres BORDERLINE_FROM = PrismDioptres.of(8);
    private static final PrismDioptres BORDERLINE_TO = PrismDioptres.of(10);

    public Control {
        because = List.copyOf(because);
        borderline = List.copyOf(borderline);
    }

    public static Control at(Visit visit, Limits limits) {
        return new Judge(visit, limits).control();
    }

    /** The condition by which near is judged: through the add when one is worn, else through the distance part. */
    public static TurnCondition nearAsJudged(Visit visit) {
        return visit.glasses().haveAdd() ? TurnCondition.ADD_NEAR : TurnCondition.CC_NEAR;
    }

    /** True when the reading is a manifest or intermittent eso over the limit; false when it is missing. */
    public static boolean breaks(@Nullable HorizontalTurn turn, Limits limits) {
        return turn != null && turn.phase().shows() && turn.signed().isOver(limits.turn());
    }

    private static final class Judge {

        private final Visit visit;
        private final Limits limits;
        private final Turns turns;
        private final TurnCondition near;

        Judge(Visit visit, Limits limits) {
            this.visit = visit;
            this.limits = limits;
            this.turns = visit.exam().turns();
            this.near = nearAsJudged(visit);
        }

        Control control() {
            if (!visit.glasses().areWorn()) {
                return notAssessable(Reason.of("control.no-glasses"));
            }
            if (corrected().findAny().isEmpty()) {
                return notAssessable(Reason.of("control.no-reading"));
            }
            Optional<TurnCondition> out = corrected().filter(this::turnsOut).findFirst();
            if (out.isPresent()) {
                return because(ControlState.TURNED_OUT, List.of(reading("control.out", out.get())));
            }
            return breaks(TurnCondition.CC_DISTANCE) || breaks(near) ? notHeld() : heldOrMissing();
        }

        private Control notHeld() {
            ControlState state = !breaks(near)
                    ? ControlState.NOT_HELD_DISTANCE
                    : breaks(TurnCondition.CC_DISTANCE) ? ControlState.NOT_HELD_BOTH : ControlState.NOT_HELD_NEAR;
            List<Reason> because = new ArrayList<>(readings());
            because.addAll(missing());
            return because(state, because);
        }

        private Control heldOrMissing() {
            if (!missing().isEmpty()) {
                return because(ControlState.NOT_ASSESSABLE, missing());
            }
            boolean onlyThroughAdd = visit.glasses().haveAdd() && breaks(TurnCondition.CC_NEAR);
            List<Reason> because = new ArrayList<>(readings());
            if (onlyThroughAdd) {
                because.add(reading("control.over", TurnCondition.CC_NEAR));
            }
            return because(onlyThroughAdd ? ControlState.HELD_THROUGH_ADD : ControlState.HELD, because);
        }

        private Control notAssessable(Reason reason) {
            return because(ControlState.NOT_ASSESSABLE, List.of(reason));
        }

        private Control because(ControlState state, List<Reason> reasons) {
            return new Control(state, reasons, borderline());
        }

        private List<Reason> missing() {
            return judged().filter(condition -> turns.horizontalAt(condition) == null)
                    .map(condition -> Reason.of("control.missing", Reason.of(key(condition))))
                    .toList();
        }

        private List<Reason> readings() {
            return judged().filter(condition -> turns.horizontalAt(condition) != null)
                    .map(condition -> reading(wording(condition), condition))
                    .toList();
        }

        private String wording(TurnCondition condition) {
            if (breaks(condition)) {
                return "control.over";
            }
            return isBorderline(condition) ? "control.borderline" : "control.within";
        }

        private Reason reading(String wording, TurnCondition condition) {
            return Reason.of(
                    wording, Reason.of(key(condition)), String.valueOf(turns.horizontalAt(condition)), limits.turn());
        }

        private List<TurnCondition> borderline() {
            return judged().filter(this::isBorderline).toList();
        }

        private boolean isBorderline(TurnCondition condition) {
            HorizontalTurn turn = turns.horizontalAt(condition);
            return turn != null
                    && turn.phase().shows()
                    && !turn.signed().isUnder(BORDERLINE_FROM)
                    && !turn.signed().isOver(BORDERLINE_TO);
        }

        private boolean breaks(TurnCondition condition) {
            return Control.breaks(turns.horizontalAt(condition), limits);
        }

        private boolean turnsOut(TurnCondition condition) {
            HorizontalTurn turn = turns.horizontalAt(condition);
            return turn != null
                    && turn.phase().shows()
                    && turn.signed().times(-1).isOver(limits.turn());
        }

        private Stream<TurnCondition> judged() {
            return Stream.of(TurnCondition.CC_DISTANCE, near);
        }

        private Stream<TurnCondition> corrected() {
            return Stream.of(TurnCondition.CC_DISTANCE, TurnCondition.CC_NEAR, TurnCondition.ADD_NEAR)
                    .filter(condition -> turns.horizontalAt(condition) != null);
        }
    }

    /** The message that names a condition: {@code condition.cc-near}. */
    public static String key(TurnCondition condition) {
        return "condition." + condition.name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
}
