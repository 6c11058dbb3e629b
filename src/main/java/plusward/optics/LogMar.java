package plusward.optics;

import java.util.Locale;

/**
 * Visual acuity as the logarithm of the minimum angle of resolution; 0.00 is 20/20 and a larger number sees worse.
 */
public record LogMar(double inLogMar) implements Quantity<LogMar> {

    public static final LogMar ZERO = new LogMar(0);

    public LogMar {
        inLogMar = Quantity.onGrid(inLogMar);
    }

    public static LogMar of(double inLogMar) {
        return new LogMar(inLogMar);
    }

    /** One letter of a five-letter line of 0.1 logMAR (Holladay, J Cataract Refract Surg 2004). */
    public static final LogMar ONE_LETTER = new LogMar(0.02);

    /**
     * log10(denominator/numerator): 20/40 is 0.30, 20/63 is 0.50. Source: Holladay, J Cataract Refract Surg 2004.
     *
     * @throws IllegalArgumentException unless both numbers are above 0
     */
    public static LogMar ofSnellen(double numerator, double denominator) {
        if (!(numerator > 0 && denominator > 0)) {
            throw new IllegalArgumentException("not a Snellen fraction: " + numerator + "/" + denominator);
        }
        return of(Math.log10(denominator / numerator));
    }

    public LogMar plus(LogMar other) {
        return new LogMar(inLogMar + other.inLogMar);
    }

    public LogMar minus(LogMar other) {
        return new LogMar(inLogMar - other.inLogMar);
    }

    public LogMar times(double factor) {
        return new LogMar(inLogMar * factor);
    }

    /** The size without its sign. */
    public LogMar size() {
        return new LogMar(Math.abs(inLogMar));
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
    public String toString() {
        return String.format(Locale.ROOT, "%.2f", inLogMar);
    }
}
