package plusward.optics;

/**
 * How much the eyes turn inward for each dioptre of focusing: the AC/A ratio.
 *
 * <p>Prism dioptres for each dioptre; positive when focusing turns the eyes inward, which is the rule; a negative value
 * is reported as it comes. Any finite value. Prints with one decimal and without the unit:
 * {@code 4.0}. Ratios found by different methods are different things, not to be compared with one another.
 */
public record PrismPerDioptre(double inPrismPerDioptre) implements Quantity<PrismPerDioptre> {

    /** Focusing does not turn the eyes. */
    public static final PrismPerDioptre ZERO = new PrismPerDioptre(0);

    public PrismPerDioptre {
        inPrismPerDioptre = Quantity.onGrid(inPrismPerDioptre);
    }

    /** So many prism dioptres for each dioptre, inward positive. */
    public static PrismPerDioptre of(double inPrismPerDioptre) {
        return new PrismPerDioptre(inPrismPerDioptre);
    }

    @Override
    public double amount() {
        return inPrismPerDioptre;
    }

    @Override
    public String unit() {
        return "Δ/D";
    }

    @Override
    public PrismPerDioptre withAmount(double amount) {
        return new PrismPerDioptre(amount);
    }

    @Override
    public String toString() {
        return Quantity.fixed(inPrismPerDioptre, 1);
    }
}
