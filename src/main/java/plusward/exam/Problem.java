package plusward.exam;

import java.util.Locale;

/** What can be wrong with a text that should hold a measure. {@link #key()} is the last part of the message's key. */
enum Problem {
    /** Not this notation at all. */
    UNREADABLE,
    /** A date is required and there is none. */
    MISSING,
    /** More characters than any such entry has. */
    LONG,
    /** A character that has no place in a text, such as an escape or half of a pair. */
    CONTROL,
    /** A comma between digits, where the decimal sign is a point. */
    COMMA,
    /** A number whose sign matters, without one. */
    SIGN,
    /** More decimals than the measure has. */
    FINE,
    /** A number outside the accepted range. */
    RANGE,
    /** A cylinder whose axis is missing or outside 0 to 180. */
    AXIS,
    /** A date's form with a day that the calendar does not have. */
    CALENDAR,
    /** The size of a turn without its direction. */
    DIRECTION,
    /** The direction of a turn without its size. */
    SIZE,
    /** Two horizontal turns, or two vertical ones, in one entry. */
    TWICE,
    /** The mark of a near reading in a field for distance. */
    PRIME,
    /** Two entries of one visit that cannot both be true. */
    CONFLICT;

    String key() {
        return name().toLowerCase(Locale.ROOT);
    }
}
