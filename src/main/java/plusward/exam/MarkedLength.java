package plusward.exam;

import plusward.optics.Millimetres;

/**
 * A length measured on a photograph, with how far it may be off.
 *
 * <p>In millimetres; an offset is + above the pupil centre and − below it. The error is half of a 95 % interval, so −2.4 with
 * an error of 0.3 means −2.7 to −2.1. It covers how well marks can be placed and the tilt that the picture shows, and not a camera held above
 * or below the child's eyes.
 *
 * @param value the length
 * @param error how far it may be off either way, never negative
 */
public record MarkedLength(Millimetres value, Millimetres error) {

    /** To tenths of a millimetre, as lengths are written: the value to the nearest, the error up, so that it never looks smaller. */
    public MarkedLength inTenths() {
        return new MarkedLength(
                Millimetres.of(Math.rint(value.amount() * 10) / 10),
                Millimetres.of(Math.ceil(error.amount() * 10) / 10));
    }
}
