package plusward.exam;

/**
 * One eye higher than the other: which eye, whether it shows, and its size, 0 to 150 Δ.
 *
 * <p>Written with the higher eye: {@code RHT 4} (right higher, manifest), {@code RH(T) 4}, {@code LH 3} (latent).
 *
 * @param higher the eye that stands higher
 * @param phase whether it shows
 * @param prism the prism that neutralised it, as written
 */
public record VerticalTurn(Eye higher, Phase phase, PrismReading prism) {

    /** As the mirror shows it: the other eye is the higher one. */
    public VerticalTurn mirrored() {
        return new VerticalTurn(higher.other(), phase, prism);
    }

    @Override
    public String toString() {
        return (higher == Eye.RIGHT ? "R" : "L") + "H" + phase.mark() + " " + prism;
    }
}
