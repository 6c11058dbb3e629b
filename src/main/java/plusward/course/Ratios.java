package plusward.course;

import plusward.optics.PrismPerDioptre;

/** Makes an interval from a value and its standard deviation. */
final class Ratios {

    private Ratios() {}

    static Estimate<PrismPerDioptre> around(double ratio, double standardDeviation) {
        double half = Estimate.NORMAL_95 * standardDeviation;
        return new Estimate<>(
                PrismPerDioptre.of(ratio), PrismPerDioptre.of(ratio - half), PrismPerDioptre.of(ratio + half));
    }
}
