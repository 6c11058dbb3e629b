package plusward.handout;

import plusward.optics.Accommodation;
import plusward.optics.Dioptres;

/**
 * An eye without glasses and behind the plus lens, drawn for this child; lengths in units of the drawing.
 *
 * <p>Not to scale, but in proportion: the more focusing is needed, the more the lens inside the eye bulges, and the farther
 * behind the eye the light would meet at rest.
 *
 * @param bulgeWithout half the thickness of the lens inside the eye without glasses
 * @param bulgeWith the same behind the glasses
 * @param behind where the light would meet at rest, beyond the back wall
 * @param glass half the thickness of the plus lens
 */
record EyeDrawing(long bulgeWithout, long bulgeWith, long behind, long glass) {

    private static final double FLAT = 7;
    private static final double BULGE_PER_DIOPTRE = 1.7;
    private static final double MOST_BULGE = 20;

    static EyeDrawing of(SheetFacts facts) {
        Dioptres hyperopia = facts.cycloplegic().hyperopia();
        Dioptres lens = facts.lenses().mean().orElse(hyperopia);
        Dioptres left = Accommodation.neededForDistance(hyperopia, lens);
        return new EyeDrawing(
                bulge(hyperopia),
                bulge(left),
                Math.round(Math.min(70, 14 + 8 * hyperopia.amount())),
                Math.round(Math.min(14, 5 + lens.amount())));
    }

    /** True when nothing is left to focus behind the glasses. */
    public boolean rests() {
        return bulgeWith <= Math.round(FLAT + BULGE_PER_DIOPTRE * 0.5);
    }

    private static long bulge(Dioptres focusing) {
        return Math.round(Math.min(MOST_BULGE, FLAT + BULGE_PER_DIOPTRE * focusing.amount()));
    }
}
