package plusward.course;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import plusward.optics.PrismDioptres;
import plusward.optics.PrismPerDioptre;

/**
 * How many prism dioptres this child's eyes turn in for each dioptre of focusing, from the visits of the last 24 months.
 *
 * <p>The mean of the slopes of the visits' models, each weighted by 1/variance; its variance is 1/Σ(1/variance). A slope
 * below 0 is left out, as it is nowhere used. It assumes that the child's slope did not change over these visits.
 *
 * <p>Worked example: 4 Δ/D with variance 1 and 6 Δ/D with variance 4: weights 1 and 0.25, mean 5.5/1.25 = 4.4 Δ/D, variance
 * 0.8.
 *
 * @param value the mean, not below 0
 * @param variance Δ²/D²
 * @param visits how many visits it comes from
 * @param own the share of this visit in the mean: the weight of its slope, 0 when it has none
 * @param ownModel the model of this visit
 */
record FocusSlope(PrismPerDioptre value, double variance, int visits, double own, VisitModel ownModel) {

    private static final int MONTHS = 24;

    /** Empty when no visit of the last 24 months has a slope that may be used. */
    static Optional<FocusSlope> at(Visit visit) {
        LocalDate earliest = visit.date().minusMonths(MONTHS);
        VisitModel own = VisitModel.at(visit);
        List<VisitModel> models = visit.upToHere()
                .filter(each -> !each.date().isBefore(earliest))
                .map(VisitModel::at)
                .filter(model -> model.usableSlope().isPresent())
                .toList();
        double weights = models.stream().mapToDouble(FocusSlope::weight).sum();
        return models.isEmpty() ? Optional.empty() : Optional.of(mean(models, weights, own));
    }

    private static FocusSlope mean(List<VisitModel> models, double weights, VisitModel own) {
        double sum = models.stream()
                .mapToDouble(model -> weight(model)
                        * model.usableSlope().orElseThrow().value().amount())
                .sum();
        double share = own.usableSlope().isPresent() ? weight(own) / weights : 0;
        return new FocusSlope(PrismPerDioptre.of(sum / weights), 1 / weights, models.size(), share, own);
    }

    private static double weight(VisitModel model) {
        SlopeSpread spread = model.slopeSpread();
        return spread == null ? 0 : 1 / spread.variance();
    }

    /** The covariance of this mean with a reading of this visit, Δ²/D: only this visit's own slope depends on it. */
    double covarianceWith(FocusReading reading) {
        SlopeSpread spread = ownModel.slopeSpread();
        boolean fitted = ownModel.readings().contains(reading);
        return spread == null || !fitted ? 0 : own * spread.covarianceWith(reading);
    }

    /** The mean with its 95 % interval. */
    Estimate<PrismPerDioptre> estimate() {
        return Estimate.around(value.amount(), Math.sqrt(variance), PrismPerDioptre::of);
    }

    /** The variance of a turn that is predicted from a reading for so many dioptres of focusing more, Δ². */
    double varianceOf(FocusReading reading, double more) {
        double ofReading = 1 / reading.weight();
        return Math.max(0, ofReading + more * more * variance + 2 * more * covarianceWith(reading));
    }

    /** The turn for so many dioptres of focusing more than at the reading, Δ, inward positive. */
    PrismDioptres expected(FocusReading reading, double more) {
        return reading.turn().plus(PrismDioptres.of(value.amount() * more));
    }
}
