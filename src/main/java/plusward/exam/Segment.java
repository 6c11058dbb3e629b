package plusward.exam;

import org.jspecify.annotations.Nullable;
import plusward.optics.Millimetres;

/**
 * Where the segment line sits on the child's face.
 *
 * <p>The top of the segment relative to the pupil centre, as worn, in millimetres: + above, − below. The pupil is the one
 * in the room in which this was judged; absent means that the clinic's default stands in for it.
 *
 * @param style the shape of the segment; absent when not recorded
 * @param top the height of its upper edge over the pupil centre of each eye, below negative
 * @param pupil the diameter of the pupil
 */
public record Segment(
        @Nullable SegmentStyle style,
        PerEye<Millimetres> top,
        @Nullable Millimetres pupil) {

    /** Nothing was measured. */
    public static final Segment NONE = new Segment(null, PerEye.none(), null);

    /** False for a progressive lens, which has no line; an unknown style counts as one with a line. */
    public boolean hasLine() {
        return style == null || style.hasLine();
    }

    /** As the mirror shows it: right and left change places, heights keep their sign. */
    public Segment swapped() {
        return new Segment(style, top.swapped(), pupil);
    }
}
