package plusward.optics;

/**
 * Visual acuity as the logarithm of the minimum angle of resolution.
 *
 * <p>0.00 is 20/20; a larger number sees worse, a negative one better than 20/20; a line of a letter chart is 0.1, a letter
 * of a five-letter line 0.02. Any finite value. Prints with two decimals and without the unit: {@code 0.30},
 * {@code -0.10}. What has no chart size (counting fingers, light) has no logMAR and is absent.
 */
public record LogMar(double inLogMar) implements Quantity<LogMar> {

    /** 20/20. */
    public static final LogMar ZERO = new LogMar(0);

    /** One letter of a five-letter line of 0.1 logMAR (Holladay, J Cataract Refract Surg 2004). */
    public static final LogMar ONE_LETTER = new LogMar(0.02);

    public LogMar {
        inLogMar = Quantity.onGrid(inLogMar);
    }

    /** So much logMAR; larger sees worse. */
    public static LogMar of(double inLogMar) {
        return new LogMar(inLogMar);
    }

    /**
     * The size of the letters of a chart line: log10(denominator/numerator).
     *
     * <p>Both numbers in the same unit of length, feet or metres; a decimal acuity is the fraction decimal/1. Source:
     * Holladay, J Cataract Refract Surg 2004. Worked examples: 20/40 is 0.30, 20/63 is 0.50.
     *
     * @throws IllegalArgumentException unless both numbers are above 0
     */
    public static LogMar ofSnellen(double numerator, double denominator) {
        if (!(numerator > 0 && denominator > 0)) {
            throw new IllegalArgumentException("not a Snellen fraction: " + numerator + "/" + denominator);
        }
        return of(Math.log10(denominator / numerator));
    }

    @Override
    public double amount() {
        return inLogMar;
    }

    @Override
    public String unit() {
        return "logMAR";
    }

    @Override
    public LogMar withAmount(double amount) {
        return new LogMar(amount);
    }

    @Override
    public String toString() {
        return Quantity.fixed(inLogMar, 2);
    }
}
