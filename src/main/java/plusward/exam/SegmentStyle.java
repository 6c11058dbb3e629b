package plusward.exam;

import java.util.Arrays;
import java.util.Locale;

/** The shape of the part of a lens that holds the near add. A progressive lens has no line, so nothing is judged against one. */
public enum SegmentStyle {
    FLAT_TOP_28("flat-top 28"),
    FLAT_TOP_35("flat-top 35"),
    EXECUTIVE("executive"),
    ROUND("round"),
    PROGRESSIVE("progressive"),
    OTHER("other");

    private final String written;

    SegmentStyle(String written) {
        this.written = written;
    }

    /**
     * Reads the word as it is written in a table of visits, in any case.
     *
     * @throws NotationException when it is none of them
     */
    public static SegmentStyle parse(String text) {
        String typed = text.strip().toLowerCase(Locale.ROOT);
        return Arrays.stream(values())
                .filter(each -> each.written.equals(typed))
                .findFirst()
                .orElseThrow(() -> new NotationException("segment-style", "unreadable", text));
    }

    /** True when the lens has a line whose top can be measured. */
    public boolean hasLine() {
        return this != PROGRESSIVE;
    }

    @Override
    public String toString() {
        return written;
    }
}
