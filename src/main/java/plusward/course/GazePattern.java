package plusward.course;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import plusward.exam.Gaze;
import plusward.exam.Motility;
import plusward.optics.PrismDioptres;

/**
 * How the turn differs between directions of gaze, with the glasses, at distance.
 *
 * <p>Up minus down, and right minus left, each the horizontal turn, inward positive. Up minus down above 0: more inward, or
 * less outward, looking up, as the strokes of an A close upward. Below 0: more inward looking down, as those of a V close
 * downward. Right and left are the child's; a side difference means that the turn is not the same in all directions.
 *
 * <p>Δ, signed. Absent where one of the two readings, or its horizontal part, was not measured; that is never 0. No interval
 * is given: the repeatability that is known was measured looking straight ahead. A value to look at, no finding.
 *
 * <p>A V pattern counts from 15 Δ, an A pattern from 10 Δ: from memory. Worked example: {@code ET 10} looking up and
 * {@code ET 25} looking down are −15 Δ, a V pattern.
 *
 * @param upMinusDown the turn looking up minus that looking down; absent unless both were measured
 * @param rightMinusLeft the turn looking right minus that looking left; absent unless both were measured
 */
public record GazePattern(
        @Nullable PrismDioptres upMinusDown, @Nullable PrismDioptres rightMinusLeft) {

    private static final PrismDioptres V_FROM = PrismDioptres.of(-15);
    private static final PrismDioptres A_FROM = PrismDioptres.of(10);

    /** The letter whose strokes the sight lines follow from down to up. */
    public enum Letter {
        /** More inward looking up, by 10 Δ or more. */
        A,
        /** More inward looking down, by 15 Δ or more. */
        V
    }

    /** What the readings of this visit show; each difference absent unless both of its readings are there. */
    public static GazePattern at(Visit visit) {
        Motility motility = visit.exam().motility();
        return new GazePattern(
                difference(motility.signedAt(Gaze.UP), motility.signedAt(Gaze.DOWN)),
                difference(motility.signedAt(Gaze.RIGHT), motility.signedAt(Gaze.LEFT)));
    }

    private static @Nullable PrismDioptres difference(@Nullable PrismDioptres one, @Nullable PrismDioptres other) {
        return one == null || other == null ? null : one.minus(other);
    }

    /** The pattern that up and down show; empty when neither is reached, and when not both were measured. */
    public Optional<Letter> letter() {
        if (upMinusDown == null) {
            return Optional.empty();
        }
        if (!upMinusDown.isOver(V_FROM)) {
            return Optional.of(Letter.V);
        }
        return upMinusDown.isUnder(A_FROM) ? Optional.empty() : Optional.of(Letter.A);
    }
}
