package plusward.optics;

/**
 * How much a child must focus to see clearly.
 *
 * <p>At distance max(0, H − F), at near max(0, H − F − add + 1/d): H the hyperopia found under cycloplegia and F the plus
 * worn (0 without glasses), both as spherical equivalents; d = 1/3 m. By definition; the distance between lens and eye is
 * neglected. Worked example: hyperopia +4.00 without glasses needs 4.00 D for distance and 7.00 D for near.
 */
public final class Accommodation {

    /** The demand of an object at one third of a metre. */
    public static final Dioptres NEAR_DEMAND = Dioptres.of(3);

    private Accommodation() {}

    /** For 6 m and beyond, in dioptres; 0 when the glasses are as strong as the hyperopia or stronger. */
    public static Dioptres neededForDistance(Dioptres hyperopia, Dioptres worn) {
        return neverNegative(hyperopia.minus(worn));
    }

    /**
     * For one third of a metre, in dioptres, never below 0. The extra plus is the add of a segment or a trial lens held over
     * the glasses; {@link Dioptres#ZERO} for none.
     */
    public static Dioptres neededForNear(Dioptres hyperopia, Dioptres worn, Dioptres extraPlus) {
        return neverNegative(hyperopia.minus(worn).minus(extraPlus).plus(NEAR_DEMAND));
    }

    private static Dioptres neverNegative(Dioptres need) {
        return need.isUnder(Dioptres.ZERO) ? Dioptres.ZERO : need;
    }
}
