package plusward.exam;

import java.util.Arrays;
import java.util.Locale;

/**
 * The shape of the part of a lens that holds the near add.
 *
 * <p>A progressive lens has no line, so nothing is judged against one.
 */
public enum SegmentStyle {
    /** A straight top edge, 28 mm wide. */
    FLAT_TOP_28("flat-top 28"),
    /** A straight top edge, 35 mm wide. */
    FLAT_TOP_35("flat-top 35"),
    /** A line across the whole lens. */
    EXECUTIVE("executive"),
    /** A round segment; its top is the highest point of the circle. */
    ROUND("round"),
    /** Power that grows downward without a line. */
    PROGRESSIVE("progressive"),
    /** Any other shape with a line. */
    OTHER("other");

    private final String written;

    SegmentStyle(String written) {
        this.written = written;
    }

    /**
     * Reads the word as it is written in a table of visits, in any case.
     *
     * @throws NotationException {@code unreadable} when it is none of them
     */
    public static SegmentStyle parse(String text) {
        String typed = Notation.SEGMENT_STYLE.typed(text).toLowerCase(Locale.ROOT);
        return Arrays.stream(values())
                .filter(each -> each.written.equals(typed))
                .findFirst()
                .orElseThrow(() -> Notation.SEGMENT_STYLE.refused(Problem.UNREADABLE, text));
    }

    /** True when the lens has a line whose top can be measured. */
    public boolean hasLine() {
        return this != PROGRESSIVE;
    }

    /** The word that {@link #parse} reads: {@code flat-top 28}. */
    @Override
    public String toString() {
        return written;
    }
}
