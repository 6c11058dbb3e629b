package plusward.exam;

import plusward.optics.PrismDioptres;

/**
 * A turn inward or outward: direction, whether it shows, and its size.
 *
 * <p>Prism dioptres, 0 to 150. A size of 0 Δ is {@code ortho} whatever direction was written, inward and latent by
 * convention. Written {@code ET 25}, {@code E(T) 14}, {@code X 4}, {@code ET 30+25}, {@code ortho}.
 *
 * @param direction inward or outward
 * @param phase whether it shows
 * @param prism the prism that neutralised it, as written
 */
public record HorizontalTurn(Direction direction, Phase phase, PrismReading prism) {

    /** Inward (eso, written E) or outward (exo, written X). */
    public enum Direction {
        /** Eso: the covered eye points toward the nose. */
        INWARD("E"),
        /** Exo: the covered eye points toward the temple. */
        OUTWARD("X");

        private final String letter;

        Direction(String letter) {
            this.letter = letter;
        }
    }

    /** Straight at this distance: a finding, not a missing measurement. */
    public static final HorizontalTurn ORTHO = new HorizontalTurn(Direction.INWARD, Phase.LATENT, PrismReading.of(0));

    public HorizontalTurn {
        if (prism.total().amount() == 0) {
            direction = Direction.INWARD;
            phase = Phase.LATENT;
            prism = PrismReading.of(0);
        }
    }

    /** The size with the project's sign: inward positive, outward negative, ortho 0. */
    public PrismDioptres signed() {
        return direction == Direction.INWARD ? prism.total() : prism.total().times(-1);
    }

    /** True when no prism was needed. */
    public boolean isOrtho() {
        return prism.total().amount() == 0;
    }

    @Override
    public String toString() {
        return isOrtho() ? "ortho" : direction.letter + phase.mark() + " " + prism;
    }
}
