package plusward.optics;

import java.util.Collection;

/**
 * A refraction as three independent numbers that may be averaged and subtracted.
 *
 * <p>M = S + C/2, J0 = −(C/2) cos 2A, J45 = −(C/2) sin 2A, each in dioptres; both cylinder forms of a lens give the same
 * vector. Source: Thibos, Wheeler, Horner, Optom Vis Sci 1997;74:367. Worked examples: +5.00 −2.00 × 30 gives
 * (4.00, 0.500, 0.866); +2.00 −1.50 × 90 gives (1.25, −0.75, 0).
 */
public record PowerVector(Dioptres m, Dioptres j0, Dioptres j45) {

    /** The three components of a lens or a refraction. */
    static PowerVector of(Lens lens) {
        double twice = 2 * lens.axis().inRadians();
        Dioptres half = lens.cylinder().times(-0.5);
        return new PowerVector(lens.sphericalEquivalent(), half.times(Math.cos(twice)), half.times(Math.sin(twice)));
    }

    /**
     * The mean of several refractions, component by component. The mean of +4.00 −1.00 × 10 and +4.00 −1.00 × 170 is
     * +3.97 −0.94 × 180.
     *
     * @throws IllegalArgumentException when there is nothing to average
     */
    public static PowerVector mean(Collection<PowerVector> vectors) {
        if (vectors.isEmpty()) {
            throw new IllegalArgumentException("no refraction to average");
        }
        PowerVector sum = vectors.stream().reduce(PowerVector::plus).orElseThrow();
        return sum.times(1.0 / vectors.size());
    }

    /**
     * How far apart two refractions are: √(ΔM² + ΔJ0² + ΔJ45²), in dioptres, never negative. From +3.00 −1.00 × 180 to
     * +3.00 −1.00 × 90 is a change of 1.00 D, which the spherical equivalent hides.
     */
    public Dioptres distanceTo(PowerVector other) {
        PowerVector d = plus(other.times(-1));
        double squares = square(d.m) + square(d.j0) + square(d.j45);
        return Dioptres.of(Math.sqrt(squares));
    }

    /**
     * Back to a lens in minus-cylinder form: C = −2 √(J0² + J45²), S = M − C/2, A = ½ arctan(J45/J0), rounded to a whole
     * degree; the powers are not rounded. (4.00, 0.500, 0.866) is +5.00 −2.00 × 30.
     */
    public Lens toLens() {
        double half = Math.hypot(j0.amount(), j45.amount());
        double degrees = Math.toDegrees(0.5 * Math.atan2(j45.amount(), j0.amount()));
        int axis = Math.floorMod(Math.round(degrees), 180);
        return new Lens(Dioptres.of(m.amount() + half), Dioptres.of(-2 * half), Axis.of(axis));
    }

    private PowerVector plus(PowerVector other) {
        return new PowerVector(m.plus(other.m), j0.plus(other.j0), j45.plus(other.j45));
    }

    private PowerVector times(double factor) {
        return new PowerVector(m.times(factor), j0.times(factor), j45.times(factor));
    }

    private static double square(Dioptres d) {
        return d.amount() * d.amount();
    }
}
