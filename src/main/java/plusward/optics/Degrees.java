package plusward.optics;

/**
 * An angle in degrees of arc, such as the angle by which a prism turns a line of sight.
 *
 * <p>Degrees; inward positive where it stands for a turn. Any finite value. Prints with one decimal and without the unit:
 * {@code 11.3}. The axis of a cylinder is not one of these but an {@link Axis}.
 */
public record Degrees(double inDegrees) implements Quantity<Degrees> {

    /** No angle: the line of sight goes straight on. */
    public static final Degrees ZERO = new Degrees(0);

    public Degrees {
        inDegrees = Quantity.onGrid(inDegrees);
    }

    /** So many degrees, inward positive. */
    public static Degrees of(double inDegrees) {
        return new Degrees(inDegrees);
    }

    @Override
    public double amount() {
        return inDegrees;
    }

    @Override
    public String unit() {
        return "°";
    }

    @Override
    public Degrees withAmount(double amount) {
        return new Degrees(amount);
    }

    @Override
    public String toString() {
        return Quantity.fixed(inDegrees, 1);
    }
}
