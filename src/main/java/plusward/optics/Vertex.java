package plusward.optics;

/**
 * What a spectacle lens amounts to at the eye, some millimetres behind it.
 *
 * <p>F/(1 − dF) with d in metres, in each principal meridian (paraxial optics). Worked examples: +5.00 at 12 mm is +5.319
 * at the cornea; +6.00 −2.00 × 180 is +6.466 −2.264 × 180.
 */
public final class Vertex {

    private Vertex() {}

    /**
     * The lens that, worn on the cornea, does what this lens does at the vertex distance.
     *
     * @throws IllegalArgumentException when a meridian's focus falls on or before the cornea (dF ≥ 1)
     */
    public static Lens atCornea(Lens spectacle, Millimetres vertexDistance) {
        Dioptres along = atCornea(spectacle.sphere(), vertexDistance);
        Dioptres across = atCornea(spectacle.sphere().plus(spectacle.cylinder()), vertexDistance);
        return new Lens(along, across.minus(along), spectacle.axis());
    }

    private static Dioptres atCornea(Dioptres power, Millimetres vertexDistance) {
        double rest = 1 - vertexDistance.inMetres() * power.inDioptres();
        if (rest <= 0) {
            throw new IllegalArgumentException("the focus of " + power + " D falls before the cornea");
        }
        return power.times(1 / rest);
    }
}
