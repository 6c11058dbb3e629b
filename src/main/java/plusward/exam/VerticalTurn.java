package plusward.exam;

/**
 * One eye higher than the other: which eye, whether it shows, and its size, 0 to 150 Δ.
 *
 * <p>Written with the higher eye: {@code RHT 4} (right higher, manifest), {@code RH(T) 4}, {@code LH 3} (latent).
 */
public record VerticalTurn(Eye higher, Phase phase, PrismReading prism) {

    public VerticalTurn mirrored() {
        return new VerticalTurn(higher.other(), phase, prism);
    }

    @Override
    public String toString() {
        return (higher == Eye.RIGHT ? "R" : "L") + "H" + phase.mark() + " " + prism;
    }
}
