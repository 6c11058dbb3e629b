package plusward.optics;

/**
 * The size of a turn, or the power of a prism.
 *
 * <p>Prism dioptres: 1 Δ moves a line of sight by 1 cm at 1 m. A signed turn is positive inward (eso) and negative
 * outward (exo). Any finite value. Prints with one decimal where it has one, without the unit:
 * {@code 25}, {@code 41.7}, {@code -8}.
 */
public record PrismDioptres(double inPrismDioptres) implements Quantity<PrismDioptres> {

    /** Straight, or no prism. Not the same as a turn that was not measured, which is absent. */
    public static final PrismDioptres ZERO = new PrismDioptres(0);

    public PrismDioptres {
        inPrismDioptres = Quantity.onGrid(inPrismDioptres);
    }

    /** So many prism dioptres, inward positive. */
    public static PrismDioptres of(double inPrismDioptres) {
        return new PrismDioptres(inPrismDioptres);
    }

    /** The angle θ, with the sign of the turn, by definition Δ = 100 tan θ. 20 Δ is 11.310°, 100 Δ is 45°. */
    public Degrees toAngle() {
        return Degrees.of(Math.toDegrees(Math.atan(inPrismDioptres / 100)));
    }

    /**
     * The prism that turns a line of sight by this angle: 100 tan θ.
     *
     * @throws IllegalArgumentException at 90° or more either way, which no prism reaches
     */
    public static PrismDioptres ofAngle(Degrees angle) {
        if (Math.abs(angle.inDegrees()) >= 90) {
            throw new IllegalArgumentException("no prism turns by " + angle + "°");
        }
        return of(100 * Math.tan(Math.toRadians(angle.inDegrees())));
    }

    /**
     * What two prisms measure when one stands before each eye: (a + b)/(1 − ab/10⁴).
     *
     * <p>The angles add, the prism dioptres do not: 20 + 20 is 41.67, 30 + 30 is 65.93, 40 + 5 is 45.92. Tangent
     * addition; the advice to split rather than stack is Thompson and Guyton, Ophthalmology 1983;90:204.
     *
     * @throws IllegalArgumentException when the two angles together reach 90°
     */
    public PrismDioptres withPrismBeforeOtherEye(PrismDioptres other) {
        return ofAngle(toAngle().plus(other.toAngle()));
    }

    @Override
    public double amount() {
        return inPrismDioptres;
    }

    @Override
    public String unit() {
        return "Δ";
    }

    @Override
    public PrismDioptres withAmount(double amount) {
        return new PrismDioptres(amount);
    }

    @Override
    public String toString() {
        String printed = Quantity.fixed(inPrismDioptres, 1);
        return printed.endsWith(".0") ? printed.substring(0, printed.length() - 2) : printed;
    }
}
