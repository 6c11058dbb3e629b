package plusward.exam;

import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;
import java.util.function.DoubleUnaryOperator;
import java.util.function.UnaryOperator;

/**
 * A face on a photograph as the marks that a page would send, 0.1 mm a pixel: both lines 280 pixels for 28 mm and 24 pixels
 * under the pupil centre, both pupils 46 pixels.
 */
public final class MarkedFace {

    private final Map<String, String> typed;

    private MarkedFace(Map<String, String> typed) {
        this.typed = typed;
    }

    /** The child's right eye at x 300, the left at x 900, both at y 600. */
    public static MarkedFace level() {
        Map<String, String> typed = new LinkedHashMap<>();
        eye(typed, "right", 300);
        eye(typed, "left", 900);
        typed.put("width", "28");
        return new MarkedFace(typed);
    }

    private static void eye(Map<String, String> typed, String eye, int x) {
        typed.put(eye + "-line-start", (x - 140) + " 624");
        typed.put(eye + "-line-end", (x + 140) + " 624");
        typed.put(eye + "-pupil-top", x + " 577");
        typed.put(eye + "-pupil-bottom", x + " 623");
        typed.put(eye + "-pupil-centre", x + " 600");
    }

    /** With another text under this key. */
    public MarkedFace with(String key, String text) {
        Map<String, String> changed = new LinkedHashMap<>(typed);
        changed.put(key, text);
        return new MarkedFace(changed);
    }

    /** The whole face turned about (600, 600), clockwise positive. */
    MarkedFace rolled(double degrees) {
        return moved("", turnedAbout(600, degrees));
    }

    /** Only the line of this eye turned about the middle of it. */
    MarkedFace withLineTurned(String eye, double degrees) {
        int x = eye.equals("right") ? 300 : 900;
        return moved(eye + "-line", point -> {
            double[] shifted = {point[0], point[1] - 24};
            double[] turned = turnedAbout(x, degrees).apply(shifted);
            return new double[] {turned[0], turned[1] + 24};
        });
    }

    /** Every mark displaced by what this gives for its coordinate. */
    MarkedFace displaced(DoubleUnaryOperator displaced) {
        return moved("", point -> new double[] {displaced.applyAsDouble(point[0]), displaced.applyAsDouble(point[1])});
    }

    /** As a mirror shows it: x counted from the right edge of a picture 1200 wide, right and left exchanged. */
    MarkedFace mirrored() {
        MarkedFace seen = moved("", point -> new double[] {1200 - point[0], point[1]});
        Map<String, String> exchanged = new LinkedHashMap<>();
        seen.typed.forEach((key, text) -> exchanged.put(other(key), text));
        return new MarkedFace(exchanged);
    }

    private static String other(String key) {
        return key.startsWith("right") ? key.replaceFirst("right", "left") : key.replaceFirst("^left", "right");
    }

    private static UnaryOperator<double[]> turnedAbout(double x, double degrees) {
        double cos = Math.cos(Math.toRadians(degrees));
        double sin = Math.sin(Math.toRadians(degrees));
        return point -> new double[] {
            x + cos * (point[0] - x) - sin * (point[1] - 600), 600 + sin * (point[0] - x) + cos * (point[1] - 600)
        };
    }

    private MarkedFace moved(String keys, UnaryOperator<double[]> move) {
        Map<String, String> moved = new LinkedHashMap<>(typed);
        moved.replaceAll((key, text) -> key.startsWith(keys) && text.contains(" ") ? written(move, text) : text);
        return new MarkedFace(moved);
    }

    private static String written(UnaryOperator<double[]> move, String text) {
        PicturePoint point = PicturePoint.parse(text);
        double[] to = move.apply(new double[] {point.x(), point.y()});
        return String.format(Locale.ROOT, "%.9f %.9f", to[0], to[1]);
    }

    /** As the page sends it. */
    public Map<String, String> typed() {
        return typed;
    }

    SegmentMarks read() {
        return MarksReader.read(typed);
    }
}
