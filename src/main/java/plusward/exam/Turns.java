package plusward.exam;

import java.util.Collections;
import java.util.EnumMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import plusward.optics.Dioptres;
import plusward.optics.PrismDioptres;

/**
 * The turns measured at one visit, by condition, and the trial plus of the trial reading.
 *
 * <p>A condition that is not in the map was not measured; the others come in the order of {@link TurnCondition}.
 *
 * @param byCondition the turns that were measured
 * @param trialPlus the extra plus held over the glasses for the trial reading, in dioptres; absent when none was held
 */
public record Turns(
        Map<TurnCondition, Turn> byCondition, @Nullable Dioptres trialPlus) {

    /** No turn was measured. */
    public static final Turns NONE = new Turns(Map.of(), null);

    public Turns {
        Map<TurnCondition, Turn> inOrder = new EnumMap<>(TurnCondition.class);
        inOrder.putAll(byCondition);
        byCondition = Collections.unmodifiableMap(inOrder);
    }

    /** The turn under this condition; absent when not measured. */
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

    /** As the mirror shows them; see {@link Turn#mirrored}. */
    public Turns mirrored() {
        Map<TurnCondition, Turn> changed = new EnumMap<>(TurnCondition.class);
        byCondition.forEach((condition, turn) -> changed.put(condition, turn.mirrored()));
        return new Turns(changed, trialPlus);
    }
}
