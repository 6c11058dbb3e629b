package plusward.exam;

import org.jspecify.annotations.Nullable;
import plusward.optics.PrismDioptres;

/**
 * How the eyes stand to one another at one distance, by prism and cover test.
 *
 * <p>An entry that names only a vertical turn, such as {@code LHT 6}, says nothing of the horizontal one: that is absent,
 * not 0. {@code ortho LHT 6} states both.
 *
 * <p>Refused with {@link IllegalArgumentException}: when neither is given.
 *
 * @param horizontal inward or outward; absent when the entry does not state it
 * @param vertical one eye higher; absent when the entry does not state it
 */
public record Turn(
        @Nullable HorizontalTurn horizontal, @Nullable VerticalTurn vertical) {

    public Turn {
        if (horizontal == null && vertical == null) {
            throw new IllegalArgumentException("a turn needs a horizontal or a vertical part");
        }
    }

    /**
     * Reads the trade's notation: {@code ET 25}, {@code E(T) 14}, {@code X 4}, {@code ortho}, {@code ET 25 RHT 4},
     * {@code 25Δ ET}, {@code ET 30+25}.
     *
     * @param viewing the distance of the field; a prime ({@code ET'}) is a near reading and is refused at distance
     * @throws NotationException when it is none of these
     */
    public static Turn parse(String text, Viewing viewing) {
        return TurnNotation.parse(text, viewing);
    }

    /** The horizontal turn with its sign, inward positive; absent when the entry does not state it. */
    public @Nullable PrismDioptres signed() {
        return horizontal == null ? null : horizontal.signed();
    }

    /** As the mirror shows it: the other eye is the higher one; inward stays inward. */
    public Turn mirrored() {
        return vertical == null ? this : new Turn(horizontal, vertical.mirrored());
    }

    /** The notation that {@link #parse} reads, horizontal first: {@code ET 25 RHT 4}. */
    @Override
    public String toString() {
        if (horizontal == null) {
            return String.valueOf(vertical);
        }
        return vertical == null ? horizontal.toString() : horizontal + " " + vertical;
    }
}
