package plusward.course;

import java.time.LocalDate;
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
 * <p>The scatter about the line is never taken smaller than what writing a refraction in steps of 0.25 D causes by itself,
 * 0.25 D/√12 = 0.07 D: three refractions that happen to lie on a line do not make the next one certain.
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
    private static final Age AHEAD = Age.of(1);
    private static final double TWO_SIDED_95 = 0.975;
    /** The standard deviation of rounding to 0.25 D: a uniform error over one step. Source: definition. */
    private static final double LEAST_SCATTER_D = 0.25 / Math.sqrt(12);

    /** A refraction of one eye at an age. */
    record Point(Age age, Dioptres equivalent) {}

    /** From this visit and earlier ones; empty with fewer than three refractions or less than a calendar year between them. */
    public static Optional<Trend> at(Visit visit, Eye eye) {
        List<Visit> refracted = visit.fromFirst().stream()
                .filter(each -> refraction(each, eye).isPresent())
                .toList();
        return refracted.size() < FEWEST || spansLessThanAYear(refracted)
                ? Optional.empty()
                : Optional.of(through(points(refracted, eye)));
    }

    private static boolean spansLessThanAYear(List<Visit> visits) {
        LocalDate first = visits.get(0).date();
        LocalDate last = visits.get(visits.size() - 1).date();
        return last.isBefore(first.plusYears(1));
    }

    private static List<Point> points(List<Visit> visits, Eye eye) {
        return visits.stream()
                .flatMap(visit ->
                        refraction(visit, eye).map(lens -> new Point(visit.age(), lens.sphericalEquivalent())).stream())
                .toList();
    }

    private static Optional<Lens> refraction(Visit visit, Eye eye) {
        return Optional.ofNullable(visit.exam().cycloplegic().refraction().of(eye));
    }

    /** The line through three points or more, oldest first. */
    static Trend through(List<Point> points) {
        Age ahead = points.get(points.size() - 1).age().plus(AHEAD);
        SimpleRegression regression = new SimpleRegression();
        points.forEach(point ->
                regression.addData(point.age().amount(), point.equivalent().amount()));
        double slopeHalf = student(points) * scatter(regression) / Math.sqrt(regression.getXSumSquares());
        Estimate<DioptresPerYear> slope = Estimate.within(regression.getSlope(), slopeHalf, DioptresPerYear::of);
        Age first = points.get(0).age();
        Dioptres fitted = Dioptres.of(regression.predict(first.amount()));
        return new Trend(slope, points.size(), first, fitted, ahead, projection(regression, points, ahead));
    }

    /** ŷ ± t·s·√(1 + 1/n + (x − x̄)²/Sxx), the interval in which one further refraction is expected. */
    private static Estimate<Dioptres> projection(SimpleRegression regression, List<Point> points, Age ahead) {
        double n = points.size();
        double mean = points.stream()
                .mapToDouble(point -> point.age().amount())
                .average()
                .orElseThrow();
        double away = ahead.amount() - mean;
        double spread = scatter(regression) * Math.sqrt(1 + 1 / n + away * away / regression.getXSumSquares());
        return Estimate.within(regression.predict(ahead.amount()), student(points) * spread, Dioptres::of);
    }

    private static double scatter(SimpleRegression regression) {
        return Math.max(Math.sqrt(regression.getMeanSquareError()), LEAST_SCATTER_D);
    }

    private static double student(List<Point> points) {
        return new TDistribution(points.size() - 2).inverseCumulativeProbability(TWO_SIDED_95);
    }
}
