package plusward.optics;

/**
 * A spectacle lens or a refraction: sphere, cylinder and axis, in the form in which it was written.
 *
 * <p>Sphere and cylinder in dioptres, plus positive; the axis is the meridian of the cylinder without power. Plus-cylinder
 * and minus-cylinder forms are both lenses; they stay as typed and are compared with {@link #isSamePowerAs}, not with
 * {@code equals}. A lens without cylinder has the axis 180, which then means nothing. Any finite power: what a clinic may
 * enter is limited by the notation, not here, since a calculated lens may lie outside it.
 *
 * Worked example: {@code +4.50 -1.00 x 180} has the spherical equivalent +4.00 D and is the lens
 * {@code +3.50 +1.00 x 90}.
 */
public record Lens(Dioptres sphere, Dioptres cylinder, Axis axis) {

    /** A lens without power, written {@code plano}. */
    public static final Lens PLANO = sphere(Dioptres.ZERO);

    public Lens {
        axis = cylinder.amount() == 0 ? Axis.HORIZONTAL : axis;
    }

    /** A lens with the same power in every meridian. */
    public static Lens sphere(Dioptres sphere) {
        return new Lens(sphere, Dioptres.ZERO, Axis.HORIZONTAL);
    }

    /** Sphere and cylinder in dioptres with their sign, axis in degrees: {@code of(4.50, -1.00, 180)}. */
    public static Lens of(double sphere, double cylinder, int axis) {
        return new Lens(Dioptres.of(sphere), Dioptres.of(cylinder), Axis.of(axis));
    }

    /** The sphere that blurs least in place of this lens: S + C/2, in dioptres. +4.50 −1.00 × 180 gives +4.00. */
    public Dioptres sphericalEquivalent() {
        return sphere.plus(cylinder.times(0.5));
    }

    /**
     * The same lens in the other cylinder form: sphere S + C, cylinder −C, axis at right angles within 1 to 180.
     * +4.50 −1.00 × 180 is +3.50 +1.00 × 90.
     */
    public Lens transposed() {
        return new Lens(sphere.plus(cylinder), cylinder.times(-1), axis.perpendicular());
    }

    /** In the form whose cylinder is negative or 0; this lens itself when it already is. */
    public Lens inMinusCylinder() {
        return cylinder.amount() > 0 ? transposed() : this;
    }

    /** In the form whose cylinder is positive or 0; this lens itself when it already is. */
    public Lens inPlusCylinder() {
        return cylinder.amount() < 0 ? transposed() : this;
    }

    /** True when both bend light alike, whichever cylinder form each is written in. */
    public boolean isSamePowerAs(Lens other) {
        return inMinusCylinder().equals(other.inMinusCylinder());
    }

    /**
     * The power in one meridian: S + C sin²(θ − A), in dioptres.
     *
     * <p>In the horizontal meridian θ = 180 this is S + C sin²A; along the axis it is S, across it S + C.
     */
    public Dioptres powerAlong(Axis meridian) {
        double sine = Math.sin(meridian.inRadians() - axis.inRadians());
        return sphere.plus(cylinder.times(sine * sine));
    }

    /** This lens as three numbers that may be averaged and subtracted. */
    public PowerVector powerVector() {
        return PowerVector.of(this);
    }

    /** The lens as the other eye would wear it: the axis mirrored about the vertical, 10 becomes 170. */
    public Lens mirrored() {
        return new Lens(sphere, cylinder, axis.mirrored());
    }

    /**
     * The trade's notation, always with a sign and to 0.01 D: {@code +3.50 -0.75 x 180}, {@code +3.50}, {@code plano}. A
     * power that rounds to 0 is written as none.
     */
    @Override
    public String toString() {
        String first = printsAsZero(sphere) ? "plano" : sphere.toString();
        return printsAsZero(cylinder) ? first : first + " " + cylinder + " x " + axis;
    }

    private static boolean printsAsZero(Dioptres power) {
        return power.toString().equals("0.00");
    }
}
