package plusward.optics;

import java.util.Locale;

/**
 * A lens power, a refraction or a demand on focusing.
 *
 * <p>Dioptres, the inverse of a focal length in metres; plus lenses and hyperopia positive. Any finite value; lenses are
 * made in steps of 0.25 D, lensmeters read to 0.01 D. Prints signed with two decimals and without the unit: {@code +3.50}.
 */
public record Dioptres(double inDioptres) implements Quantity<Dioptres> {

    public static final Dioptres ZERO = new Dioptres(0);

    public Dioptres {
        inDioptres = Quantity.onGrid(inDioptres);
    }

    public static Dioptres of(double inDioptres) {
        return new Dioptres(inDioptres);
    }

    public Dioptres plus(Dioptres other) {
        return new Dioptres(inDioptres + other.inDioptres);
    }

    public Dioptres minus(Dioptres other) {
        return new Dioptres(inDioptres - other.inDioptres);
    }

    public Dioptres times(double factor) {
        return new Dioptres(inDioptres * factor);
    }

    /** The size without its sign. */
    public Dioptres size() {
        return new Dioptres(Math.abs(inDioptres));
    }

    @Override
    public double amount() {
        return inDioptres;
    }

    @Override
    public String unit() {
        return "D";
    }

    @Override
    public String toString() {
        return inDioptres == 0 ? "0.00" : String.format(Locale.ROOT, "%+.2f", inDioptres);
    }
}
