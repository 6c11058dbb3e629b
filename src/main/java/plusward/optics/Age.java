package plusward.optics;

import java.time.LocalDate;
import java.time.temporal.ChronoUnit;
import java.util.Locale;

/**
 * A child's age, or a span of time, in years of 365.2425 days. Prints with one decimal: {@code 5.9}.
 */
public record Age(double inYears) implements Quantity<Age> {

    public static final Age ZERO = new Age(0);

    public Age {
        inYears = Quantity.onGrid(inYears);
    }

    public static Age of(double inYears) {
        return new Age(inYears);
    }

    private static final double DAYS_A_YEAR = 365.2425;

    /** From one calendar day to another; negative when the second comes first. 2019-05-02 to 2025-03-14 is 5.87 y. */
    public static Age between(LocalDate from, LocalDate to) {
        return of(ChronoUnit.DAYS.between(from, to) / DAYS_A_YEAR);
    }

    public Age plus(Age other) {
        return new Age(inYears + other.inYears);
    }

    public Age minus(Age other) {
        return new Age(inYears - other.inYears);
    }

    public Age times(double factor) {
        return new Age(inYears * factor);
    }

    /** The size without its sign. */
    public Age size() {
        return new Age(Math.abs(inYears));
    }

    @Override
    public double amount() {
        return inYears;
    }

    @Override
    public String unit() {
        return "y";
    }

    @Override
    public String toString() {
        return String.format(Locale.ROOT, "%.1f", inYears);
    }
}
