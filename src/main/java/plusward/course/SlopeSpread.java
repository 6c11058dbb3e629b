package plusward.course;

/**
 * How the slope of a visit's model varies together with its other parameters: covariances in Δ²/D, and the slope's own
 * variance in Δ²/D².
 *
 * <p>In weighted least squares the covariance of a parameter with a reading is that with the fitted value at the reading:
 * (XᵀWX)⁻¹XᵀW times the reading's variance 1/w leaves (XᵀWX)⁻¹ times its row (1, near, accommodation).
 */
record SlopeSpread(double withBase, double withNearExtra, double variance) {

    /** Of the slope and one of the readings that it was fitted to, Δ²/D. */
    double covarianceWith(FocusReading reading) {
        double near = reading.isNear() ? withNearExtra : 0;
        return withBase + near + reading.accommodation().amount() * variance;
    }
}
