package plusward.exam;

import java.util.Locale;

/** A movement of one eye, looked at with the other eye covered. */
public enum Duction {
    /** Toward the temple. */
    ABDUCTION,
    /** Toward the nose. */
    ADDUCTION,
    /** Upward. */
    ELEVATION,
    /** Downward. */
    DEPRESSION;

    /** The word as it is written in a table of visits: {@code abduction}. */
    @Override
    public String toString() {
        return name().toLowerCase(Locale.ROOT);
    }
}
