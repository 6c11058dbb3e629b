package plusward.optics;

import java.util.Locale;

/**
 * An angle in degrees of arc. Prints with one decimal: {@code 11.3}.
 */
public record Degrees(double inDegrees) implements Quantity<Degrees> {

    public static final Degrees ZERO = new Degrees(0);

    public Degrees {
        inDegrees = Quantity.onGrid(inDegrees);
    }

    public static Degrees of(double inDegrees) {
        return new Degrees(inDegrees);
    }

    public Degrees plus(Degrees other) {
        return new Degrees(inDegrees + other.inDegrees);
    }

    public Degrees minus(Degrees other) {
        return new Degrees(inDegrees - other.inDegrees);
    }

    public Degrees times(double factor) {
        return new Degrees(inDegrees * factor);
    }

    /** The size without its sign. */
    public Degrees size() {
        return new Degrees(Math.abs(inDegrees));
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
    public String toString() {
        return String.format(Locale.ROOT, "%.1f", inDegrees);
    }
}
