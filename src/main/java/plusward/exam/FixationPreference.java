package plusward.exam;

import java.util.Arrays;
import java.util.Locale;

/**
 * With which eye the child looks while both are open.
 *
 * <p>A child who turns one eye and always looks with the other may see less with the one that turns. Nothing is judged from
 * it here.
 */
public enum FixationPreference {
    /** Now with the one, now with the other. */
    ALTERNATES("alternates"),
    /** Mostly with the right eye. */
    PREFERS_RIGHT("prefers right"),
    /** Mostly with the left eye. */
    PREFERS_LEFT("prefers left");

    private final String written;

    FixationPreference(String written) {
        this.written = written;
    }

    /**
     * Reads the words as they are written in a table of visits, in any case.
     *
     * @throws NotationException {@code unreadable} when it is none of them
     */
    public static FixationPreference parse(String text) {
        String typed = Notation.FIXATION.typed(text).toLowerCase(Locale.ROOT);
        return Arrays.stream(values())
                .filter(each -> each.written.equals(typed))
                .findFirst()
                .orElseThrow(() -> Notation.FIXATION.refused(Problem.UNREADABLE, text));
    }

    /** As the mirror shows it: the other eye is preferred. */
    public FixationPreference mirrored() {
        return switch (this) {
            case ALTERNATES -> ALTERNATES;
            case PREFERS_RIGHT -> PREFERS_LEFT;
            case PREFERS_LEFT -> PREFERS_RIGHT;
        };
    }

    /** The words that {@link #parse} reads: {@code prefers right}. */
    @Override
    public String toString() {
        return written;
    }
}
