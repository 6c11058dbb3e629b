package plusward.optics;

import java.time.LocalDate;
import java.time.temporal.ChronoUnit;

/**
 * A child's age, or a span of time, in years.
 *
 * <p>Years of 365.2425 days, the mean of the Gregorian calendar; negative when the second day comes before the first.
 * Prints with one decimal and without the unit: {@code 5.9}. Good to a day; a birthday may fall up to a day beside the
 * whole number, so where the calendar itself decides (36 months, 48 months) count calendar months instead.
 */
public record Age(double inYears) implements Quantity<Age> {

    /** The day of birth. */
    public static final Age ZERO = new Age(0);

    private static final double DAYS_A_YEAR = 365.2425;

    public Age {
        inYears = Quantity.onGrid(inYears);
    }

    /** So many years of 365.2425 days. */
    public static Age of(double inYears) {
        return new Age(inYears);
    }

    /** From one calendar day to another; negative when the second comes first. 2019-05-02 to 2025-03-14 is 5.87 y. */
    public static Age between(LocalDate from, LocalDate to) {
        return of(ChronoUnit.DAYS.between(from, to) / DAYS_A_YEAR);
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
    public Age withAmount(double amount) {
        return new Age(amount);
    }

    @Override
    public String toString() {
        return Quantity.fixed(inYears, 1);
    }
}
