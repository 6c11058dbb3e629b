package plusward.course;

/**
 * The uncertainty of a fitted line: variances of base and slope and their covariance, in Δ², Δ²/D² and Δ²/D.
 *
 * <p>At a need of x dioptres the line's variance is var(base) + 2x cov + x² var(slope).
 */
record LineSpread(double baseVariance, double covariance, double slopeVariance) {

    double varianceAt(double need) {
        return Math.max(0, baseVariance + 2 * need * covariance + need * need * slopeVariance);
    }
}
