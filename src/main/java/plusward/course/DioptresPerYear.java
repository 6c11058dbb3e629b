package plusward.course;

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
    public DioptresPerYear withAmount(double amount) {
        return new DioptresPerYear(amount);
    }

    @Override
    public String toString() {
        return Quantity.signed(inDioptresPerYear, 2);
    }
}
