package plusward.optics;

/**
 * The axis of a cylinder, the meridian along which it has no power.
 *
 * <p>Whole degrees from 1 to 180 in the standard notation (counter-clockwise from the wearer's left as the examiner
 * faces the wearer, the same direction for both eyes). 0 is read as 180.
 *
 * <p>Refused with {@link IllegalArgumentException}: when the number lies outside 0 to 180.
 */
public record Axis(int inDegrees) {

    /** The horizontal meridian, written 180. */
    public static final Axis HORIZONTAL = new Axis(180);

    public Axis {
        if (inDegrees < 0 || inDegrees > 180) {
            throw new IllegalArgumentException("axis outside 0 to 180: " + inDegrees);
        }
        inDegrees = inDegrees == 0 ? 180 : inDegrees;
    }

    /** So many whole degrees, 0 to 180; 0 gives 180. */
    public static Axis of(int inDegrees) {
        return new Axis(inDegrees);
    }

    /** The meridian at right angles: 180 gives 90, 30 gives 120. */
    public Axis perpendicular() {
        return new Axis(inDegrees > 90 ? inDegrees - 90 : inDegrees + 90);
    }

    /** The same lens seen in a mirror, as the other eye would wear it: 10 gives 170, 180 and 90 stay. */
    public Axis mirrored() {
        return new Axis(180 - inDegrees);
    }

    /** For the sines and cosines of this package: 180 is π. */
    double inRadians() {
        return Math.toRadians(inDegrees);
    }

    @Override
    public String toString() {
        return Integer.toString(inDegrees);
    }
}
