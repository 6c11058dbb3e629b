package plusward.exam;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import plusward.optics.Millimetres;

/**
 * Reads the marks on a photograph as the page sends them: the only way from their text to {@link SegmentMarks}.
 *
 * <p>Each {@link SegmentMark} under its key as {@code 812.5 403}; under {@code width} the true length of the segment's top
 * line in mm; under {@code pixels-per-step} how many pixels of the picture a pixel of the screen covered.
 *
 * <p>Refused with {@link RefusedMarks}: {@code marks.missing} with the marks that are not there, a width that cannot be read,
 * and all that {@link PicturePoint} and {@link SegmentMarks} refuse.
 */
public final class MarksReader {

    private final Map<String, String> typed;

    private MarksReader(Map<String, String> typed) {
        this.typed = typed;
    }

    /** The marks, valid; what else is in the map is left alone. */
    public static SegmentMarks read(Map<String, String> typed) {
        List<SegmentMark> missing = Arrays.stream(SegmentMark.values())
                .filter(mark -> typed.getOrDefault(mark.key(), "").isBlank())
                .toList();
        if (!missing.isEmpty()) {
            throw new RefusedMarks(Reason.of("marks.missing", missing.size(), missing));
        }
        MarksReader reader = new MarksReader(typed);
        return new SegmentMarks(reader.eye(Eye.RIGHT), reader.eye(Eye.LEFT), reader.width(), reader.pixelsPerStep());
    }

    private EyeMarks eye(Eye eye) {
        List<PicturePoint> points = SegmentMark.of(eye).stream()
                .map(mark -> PicturePoint.parse(text(mark.key()).strip()))
                .toList();
        return new EyeMarks(
                points.get(0), points.get(1), new EyeMarks.Pupil(points.get(2), points.get(3), points.get(4)));
    }

    private Millimetres width() {
        try {
            return MeasureNotation.lineWidth(text("width"));
        } catch (NotationException unreadable) {
            throw new RefusedMarks(unreadable.reason());
        }
    }

    /** A plain number; one pixel for one where nothing is said. */
    private double pixelsPerStep() {
        String text = typed.getOrDefault("pixels-per-step", "1").strip();
        if (!text.matches("\\d{1,9}(\\.\\d{1,20})?")) {
            throw new RefusedMarks(Reason.of("marks.place"));
        }
        return Double.parseDouble(text);
    }

    private String text(String key) {
        return typed.getOrDefault(key, "");
    }
}
