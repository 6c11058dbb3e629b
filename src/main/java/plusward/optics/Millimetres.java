package plusward.optics;

/**
 * A small length: a pupil, a pupil distance, the place of a segment.
 *
 * <p>Millimetres; a height is positive above the pupil centre and negative below it, as worn. Any finite value. Prints
 * signed, with one decimal or two and without the unit: {@code -3.5}, {@code +0.25}, {@code 0.0}.
 */
public record Millimetres(double inMillimetres) implements Quantity<Millimetres> {

    /** No length; as a height, level with the pupil centre. */
    public static final Millimetres ZERO = new Millimetres(0);

    public Millimetres {
        inMillimetres = Quantity.onGrid(inMillimetres);
    }

    /** So many millimetres; a height above the pupil centre is positive. */
    public static Millimetres of(double inMillimetres) {
        return new Millimetres(inMillimetres);
    }

    /** The same length in centimetres, the unit of Prentice's rule and of the heterophoria method. */
    public double inCentimetres() {
        return inMillimetres / 10;
    }

    /** The same length in metres, the unit that goes with dioptres. */
    public double inMetres() {
        return inMillimetres / 1000;
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
    public Millimetres withAmount(double amount) {
        return new Millimetres(amount);
    }

    /** The size alone, as lengths are written, to a tenth: {@code 52.9}. */
    public String unsigned() {
        return Quantity.fixed(Math.abs(inMillimetres), 1);
    }

    @Override
    public String toString() {
        String printed = Quantity.signed(inMillimetres, 2);
        return printed.endsWith("0") ? printed.substring(0, printed.length() - 1) : printed;
    }
}
