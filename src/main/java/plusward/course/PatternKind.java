package plusward.course;

import java.util.Locale;

/** The pattern of a child's turn over the course, in the words of the data format. */
public enum PatternKind {
    FULLY_ACCOMMODATIVE,
    CONVERGENCE_EXCESS,
    PARTLY_ACCOMMODATIVE,
    NON_ACCOMMODATIVE,
    LOST_CONTROL,
    TURNED_OUT,
    UNDETERMINED;

    /** The kind as data and messages write it: {@code lost-control}. */
    public String code() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
}
