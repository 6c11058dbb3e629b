package plusward.exam;

import plusward.optics.Quantity;

/**
 * For how long the glasses are worn on an ordinary day, as the family says.
 *
 * <p>Hours, 0 to 24, both included, to 0.01 h. Prints without needless decimals and without the unit: {@code 10},
 * {@code 7.5}, {@code 7.25}.
 *
 * <p>Refused with {@link IllegalArgumentException}: outside 0 to 24, also as the result of a calculation.
 */
public record HoursPerDay(double inHours) implements Quantity<HoursPerDay> {

    public HoursPerDay {
        inHours = Quantity.onGrid(inHours);
        if (inHours < 0 || inHours > 24) {
            throw new IllegalArgumentException("a day has 0 to 24 hours: " + inHours);
        }
    }

    /** So many hours a day. */
    public static HoursPerDay of(double inHours) {
        return new HoursPerDay(inHours);
    }

    @Override
    public double amount() {
        return inHours;
    }

    @Override
    public String unit() {
        return "h/day";
    }

    @Override
    public HoursPerDay withAmount(double amount) {
        return new HoursPerDay(amount);
    }

    @Override
    public String toString() {
        return Quantity.fixed(inHours, 2).replaceFirst("\\.?0+$", "");
    }
}
