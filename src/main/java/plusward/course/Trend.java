package plusward.course;

import java.util.List;
import java.util.Optional;
import org.hipparchus.distribution.continuous.TDistribution;
import org.hipparchus.stat.regression.SimpleRegression;
import plusward.exam.Eye;
import plusward.optics.Age;
import plusward.optics.Dioptres;
import plusward.optics.Lens;

/**
 * How one eye's hyperopia runs: ordinary least squares of the cycloplegic spherical equivalent on age.
 *
 * <p>From three refractions over at least a year. The slope has a 95 % t interval; the projection is the value expected 12
 * months after the latest refraction, with a 95 % prediction interval for a single refraction. A library computes the
 * regression; tests hold it against a certified data set (NIST StRD, Norris).
 *
 * @param slope dioptres a year, falling negative
 * @param n how many refractions
 * @param fittedFrom the age of the first refraction
 * @param fitted the line's value at that age
 * @param projectedAge the age the projection is for
 * @param projected the expected spherical equivalent at that age
 */
public record Trend(
        Estimate<DioptresPerYear> slope,
        int n,
        Age fittedFrom,
        Dioptres fitted,
        Age projectedAge,
        Estimate<Dioptres> projected) {

    private static final int FEWEST = 3;
    private static final Age SHORTEST = Age.of(1);
    private static final Age AHEAD = Age.of(1);
    private static final double TWO_SIDED_95 = 0.975;

    /** A refraction of one eye at an age. */
    record Point(Age age, Dioptres equivalent) {}

    /** From this visit and earlier ones; empty with fewer than three refractions or less than a year between them. */
    public static Optional<Trend> at(Visit visit, Eye eye) {
        return through(points(visit, eye));
    }

    private static List<Point> points(Visit visit, Eye eye) {
        return visit.fromFirst().stream()
                .flatMap(
                        each -> lens(each, eye).map(lens -> new Point(each.age(), lens.sphericalEquivalent())).stream())
                .toList();
    }

    private static Optional<Lens> lens(Visit visit, Eye eye) {
        return Optional.ofNullable(visit.exam().cycloplegic().refraction().of(eye));
    }

    static Optional<Trend> through(List<Point> points) {
        if (points.size() < FEWEST) {
            return Optional.empty();
        }
        Age first = points.get(0).age();
        Age last = points.get(points.size() - 1).age();
        return last.minus(first).isUnder(SHORTEST) ? Optional.empty() : Optional.of(fit(points, last.plus(AHEAD)));
    }

    private static Trend fit(List<Point> points, Age ahead) {
        SimpleRegression regression = new SimpleRegression();
        points.forEach(point ->
                regression.addData(point.age().amount(), point.equivalent().amount()));
        double slope = regression.getSlope();
        double half = regression.getSlopeConfidenceInterval();
        return new Trend(
                new Estimate<>(
                        DioptresPerYear.of(slope), DioptresPerYear.of(slope - half), DioptresPerYear.of(slope + half)),
                points.size(),
                points.get(0).age(),
                Dioptres.of(regression.predict(points.get(0).age().amount())),
                ahead,
                projection(regression, points, ahead));
    }

    /** ŷ ± t·s·√(1 + 1/n + (x − x̄)²/Sxx), the interval in which one further refraction is expected. */
    private static Estimate<Dioptres> projection(SimpleRegression regression, List<Point> points, Age ahead) {
        double n = points.size();
        double mean = points.stream()
                .mapToDouble(point -> point.age().amount())
                .average()
                .orElseThrow();
        double away = ahead.amount() - mean;
        double spread =
                Math.sqrt(regression.getMeanSquareError() * (1 + 1 / n + away * away / regression.getXSumSquares()));
        double half = new TDistribution(n - 2).inverseCumulativeProbability(TWO_SIDED_95) * spread;
        double expected = regression.predict(ahead.amount());
        return new Estimate<>(Dioptres.of(expected), Dioptres.of(expected - half), Dioptres.of(expected + half));
    }
}
