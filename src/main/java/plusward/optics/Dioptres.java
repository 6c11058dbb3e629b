package plusward.optics;

/**
 * A lens power, a refraction or a demand on focusing.
 *
 * <p>Dioptres, the inverse of a focal length in metres; plus lenses and hyperopia positive, minus lenses and myopia
 * negative. Any finite value; lenses are made in steps of 0.25 D, lensmeters read to 0.01 D. Prints signed with two
 * decimals and without the unit: {@code +3.50}, {@code -0.75}, {@code 0.00}.
 */
public record Dioptres(double inDioptres) implements Quantity<Dioptres> {

    /** No power. Not the same as a power that was not measured, which is absent. */
    public static final Dioptres ZERO = new Dioptres(0);

    public Dioptres {
        inDioptres = Quantity.onGrid(inDioptres);
    }

    /** So many dioptres, plus positive. */
    public static Dioptres of(double inDioptres) {
        return new Dioptres(inDioptres);
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
    public Dioptres withAmount(double amount) {
        return new Dioptres(amount);
    }

    @Override
    public String toString() {
        return Quantity.signed(inDioptres, 2);
    }
}
