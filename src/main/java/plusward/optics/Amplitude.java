package plusward.optics;

/**
 * How much an eye can focus, by age.
 *
 * <p>Hofstetter, Optom World 1950 (seen in secondary sources): least 15 − 0.25 a, mean 18.5 − 0.30 a, most 25 − 0.40 a
 * dioptres, a the age in years. These over-estimate young children; measured objectively the mean is
 * 7.33 − 0.0035 (a − 3)² (Anderson et al., IOVS 2008;49:2919). Where a warning depends on the amplitude the lower of the
 * two is used, and the text says which. None is below 0. Worked example: at 6 years 13.5, 16.7 and 22.6 D.
 */
public final class Amplitude {

    private Amplitude() {}

    /** The least that Hofstetter allows at this age: 15 − 0.25 a, in dioptres, never below 0. */
    public static Dioptres least(Age age) {
        return line(15, 0.25, age);
    }

    /** The mean by Hofstetter: 18.5 − 0.30 a, in dioptres, never below 0. */
    public static Dioptres mean(Age age) {
        return line(18.5, 0.30, age);
    }

    /** The most by Hofstetter: 25 − 0.40 a, in dioptres, never below 0. */
    public static Dioptres most(Age age) {
        return line(25, 0.40, age);
    }

    /**
     * The objectively measured mean: 7.33 − 0.0035 (a − 3)², in dioptres, never below 0; 7.33 D at 3 years, 7.30 D at 6.
     * Source: Anderson et al., IOVS 2008;49:2919.
     */
    public static Dioptres objectiveMean(Age age) {
        double sinceThree = age.inYears() - 3;
        return notBelowZero(7.33 - 0.0035 * sinceThree * sinceThree);
    }

    /**
     * From the nearest point at which print stays clear: 100/cm. 7 cm is 14 D, 10 cm is 10 D.
     *
     * @throws IllegalArgumentException unless the distance is above 0
     */
    public static Dioptres fromNearPoint(Millimetres nearPoint) {
        if (nearPoint.inMillimetres() <= 0) {
            throw new IllegalArgumentException("a near point lies before the eye: " + nearPoint + " mm");
        }
        return Dioptres.of(100 / nearPoint.inCentimetres());
    }

    private static Dioptres line(double start, double perYear, Age age) {
        return notBelowZero(start - perYear * age.inYears());
    }

    private static Dioptres notBelowZero(double dioptres) {
        return Dioptres.of(Math.max(0, dioptres));
    }
}
