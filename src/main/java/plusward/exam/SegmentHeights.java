package plusward.exam;

import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import plusward.optics.Millimetres;

/**
 * The segment line and the pupil centre measured up from the lowest point of the lens, as a ruler on the frame shows them.
 *
 * <p>Millimetres, 0 to 60, the child wearing the glasses and looking straight ahead. Where both are there, their difference
 * is the offset of the segment: line 18.5, pupil centre 20.0: the line lies at −1.5, 1.5 mm below the pupil centre.
 *
 * <p>Refused with {@link IllegalArgumentException}: a height outside 0 to 60 mm. A spectacle lens is not taller (common
 * practice, no source).
 *
 * @param line the top of the segment of each lens over the lowest point of that lens
 * @param pupil the pupil centre of each eye over the lowest point of its lens
 */
public record SegmentHeights(PerEye<Millimetres> line, PerEye<Millimetres> pupil) {

    /** No height was measured. */
    public static final SegmentHeights NONE = new SegmentHeights(PerEye.none(), PerEye.none());

    /** The tallest lens, mm. */
    static final int TALLEST = 60;

    public SegmentHeights {
        if (Stream.concat(line.measured(), pupil.measured()).anyMatch(SegmentHeights::isNoHeight)) {
            throw new IllegalArgumentException("height outside 0 to " + TALLEST + " mm: " + line + ", " + pupil);
        }
    }

    private static boolean isNoHeight(Millimetres height) {
        return height.isUnder(Millimetres.ZERO) || height.isOver(Millimetres.of(TALLEST));
    }

    /** Height minus pupil height of each eye: the line over the pupil centre, below negative; absent unless both are there. */
    public PerEye<Millimetres> offset() {
        return new PerEye<>(offset(Eye.RIGHT), offset(Eye.LEFT));
    }

    private @Nullable Millimetres offset(Eye eye) {
        Millimetres top = line.of(eye);
        Millimetres centre = pupil.of(eye);
        return top == null || centre == null ? null : top.minus(centre);
    }

    /** As the mirror shows them: right and left change places. */
    public SegmentHeights swapped() {
        return new SegmentHeights(line.swapped(), pupil.swapped());
    }
}
