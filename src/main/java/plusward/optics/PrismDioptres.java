package plusward.optics;

import java.util.Locale;

/**
 * The size of a turn, or the power of a prism.
 *
 * <p>Prism dioptres: 1 Δ moves a line of sight by 1 cm at 1 m. A signed turn is positive inward (eso) and negative
 * outward (exo). Prints with one decimal where it has one, without the unit: {@code 25}, {@code 41.7}.
 */
public record PrismDioptres(double inPrismDioptres) implements Quantity<PrismDioptres> {

    public static final PrismDioptres ZERO = new PrismDioptres(0);

    public PrismDioptres {
        inPrismDioptres = Quantity.onGrid(inPrismDioptres);
    }

    public static PrismDioptres of(double inPrismDioptres) {
        return new PrismDioptres(inPrismDioptres);
    }

    public PrismDioptres plus(PrismDioptres other) {
        return new PrismDioptres(inPrismDioptres + other.inPrismDioptres);
    }

    public PrismDioptres minus(PrismDioptres other) {
        return new PrismDioptres(inPrismDioptres - other.inPrismDioptres);
    }

    public PrismDioptres times(double factor) {
        return new PrismDioptres(inPrismDioptres * factor);
    }

    /** The angle: Δ = 100 tan θ. 20 Δ is 11.310°, 100 Δ is 45°. */
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

    /** The size without its sign. */
    public PrismDioptres size() {
        return new PrismDioptres(Math.abs(inPrismDioptres));
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
    public String toString() {
        return String.format(Locale.ROOT, "%.1f", inPrismDioptres).replaceAll("\\.0$", "");
    }
}
