package plusward.exam;

import java.util.regex.Matcher;
import java.util.regex.Pattern;
import plusward.optics.Degrees;

/**
 * A place in a picture.
 *
 * <p>In pixels of the picture as it is shown upright, from its upper left corner: x grows to the right, y grows
 * <em>downward</em>. Each 0 to 20 000, and fractions are kept. Written as {@code 812.5 403}.
 *
 * <p>Refused with {@link RefusedMarks}: {@code marks.place} for a coordinate outside that range or not a finite number. The
 * range is wider than any camera's picture: own choice, no source.
 */
public record PicturePoint(double x, double y) {

    /** The farthest coordinate. */
    static final int FARTHEST = 20_000;

    /** Two plain numbers with a space between, and no more digits than a coordinate has. */
    private static final Pattern WRITTEN = Pattern.compile("(-?\\d{1,9}(?:\\.\\d{1,9})?) (-?\\d{1,9}(?:\\.\\d{1,9})?)");

    public PicturePoint {
        if (!isInside(x) || !isInside(y)) {
            throw new RefusedMarks(Reason.of("marks.place"));
        }
    }

    /** False for what is not a number as well. */
    private static boolean isInside(double coordinate) {
        return coordinate >= 0 && coordinate <= FARTHEST;
    }

    /** Reads {@code 812.5 403}; anything else is refused as {@code marks.place}. */
    static PicturePoint parse(String text) {
        Matcher written = WRITTEN.matcher(text);
        if (!written.matches()) {
            throw new RefusedMarks(Reason.of("marks.place"));
        }
        return new PicturePoint(Double.parseDouble(written.group(1)), Double.parseDouble(written.group(2)));
    }

    /** How far it is to another place, in pixels. */
    double distanceTo(PicturePoint other) {
        return Math.hypot(other.x - x, other.y - y);
    }

    /** Half way to another place. */
    PicturePoint middle(PicturePoint other) {
        return new PicturePoint((x + other.x) / 2, (y + other.y) / 2);
    }

    /**
     * The angle of the line to another place against the horizontal, −90 to 90 degrees; positive where the line goes
     * down to the right. It is the same from either end. From (0, 0) to (100, 10) it is 5.7°. Needs two different places.
     */
    Degrees slopeTo(PicturePoint other) {
        return Degrees.of(Math.toDegrees(Math.atan((other.y - y) / (other.x - x))));
    }
}
