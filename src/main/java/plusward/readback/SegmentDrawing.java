package plusward.readback;

import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import plusward.course.SegmentPlace;
import plusward.exam.Eye;
import plusward.optics.Millimetres;

/**
 * The segment lines before the pupils, to scale, as one faces the child: the right eye on the left. One unit is a millimetre.
 *
 * @param radius of the pupils
 * @param edge the height of their lower edge in the picture
 * @param assumed true when the clinic's usual pupil stands in for the child's
 * @param eyes the eyes whose line was measured
 */
public record SegmentDrawing(String radius, String edge, boolean assumed, List<Line> eyes) {

    private static final double RIGHT_CENTRE = 10;
    private static final double LEFT_CENTRE = 30;
    private static final double PUPIL_HEIGHT = 7;
    private static final double HALF_A_LINE = 7;
    /** A line further off than this is drawn at the rim of the picture. */
    private static final double RIM = 6.5;

    /**
     * One eye.
     *
     * @param right true for the child's right eye
     * @param x the middle of the eye
     * @param top the line's height in the picture, which grows downward
     */
    public record Line(boolean right, String x, String from, String to, String top, Millimetres height) {}

    static SegmentDrawing of(SegmentPlace place) {
        return new SegmentDrawing(
                written(place.pupil().inMillimetres() / 2),
                written(PUPIL_HEIGHT + place.pupil().inMillimetres() / 2),
                place.assumed(),
                Stream.of(Eye.values())
                        .flatMap(eye -> line(eye, place.top().of(eye)))
                        .toList());
    }

    private static Stream<Line> line(Eye eye, @Nullable Millimetres top) {
        if (top == null) {
            return Stream.empty();
        }
        double x = eye == Eye.RIGHT ? RIGHT_CENTRE : LEFT_CENTRE;
        double down = Math.max(-RIM, Math.min(RIM, -top.inMillimetres()));
        return Stream.of(new Line(
                eye == Eye.RIGHT,
                written(x),
                written(x - HALF_A_LINE),
                written(x + HALF_A_LINE),
                written(PUPIL_HEIGHT + down),
                top));
    }

    private static String written(double number) {
        return String.format(Locale.ROOT, "%.2f", number);
    }
}
