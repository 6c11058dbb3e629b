package plusward.course;

import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import plusward.exam.Reason;
import plusward.optics.Dioptres;
import plusward.optics.PrismDioptres;
import plusward.optics.PrismPerDioptre;

/**
 * How much of the turn focusing explains, at one visit.
 *
 * <p>turn = base + nearExtra·[near] + perDioptre × accommodation needed, fitted by weighted least squares to the turns
 * measured at that visit, weights 1/sd² by published repeatability (Pediatric Eye Disease Investigator Group, Arch Ophthalmol
 * 2009;127:59). Intervals are 95 %, from (XᵀWX)⁻¹. What the measured conditions cannot separate is absent, with its reason.
 * Worked example: hyperopia +3.00, worn +3.00, add +2.00, turns 14 and 26 without glasses, 2 and 14 with, 6 through the add:
 * base 2 Δ, 4 Δ for each dioptre, nearExtra 0.
 *
 * @param base the turn that focusing does not explain, inward positive; absent when it cannot be separated
 * @param perDioptre turn for each dioptre of focusing; below 0 it is reported and not used
 * @param nearExtra what near adds beyond focusing
 * @param spread how uncertain the line through base and slope is; absent unless both are there
 * @param slopeSpread how the slope varies with each reading; absent unless the slope is there
 * @param readings the turns that were used, with the focusing they were measured at
 * @param notes what was left out, and what could not be separated, and why
 */
public record VisitModel(
        @Nullable Estimate<PrismDioptres> base,
        @Nullable Estimate<PrismPerDioptre> perDioptre,
        @Nullable Estimate<PrismDioptres> nearExtra,
        @Nullable LineSpread spread,
        @Nullable SlopeSpread slopeSpread,
        List<FocusReading> readings,
        List<Reason> notes) {

    public VisitModel {
        readings = List.copyOf(readings);
        notes = List.copyOf(notes);
    }

    /** Always an answer; without a hyperopia or a reading all three parameters are absent and the notes say why. */
    public static VisitModel at(Visit visit) {
        return VisitModelFit.fit(FocusReadings.at(visit));
    }

    /** The slope, when it is there and not below 0, so that it may be used to predict. */
    public Optional<Estimate<PrismPerDioptre>> usableSlope() {
        return Optional.ofNullable(perDioptre).filter(slope -> !slope.value().isUnder(PrismPerDioptre.ZERO));
    }

    /**
     * The turn that the model expects at distance at a given need of focusing, with the 95 % band of the fitted line; empty
     * unless base and slope were both separated. At near add {@link #nearExtra}.
     */
    public Optional<Estimate<PrismDioptres>> expectedAtDistance(Dioptres need) {
        if (base == null || perDioptre == null || spread == null) {
            return Optional.empty();
        }
        double x = need.amount();
        double expected = base.value().amount() + perDioptre.value().amount() * x;
        return Optional.of(Estimate.around(expected, Math.sqrt(spread.varianceAt(x)), PrismDioptres::of));
    }
}
