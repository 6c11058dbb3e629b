package plusward.exam;

import org.jspecify.annotations.Nullable;
import plusward.optics.Millimetres;

/**
 * Where the segment line sits on the child's face.
 *
 * <p>Measured in one of two ways: the offset itself, which is the top of the segment relative to the pupil centre, as worn,
 * in millimetres, + above, − below; or two heights over the lowest point of the lens, whose difference is the offset. What
 * was written is kept apart, {@link #top} brings the two together. The pupil is the one in the room in which this was
 * judged; absent means that the clinic's default stands in for it.
 *
 * <p>Refused with {@link IllegalArgumentException}: heights that put the line over 20 mm from the pupil centre; an offset
 * that differs from that of the heights by more than 0.05 mm, half of the tenth in which lengths are read.
 *
 * @param style the shape of the segment; absent when not recorded
 * @param offset the upper edge over the pupil centre of each eye where it was measured as such, below negative
 * @param heights the segment line and the pupil centre over the lowest point of the lens
 * @param pupil the diameter of the pupil
 */
public record Segment(
        @Nullable SegmentStyle style,
        PerEye<Millimetres> offset,
        SegmentHeights heights,
        @Nullable Millimetres pupil) {

    /** Nothing was measured. */
    public static final Segment NONE = new Segment(null, PerEye.none(), SegmentHeights.NONE, null);

    /** The farthest that a segment top lies from the pupil centre, mm: common practice, no source. */
    static final int FARTHEST = 20;

    /** The smallest and the largest diameter that is taken for a pupil, mm: common practice, no source. */
    static final int SMALLEST_PUPIL = 1;

    static final int LARGEST_PUPIL = 10;

    /** How far an offset and its heights may disagree: half of a tenth of a millimetre. */
    private static final Millimetres TOLERANCE = Millimetres.of(0.05);

    public Segment {
        for (Eye eye : Eye.values()) {
            if (problem(offset.of(eye), heights.offset().of(eye)) != null) {
                throw new IllegalArgumentException("offset " + offset + " against heights " + heights);
            }
        }
    }

    /** What keeps an offset and the one that the heights give from both being true; absent when nothing does. */
    static @Nullable Problem problem(@Nullable Millimetres offset, @Nullable Millimetres byHeights) {
        if (byHeights == null) {
            return null;
        }
        if (byHeights.size().isOver(Millimetres.of(FARTHEST))) {
            return Problem.RANGE;
        }
        return offset != null && offset.minus(byHeights).size().isOver(TOLERANCE) ? Problem.CONFLICT : null;
    }

    /**
     * The top of the segment over the pupil centre of each eye, below negative: the offset where it was measured as such,
     * otherwise what the heights give; absent where neither is there.
     */
    public PerEye<Millimetres> top() {
        PerEye<Millimetres> byHeights = heights.offset();
        return new PerEye<>(
                offset.right() == null ? byHeights.right() : offset.right(),
                offset.left() == null ? byHeights.left() : offset.left());
    }

    /** False for a progressive lens, which has no line; an unknown style counts as one with a line. */
    public boolean hasLine() {
        return style == null || style.hasLine();
    }

    /** As the mirror shows it: right and left change places, heights keep their sign. */
    public Segment swapped() {
        return new Segment(style, offset.swapped(), heights.swapped(), pupil);
    }
}
