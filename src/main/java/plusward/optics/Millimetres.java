package plusward.optics;

import java.util.Locale;

/**
 * A small length: a pupil, a pupil distance, the place of a segment.
 *
 * <p>Millimetres; a height is positive above the pupil centre and negative below it. Prints signed: {@code -3.5}.
 */
public record Millimetres(double inMillimetres) implements Quantity<Millimetres> {

    public static final Millimetres ZERO = new Millimetres(0);

    public Millimetres {
        inMillimetres = Quantity.onGrid(inMillimetres);
    }

    public static Millimetres of(double inMillimetres) {
        return new Millimetres(inMillimetres);
    }

    public Millimetres plus(Millimetres other) {
        return new Millimetres(inMillimetres + other.inMillimetres);
    }

    public Millimetres minus(Millimetres other) {
        return new Millimetres(inMillimetres - other.inMillimetres);
    }

    public Millimetres times(double factor) {
        return new Millimetres(inMillimetres * factor);
    }

    public double inCentimetres() {
        return inMillimetres / 10;
    }

    public double inMetres() {
        return inMillimetres / 1000;
    }

    /** The size without its sign. */
    public Millimetres size() {
        return new Millimetres(Math.abs(inMillimetres));
    }

    @Override
    public double amount() {
        return inMillimetres;
    }

    @Override
    public String unit() {
        return "mm";
    }

    @Override
    public String toString() {
        return inMillimetres == 0
                ? "0.0"
                : String.format(Locale.ROOT, "%+.2f", inMillimetres).replaceAll("(\\.\\d)0$", "$1");
    }
}
