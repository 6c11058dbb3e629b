package plusward.exam;

import org.jspecify.annotations.Nullable;
import plusward.optics.Millimetres;

/**
 * Where the segment line sits on the child's face.
 *
 * <p>The top of the segment relative to the pupil centre, as worn, in millimetres: + above, − below. The pupil is the one
 * in the room in which this was judged; absent means that the clinic's default stands in for it.
 */
public record Segment(
        @Nullable SegmentStyle style,
        PerEye<Millimetres> top,
        @Nullable Millimetres pupil) {

    public static final Segment NONE = new Segment(null, PerEye.none(), null);

    /** False for a progressive lens, which has no line; an unknown style counts as one with a line. */
    public boolean hasLine() {
        return style == null || style.hasLine();
    }

    public Segment swapped() {
        return new Segment(style, top.swapped(), pupil);
    }
}
