package plusward.exam;

import java.util.Locale;
import plusward.optics.Quantity;

/**
 * For how long the glasses are worn on an ordinary day, as the family says.
 *
 * <p>Hours, 0 to 24. Prints without needless decimals: {@code 10}, {@code 7.5}.
 *
 * <p>Refused with {@link IllegalArgumentException}: outside 0 to 24.
 */
public record HoursPerDay(double inHours) implements Quantity<HoursPerDay> {

    public HoursPerDay {
        inHours = Quantity.onGrid(inHours);
        if (inHours < 0 || inHours > 24) {
            throw new IllegalArgumentException("a day has 0 to 24 hours: " + inHours);
        }
    }

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
    public String toString() {
        return String.format(Locale.ROOT, "%.2f", inHours).replaceAll("\\.00$|(?<=\\.\\d)0$", "");
    }
}
