package plusward.course;

import java.util.Locale;
import plusward.optics.Quantity;

/** How fast hyperopia changes: dioptres a year, rising positive, falling negative. Prints signed: {@code -0.12}. */
public record DioptresPerYear(double inDioptresPerYear) implements Quantity<DioptresPerYear> {

    public static final DioptresPerYear ZERO = new DioptresPerYear(0);

    public DioptresPerYear {
        inDioptresPerYear = Quantity.onGrid(inDioptresPerYear);
    }

    public static DioptresPerYear of(double inDioptresPerYear) {
        return new DioptresPerYear(inDioptresPerYear);
    }

    @Override
    public double amount() {
        return inDioptresPerYear;
    }

    @Override
    public String unit() {
        return "D/y";
    }

    @Override
    public String toString() {
        return inDioptresPerYear == 0 ? "0.00" : String.format(Locale.ROOT, "%+.2f", inDioptresPerYear);
    }
}
