package plusward.exam;

import java.util.Collections;
import java.util.EnumMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import plusward.optics.PrismDioptres;

/**
 * How the eyes move and which of them the child looks with; any part may be missing.
 *
 * <p>The turn in each direction of gaze is measured with the glasses on, at distance, as the reading straight ahead is,
 * which stands with the other {@link Turns}. A direction that is not in the map was not measured.
 *
 * @param gazes the turns that were measured looking up, down or aside
 * @param ductions the movements of each eye by itself; absent when not looked at
 * @param fixation with which eye the child looks; absent when not looked at
 */
public record Motility(
        Map<Gaze, Turn> gazes,
        @Nullable Ductions ductions,
        @Nullable FixationPreference fixation) {

    /** Nothing was looked at. */
    public static final Motility NONE = new Motility(Map.of(), null, null);

    public Motility {
        Map<Gaze, Turn> inOrder = new EnumMap<>(Gaze.class);
        inOrder.putAll(gazes);
        gazes = Collections.unmodifiableMap(inOrder);
    }

    /** The turn in this direction of gaze; absent when not measured. */
    public @Nullable Turn at(Gaze gaze) {
        return gazes.get(gaze);
    }

    /** The horizontal turn there, inward positive; absent when not measured or not stated. */
    public @Nullable PrismDioptres signedAt(Gaze gaze) {
        Turn turn = at(gaze);
        return turn == null ? null : turn.signed();
    }

    /** As the mirror shows it: the child's right is the left, and each turn as {@link Turn#mirrored} has it. */
    public Motility mirrored() {
        Map<Gaze, Turn> changed = new EnumMap<>(Gaze.class);
        gazes.forEach((gaze, turn) -> changed.put(gaze.mirrored(), turn.mirrored()));
        return new Motility(
                changed, ductions == null ? null : ductions.swapped(), fixation == null ? null : fixation.mirrored());
    }
}
