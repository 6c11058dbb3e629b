package plusward.exam;

import java.util.EnumMap;
import java.util.Map;
import java.util.function.UnaryOperator;
import org.jspecify.annotations.Nullable;
import plusward.optics.Dioptres;
import plusward.optics.PrismDioptres;

/**
 * The turns measured at one visit, by condition, and the trial plus of the trial reading.
 *
 * <p>A condition that is not in the map was not measured. The trial plus in dioptres, absent when none was held.
 */
public record Turns(
        Map<TurnCondition, Turn> byCondition, @Nullable Dioptres trialPlus) {

    public static final Turns NONE = new Turns(Map.of(), null);

    public Turns {
        byCondition = Map.copyOf(byCondition);
    }

    public @Nullable Turn at(TurnCondition condition) {
        return byCondition.get(condition);
    }

    /** The horizontal turn, inward positive; absent when not measured or not stated. */
    public @Nullable PrismDioptres signedAt(TurnCondition condition) {
        Turn turn = at(condition);
        return turn == null ? null : turn.signed();
    }

    /** The horizontal part; absent when not measured or not stated. */
    public @Nullable HorizontalTurn horizontalAt(TurnCondition condition) {
        Turn turn = at(condition);
        return turn == null ? null : turn.horizontal();
    }

    public Turns mirrored() {
        return mapped(Turn::mirrored);
    }

    private Turns mapped(UnaryOperator<Turn> change) {
        Map<TurnCondition, Turn> changed = new EnumMap<>(TurnCondition.class);
        byCondition.forEach((condition, turn) -> changed.put(condition, change.apply(turn)));
        return new Turns(changed, trialPlus);
    }
}
