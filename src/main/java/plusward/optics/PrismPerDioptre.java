package plusward.optics;

import java.util.Locale;

/**
 * How much the eyes turn inward for each dioptre of focusing: the AC/A ratio.
 *
 * <p>Prism dioptres for each dioptre; positive when focusing turns the eyes inward. Prints with one decimal: {@code 4.0}.
 */
public record PrismPerDioptre(double inPrismPerDioptre) implements Quantity<PrismPerDioptre> {

    public static final PrismPerDioptre ZERO = new PrismPerDioptre(0);

    public PrismPerDioptre {
        inPrismPerDioptre = Quantity.onGrid(inPrismPerDioptre);
    }

    public static PrismPerDioptre of(double inPrismPerDioptre) {
        return new PrismPerDioptre(inPrismPerDioptre);
    }

    public PrismPerDioptre plus(PrismPerDioptre other) {
        return new PrismPerDioptre(inPrismPerDioptre + other.inPrismPerDioptre);
    }

    public PrismPerDioptre minus(PrismPerDioptre other) {
        return new PrismPerDioptre(inPrismPerDioptre - other.inPrismPerDioptre);
    }

    public PrismPerDioptre times(double factor) {
        return new PrismPerDioptre(inPrismPerDioptre * factor);
    }

    /** The size without its sign. */
    public PrismPerDioptre size() {
        return new PrismPerDioptre(Math.abs(inPrismPerDioptre));
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
    public String toString() {
        return String.format(Locale.ROOT, "%.1f", inPrismPerDioptre);
    }
}
