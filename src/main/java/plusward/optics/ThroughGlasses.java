package plusward.optics;

import java.util.Optional;

/**
 * A turn measured with prisms held before glasses reads small through plus and large through minus lenses.
 *
 * <p>true = read/(1 − 0.025 F), F the power in the horizontal meridian, mean of both lenses. Source for the direction and
 * for the significance from ±5 D: Scattergood, Brown, Guyton, Am J Ophthalmol 1983;96:439; the 2.5 % for each dioptre is
 * from memory. For distance readings only; shown beside the reading, never instead of it. Worked example: 30 Δ read through
 * +5.00 is 34.3 Δ.
 */
public final class ThroughGlasses {

    private static final double PER_DIOPTRE = 0.025;
    /** Beyond this the rule is not used: common practice, no source; it keeps the factor between 0.5 and 1.5. */
    private static final Dioptres STRONGEST = Dioptres.of(20);

    private ThroughGlasses() {}

    /** The mean horizontal power of a pair of lenses: S + C sin²A of each, in dioptres. */
    public static Dioptres horizontalPower(Lens right, Lens left) {
        return right.powerAlong(Axis.HORIZONTAL)
                .plus(left.powerAlong(Axis.HORIZONTAL))
                .times(0.5);
    }

    /** What a reading of 1 becomes through the lens: 1 − 0.025 F; 0.75 at +10 D, 1.25 at −10 D. */
    static double factor(Dioptres horizontalPower) {
        return 1 - PER_DIOPTRE * horizontalPower.inDioptres();
    }

    /** The turn behind the reading, in prism dioptres with the reading's sign; empty when the lens is beyond ±20 D. */
    public static Optional<PrismDioptres> trueTurn(PrismDioptres read, Dioptres horizontalPower) {
        return horizontalPower.size().isOver(STRONGEST)
                ? Optional.empty()
                : Optional.of(read.times(1 / factor(horizontalPower)));
    }
}
