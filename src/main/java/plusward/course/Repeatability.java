package plusward.course;

import plusward.exam.Viewing;
import plusward.optics.Dioptres;
import plusward.optics.PrismDioptres;

/**
 * How much a measurement can be trusted.
 *
 * <p>Prism and alternate cover test in children with esotropia, two examiners: Pediatric Eye Disease Investigator Group,
 * Arch Ophthalmol 2009;127:59. Above 20 Δ one measurement lies within ±7.3 Δ (distance) or ±8.3 Δ (near) of the truth, 95
 * times in 100; from 10 to 20 Δ within ±4.1 or ±3.3 Δ. A change is likely real from 12 Δ when the larger angle is over
 * 20 Δ, else from 6 Δ. Under 10 Δ nothing was published: the values for 10 to 20 Δ are used and called extrapolated.
 *
 * <p>Worked examples: 14 to 20 is real, 14 to 19 noise; 30 to 42 real, 30 to 41 noise; 18 to 26 noise, since the larger
 * angle rules.
 */
public final class Repeatability {

    private static final PrismDioptres LARGE = PrismDioptres.of(20);
    private static final PrismDioptres SMALLEST_STUDIED = PrismDioptres.of(10);
    private static final PrismDioptres REAL_WHEN_LARGE = PrismDioptres.of(12);
    private static final PrismDioptres REAL_ELSE = PrismDioptres.of(6);

    /** Two cycloplegic refractions of one eye differ by about this at most (Harvey et al., Optom Vis Sci 2000;77:140). */
    public static final Dioptres CYCLOPLEGIC = Dioptres.of(0.41);

    private Repeatability() {}

    /** How far one reading may lie from the truth, 95 times in 100, in Δ. The sign of the turn does not matter. */
    public static PrismDioptres limitOfOne(PrismDioptres turn, Viewing viewing) {
        boolean large = turn.size().isOver(LARGE);
        return PrismDioptres.of(
                switch (viewing) {
                    case DISTANCE -> large ? 7.3 : 4.1;
                    case NEAR -> large ? 8.3 : 3.3;
                });
    }

    /** How far a difference of two readings may come from noise alone, 95 times in 100, in Δ. */
    public static PrismDioptres limitOfDifference(PrismDioptres larger, Viewing viewing) {
        boolean large = larger.size().isOver(LARGE);
        return PrismDioptres.of(
                switch (viewing) {
                    case DISTANCE -> large ? 10.4 : 5.8;
                    case NEAR -> large ? 11.7 : 4.7;
                });
    }

    /** The standard deviation of one reading: the limit divided by 1.96. */
    public static PrismDioptres standardDeviation(PrismDioptres turn, Viewing viewing) {
        return limitOfOne(turn, viewing).times(1 / Estimate.NORMAL_95);
    }

    /** The smallest change that is likely real, given the two readings: 12 Δ when either is over 20 Δ, else 6 Δ. */
    public static PrismDioptres realFrom(PrismDioptres before, PrismDioptres after) {
        return larger(before, after).isOver(LARGE) ? REAL_WHEN_LARGE : REAL_ELSE;
    }

    /** True when two signed readings of the same kind differ by what is likely a real amount. */
    public static boolean isReal(PrismDioptres before, PrismDioptres after) {
        return !after.minus(before).size().isUnder(realFrom(before, after));
    }

    /** True when the second reading is higher (further inward) by what is likely a real amount. */
    public static boolean isRealRise(PrismDioptres before, PrismDioptres after) {
        return after.isOver(before) && isReal(before, after);
    }

    /** True when both readings are under 10 Δ, where no repeatability was published. */
    public static boolean isExtrapolated(PrismDioptres before, PrismDioptres after) {
        return larger(before, after).isUnder(SMALLEST_STUDIED);
    }

    private static PrismDioptres larger(PrismDioptres one, PrismDioptres other) {
        return one.size().isOver(other.size()) ? one.size() : other.size();
    }
}
