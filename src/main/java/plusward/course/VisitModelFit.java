package plusward.course;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleFunction;
import org.hipparchus.linear.ArrayRealVector;
import org.hipparchus.linear.MatrixUtils;
import org.hipparchus.linear.RealMatrix;
import org.hipparchus.linear.RealVector;
import org.hipparchus.linear.SingularValueDecomposition;
import org.jspecify.annotations.Nullable;
import plusward.exam.Reason;
import plusward.optics.PrismDioptres;
import plusward.optics.PrismPerDioptre;
import plusward.optics.Quantity;

/**
 * Solves the model of a visit by singular value decomposition of the weighted design matrix.
 *
 * <p>Each reading is a row (1, near, accommodation), and its turn, times 1/sd. Distance and near are then two parallel
 * lines: the slope can be told when one of them has readings at two needs of focusing; base takes a distance reading, and
 * nearExtra both distances. In general a parameter can be told exactly when its unit vector lies in the row space of the
 * design, and only then is it given. With singular values s and right vectors v the covariance of two parameters, an entry
 * of (XᵀWX)⁻¹, is Σ vᵢvⱼ/s² over the values that are not 0.
 */
final class VisitModelFit {

    private static final int BASE = 0;
    private static final int NEAR_EXTRA = 1;
    private static final int PER_DIOPTRE = 2;
    private static final int PARAMETERS = 3;
    /** Singular values below this share of the largest count as 0; steps of 0.01 D stay well above. */
    private static final double NEGLIGIBLE = 1e-7;

    private final FocusReadings given;
    private final SingularValueDecomposition decomposition;
    private final RealVector solution;

    private VisitModelFit(FocusReadings given) {
        this.given = given;
        List<FocusReading> readings = given.readings();
        RealMatrix design = MatrixUtils.createRealMatrix(Math.max(readings.size(), PARAMETERS), PARAMETERS);
        RealVector observed = new ArrayRealVector(design.getRowDimension());
        for (int row = 0; row < readings.size(); row++) {
            FocusReading reading = readings.get(row);
            double root = Math.sqrt(reading.weight());
            design.setRow(row, new double[] {
                root,
                reading.isNear() ? root : 0,
                root * reading.accommodation().amount()
            });
            observed.setEntry(row, root * reading.turn().amount());
        }
        this.decomposition = new SingularValueDecomposition(design);
        this.solution = solve(observed);
    }

    static VisitModel fit(FocusReadings given) {
        if (given.readings().isEmpty()) {
            List<Reason> notes = new ArrayList<>(given.leftOut());
            notes.add(Reason.of("model.no-reading"));
            return new VisitModel(null, null, null, null, null, List.of(), notes);
        }
        return new VisitModelFit(given).model();
    }

    private VisitModel model() {
        Estimate<PrismDioptres> base = estimate(BASE, PrismDioptres::of);
        Estimate<PrismPerDioptre> slope = estimate(PER_DIOPTRE, PrismPerDioptre::of);
        Estimate<PrismDioptres> nearExtra = estimate(NEAR_EXTRA, PrismDioptres::of);
        LineSpread spread = base == null || slope == null ? null : spread();
        SlopeSpread slopeSpread = slope == null ? null : slopeSpread();
        return new VisitModel(base, slope, nearExtra, spread, slopeSpread, given.readings(), notes(slope));
    }

    private LineSpread spread() {
        return new LineSpread(
                covariance(BASE, BASE), covariance(BASE, PER_DIOPTRE), covariance(PER_DIOPTRE, PER_DIOPTRE));
    }

    private SlopeSpread slopeSpread() {
        return new SlopeSpread(
                covariance(PER_DIOPTRE, BASE),
                covariance(PER_DIOPTRE, NEAR_EXTRA),
                covariance(PER_DIOPTRE, PER_DIOPTRE));
    }

    /** What was left out, why a parameter is absent, and a slope that may not be used. */
    private List<Reason> notes(@Nullable Estimate<PrismPerDioptre> slope) {
        List<Reason> notes = new ArrayList<>(given.leftOut());
        if (given.readings().stream().allMatch(FocusReading::isNear)) {
            notes.add(Reason.of("model.not-separable.only-near"));
        }
        if (given.readings().stream().noneMatch(FocusReading::isNear)) {
            notes.add(Reason.of("model.not-separable.only-distance"));
        }
        if (slope == null) {
            notes.add(Reason.of("model.not-separable.one-need"));
        } else if (slope.value().isUnder(PrismPerDioptre.ZERO)) {
            notes.add(Reason.of("model.negative-slope"));
        }
        return notes;
    }

    private <Q extends Quantity<Q>> @Nullable Estimate<Q> estimate(int parameter, DoubleFunction<Q> unit) {
        if (!canBeTold(parameter)) {
            return null;
        }
        double standardDeviation = Math.sqrt(covariance(parameter, parameter));
        return Estimate.around(solution.getEntry(parameter), standardDeviation, unit);
    }

    /** True when the parameter's unit vector lies in the space of the right vectors that count. */
    private boolean canBeTold(int parameter) {
        double seen = 0;
        for (int k = 0; k < PARAMETERS; k++) {
            seen += counts(k) ? square(decomposition.getV().getEntry(parameter, k)) : 0;
        }
        return seen > 1 - NEGLIGIBLE;
    }

    private double covariance(int one, int other) {
        double sum = 0;
        for (int k = 0; k < PARAMETERS; k++) {
            RealMatrix v = decomposition.getV();
            sum += counts(k) ? v.getEntry(one, k) * v.getEntry(other, k) / square(singular(k)) : 0;
        }
        return sum;
    }

    /** Σ (uᵀy/s) v over the singular values that are not 0. */
    private RealVector solve(RealVector observed) {
        RealVector sum = new ArrayRealVector(PARAMETERS);
        for (int k = 0; k < PARAMETERS; k++) {
            if (counts(k)) {
                double share = decomposition.getU().getColumnVector(k).dotProduct(observed) / singular(k);
                sum = sum.add(decomposition.getV().getColumnVector(k).mapMultiply(share));
            }
        }
        return sum;
    }

    private boolean counts(int k) {
        return singular(k) > NEGLIGIBLE * singular(0);
    }

    private double singular(int k) {
        return decomposition.getSingularValues()[k];
    }

    private static double square(double x) {
        return x * x;
    }
}
