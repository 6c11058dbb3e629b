package plusward.exam;

import static plusward.exam.Problem.AXIS;
import static plusward.exam.Problem.CALENDAR;
import static plusward.exam.Problem.COMMA;
import static plusward.exam.Problem.CONFLICT;
import static plusward.exam.Problem.CONTROL;
import static plusward.exam.Problem.DIRECTION;
import static plusward.exam.Problem.FINE;
import static plusward.exam.Problem.LONG;
import static plusward.exam.Problem.MISSING;
import static plusward.exam.Problem.PRIME;
import static plusward.exam.Problem.RANGE;
import static plusward.exam.Problem.SIGN;
import static plusward.exam.Problem.SIZE;
import static plusward.exam.Problem.TWICE;
import static plusward.exam.Problem.UNREADABLE;

import java.util.Locale;
import java.util.Set;
import java.util.regex.Pattern;

/**
 * A way of writing one kind of measure, with everything that can be wrong with it.
 *
 * <p>The list is complete: a problem that is not declared here cannot be thrown, and each declared one has its sentence in
 * the message bundle, as {@code notation.<key>.<problem>}, beside {@code notation.<key>.accepted}.
 */
enum Notation {
    /** A lens or a refraction: {@link LensNotation}. */
    LENS(UNREADABLE, LONG, COMMA, SIGN, FINE, RANGE, AXIS),
    /** A turn at one distance: {@link Turn#parse}. */
    TURN(UNREADABLE, LONG, COMMA, FINE, RANGE, DIRECTION, SIZE, TWICE, PRIME),
    /** Visual acuity: {@link Acuity#parse}. */
    ACUITY(UNREADABLE, LONG, COMMA, RANGE),
    /** An ISO date. */
    DATE(UNREADABLE, LONG, MISSING, CALENDAR, RANGE),
    /** A near add or a trial plus, D. */
    ADD(UNREADABLE, LONG, COMMA, FINE, RANGE),
    /** Hours of wear on an ordinary day. */
    HOURS(UNREADABLE, LONG, COMMA, FINE, RANGE),
    /** The height of a segment top over the pupil centre, mm, signed. */
    SEGMENT(UNREADABLE, LONG, COMMA, FINE, RANGE),
    /** The true length of a segment's top line, which gives a photograph its scale, mm. */
    LINE_WIDTH(UNREADABLE, LONG, COMMA, MISSING, FINE, RANGE),
    /** A pupil diameter, mm. */
    PUPIL(UNREADABLE, LONG, COMMA, FINE, RANGE),
    /** An interpupillary distance, mm. */
    PUPIL_DISTANCE(UNREADABLE, LONG, COMMA, FINE, RANGE),
    /** The height of a segment line or a pupil centre over the lowest point of the lens, mm. */
    LENS_HEIGHT(UNREADABLE, LONG, COMMA, FINE, RANGE),
    /** The heights of a segment beside its offset: {@link Segment#problem}. */
    SEGMENT_HEIGHTS(RANGE, CONFLICT),
    /** Whole weeks until the next visit. */
    WEEKS(UNREADABLE, LONG, RANGE),
    /** Stereoacuity: {@link Stereo#parse}. */
    STEREO(UNREADABLE, LONG, RANGE),
    /** The drops: {@link CycloplegicAgent#parse}. */
    AGENT(UNREADABLE, LONG),
    /** How many drops were given. */
    DROPS(UNREADABLE, LONG, RANGE),
    /** Minutes from the first drop to the refraction. */
    MINUTES(UNREADABLE, LONG, RANGE),
    /** The movements of each eye by itself: {@link Ductions#parse}. */
    DUCTIONS(UNREADABLE, LONG),
    /** With which eye the child looks: {@link FixationPreference#parse}. */
    FIXATION(UNREADABLE, LONG),
    /** The shape of a segment: {@link SegmentStyle#parse}. */
    SEGMENT_STYLE(UNREADABLE, LONG),
    /** Free text of one line. */
    LINE(LONG, CONTROL),
    /** Free text of several lines. */
    NOTE(LONG, CONTROL);

    /** Longer than any measure is written; it also bounds the work that a hostile text can cause. */
    static final int LONGEST = 60;

    /** All eight movements, with a little room: the one measure that is a list. */
    static final int LONGEST_LIST = 150;

    private static final char NO_BREAK_SPACE = '\u00a0';
    private static final char NARROW_NO_BREAK_SPACE = '\u202f';
    private static final Pattern DECIMAL_COMMA = Pattern.compile("\\d,\\d");

    /** Never changes: {@link Set#of}. */
    @SuppressWarnings("ImmutableEnumChecker")
    private final Set<Problem> problems;

    Notation(Problem... problems) {
        this.problems = Set.of(problems);
    }

    /** The middle part of the message keys: {@code lens}, {@code segment-style}. */
    String key() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    /** Everything that can be wrong with a text in this notation. */
    Set<Problem> problems() {
        return problems;
    }

    /**
     * The text of a measure without the white space around it; no-break spaces, which spreadsheets leave behind, are spaces.
     *
     * @throws NotationException {@code long} over {@value #LONGEST} characters, a list over {@value #LONGEST_LIST}; {@code comma} for a decimal comma
     */
    String typed(String text) {
        String stripped = text.strip();
        if (stripped.length() > (this == DUCTIONS ? LONGEST_LIST : LONGEST)) {
            throw refused(LONG, text);
        }
        String typed = stripped.replace(NO_BREAK_SPACE, ' ')
                .replace(NARROW_NO_BREAK_SPACE, ' ')
                .strip();
        if (problems.contains(COMMA) && DECIMAL_COMMA.matcher(typed).find()) {
            throw refused(COMMA, text);
        }
        return typed;
    }

    /** True when there is nothing but white space: the measure was not taken. */
    static boolean isEmpty(String text) {
        return text.chars()
                .allMatch(c -> Character.isWhitespace(c) || c == NO_BREAK_SPACE || c == NARROW_NO_BREAK_SPACE);
    }

    /**
     * The refusal of a text, to be thrown.
     *
     * @throws IllegalStateException when the problem is not one of this notation's own
     */
    NotationException refused(Problem problem, String text, String... beside) {
        if (!problems.contains(problem)) {
            throw new IllegalStateException("declare the problem " + problem + " for the notation " + this);
        }
        return new NotationException(this, problem, text, beside);
    }
}
