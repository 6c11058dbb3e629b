package plusward.exam;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;

/**
 * What is marked on a photograph of the child wearing the glasses, in the order in which it is marked.
 *
 * <p>The picture is seen as one faces the child, so the child's right eye is on the picture's <em>left</em>. Start and end of a
 * segment's top line are its ends on the picture's left and right; exchanging the two changes nothing.
 */
public enum SegmentMark {
    RIGHT_LINE_START,
    RIGHT_LINE_END,
    RIGHT_PUPIL_TOP,
    RIGHT_PUPIL_BOTTOM,
    RIGHT_PUPIL_CENTRE,
    LEFT_LINE_START,
    LEFT_LINE_END,
    LEFT_PUPIL_TOP,
    LEFT_PUPIL_BOTTOM,
    LEFT_PUPIL_CENTRE;

    /** Its name on the way from the page: {@code right-line-start}. */
    public String key() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    /** The five marks of one eye, in order. */
    static List<SegmentMark> of(Eye eye) {
        return Arrays.stream(values())
                .filter(mark -> mark.name().startsWith(eye.name()))
                .toList();
    }
}
