package plusward.exam;

import plusward.optics.PrismDioptres;

/**
 * A turn inward or outward: direction, whether it shows, and its size.
 *
 * <p>A size of 0 Δ is {@code ortho} whatever direction was written, latent by convention.
 */
public record HorizontalTurn(Direction direction, Phase phase, PrismReading prism) {

    /** Inward (eso, written E) or outward (exo, written X). */
    public enum Direction {
        INWARD("E"),
        OUTWARD("X");

        private final String letter;

        Direction(String letter) {
            this.letter = letter;
        }
    }

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

    public boolean isOrtho() {
        return prism.total().amount() == 0;
    }

    @Override
    public String toString() {
        return isOrtho() ? "ortho" : direction.letter + phase.mark() + " " + prism;
    }
}
