package plusward.optics;

/**
 * The prism that a lens makes away from its optical centre.
 *
 * <p>Prentice's rule: Δ = distance from the centre in cm × power in D. The sign of the result is that of the product; the
 * direction of the base is not tracked. Worked example: +5.00 D looked through 4 mm off centre makes 2.0 Δ.
 */
public final class Prentice {

    private Prentice() {}

    /** Lens power in dioptres, distance from the optical centre in millimetres; the prism in prism dioptres. */
    public static PrismDioptres prism(Dioptres power, Millimetres fromCentre) {
        return PrismDioptres.of(fromCentre.inCentimetres() * power.inDioptres());
    }
}
