package plusward.exam;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.util.regex.Pattern;
import plusward.optics.Dioptres;
import plusward.optics.Millimetres;

/**
 * Reads the plain numbers, dates and texts of a visit.
 *
 * <p>Numbers have a decimal point and at most two decimals; a unit is not written. The ranges are those outside which a slip
 * of the hand is likelier than the measure: common practice, no source. Every method refuses with {@link NotationException}.
 */
final class MeasureNotation {

    private static final Pattern NUMBER = Pattern.compile("[+\\-−]?(?:\\d+(?:\\.\\d+)?|\\.\\d+)");
    /** Three decimals or more: finer than any of these measures is read. */
    private static final Pattern FINER_THAN_A_HUNDREDTH = Pattern.compile(".*\\.\\d{3,}");

    private static final Pattern ISO_DATE = Pattern.compile("\\d{4}-\\d{2}-\\d{2}");
    /** Characters in a name or another text of one line. */
    private static final int LONGEST_LINE = 80;
    /** Characters in a note: about two pages. */
    private static final int LONGEST_NOTE = 4000;

    private MeasureNotation() {}

    /** The date of a visit, which cannot be absent: {@code missing} when blank, otherwise as {@link #date}. */
    static LocalDate requiredDate(String text) {
        if (Notation.isEmpty(text)) {
            throw Notation.DATE.refused(Problem.MISSING, text);
        }
        return date(text);
    }

    /** An ISO date from 1900-01-01 to 2199-12-31, such as 2026-03-14; {@code calendar} for a day such as 2026-02-30. */
    static LocalDate date(String text) {
        String typed = Notation.DATE.typed(text);
        if (!ISO_DATE.matcher(typed).matches()) {
            throw Notation.DATE.refused(Problem.UNREADABLE, text);
        }
        LocalDate date = onCalendar(typed, text);
        if (date.getYear() < 1900 || date.getYear() >= 2200) {
            throw Notation.DATE.refused(Problem.RANGE, text);
        }
        return date;
    }

    /** The day, or {@code calendar} when there is none of that number. */
    private static LocalDate onCalendar(String typed, String text) {
        try {
            return LocalDate.parse(typed);
        } catch (DateTimeException noSuchDay) {
            throw Notation.DATE.refused(Problem.CALENDAR, text);
        }
    }

    /** A near add or a trial plus: 0 to 4 D; a sign is not needed, a minus is refused as out of {@code range}. */
    static Dioptres add(String text) {
        return Dioptres.of(number(Notation.ADD, text, 0, 4));
    }

    /** Hours of wear on an ordinary day: 0 to 24. */
    static HoursPerDay hours(String text) {
        return HoursPerDay.of(number(Notation.HOURS, text, 0, 24));
    }

    /**
     * A segment top relative to the pupil centre: −20 to +20 mm, above positive. A number without a sign is above, since
     * spreadsheets drop the plus; a minus that was forgotten shows as a segment above the pupil centre.
     */
    static Millimetres height(String text) {
        return Millimetres.of(number(Notation.SEGMENT, text, -Segment.FARTHEST, Segment.FARTHEST));
    }

    /** A segment line or a pupil centre over the lowest point of the lens: 0 to 60 mm. */
    static Millimetres lensHeight(String text) {
        return Millimetres.of(number(Notation.LENS_HEIGHT, text, 0, SegmentHeights.TALLEST));
    }

    /** A pupil diameter: 1 to 10 mm. */
    static Millimetres pupil(String text) {
        return Millimetres.of(number(Notation.PUPIL, text, Segment.SMALLEST_PUPIL, Segment.LARGEST_PUPIL));
    }

    /** The true length of a segment's top line: 5 to 80 mm; {@code missing} when blank. */
    static Millimetres lineWidth(String text) {
        if (Notation.isEmpty(text)) {
            throw Notation.LINE_WIDTH.refused(Problem.MISSING, text);
        }
        return Millimetres.of(number(Notation.LINE_WIDTH, text, 5, 80));
    }

    /** An interpupillary distance: 30 to 80 mm. */
    static Millimetres pupilDistance(String text) {
        return Millimetres.of(number(Notation.PUPIL_DISTANCE, text, 30, 80));
    }

    /** Whole weeks until the next visit, 0 to 260 (five years). */
    static Integer weeks(String text) {
        return wholeNumber(Notation.WEEKS, text, 0, 260);
    }

    /** Drops given in each eye: 1 to 10. */
    static Integer drops(String text) {
        return wholeNumber(Notation.DROPS, text, 1, Cycloplegic.MOST_DROPS);
    }

    /** Whole minutes waited for the drops: 1 to 1440 (a day). */
    static Integer minutes(String text) {
        return wholeNumber(Notation.MINUTES, text, 1, Cycloplegic.LONGEST_WAIT);
    }

    /** A text of one line, up to 80 characters, without control characters. */
    static String line(String text) {
        return plainText(Notation.LINE, text.strip(), LONGEST_LINE);
    }

    /** A text of several lines, up to 4000 characters; lines end as the writer's system ends them and are kept with \n. */
    static String note(String text) {
        return plainText(Notation.NOTE, text.strip().replace("\r\n", "\n").replace('\r', '\n'), LONGEST_NOTE);
    }

    /** Text without what cannot be stored or shown; {@code long} and {@code control} otherwise. */
    private static String plainText(Notation notation, String typed, int longest) {
        if (typed.length() > longest) {
            throw notation.refused(Problem.LONG, typed);
        }
        if (typed.codePoints().anyMatch(c -> isForeign(c) && !(notation == Notation.NOTE && isLayout(c)))) {
            throw notation.refused(Problem.CONTROL, typed);
        }
        return typed;
    }

    /** A control character, or half of a surrogate pair. */
    private static boolean isForeign(int character) {
        return Character.isISOControl(character) || Character.getType(character) == Character.SURROGATE;
    }

    /** What a note may hold besides letters. */
    private static boolean isLayout(int character) {
        return character == '\n' || character == '\t';
    }

    /** A whole number without a sign, between two limits that both belong to it. */
    static int wholeNumber(Notation notation, String text, int least, int most) {
        String typed = notation.typed(text);
        if (!typed.matches("\\d+")) {
            throw notation.refused(Problem.UNREADABLE, text);
        }
        double number = Double.parseDouble(typed);
        if (number < least || number > most) {
            throw notation.refused(Problem.RANGE, text);
        }
        return (int) number;
    }

    /** A number to 0.01 between two limits that both belong to it. */
    private static double number(Notation notation, String text, double least, double most) {
        String typed = notation.typed(text);
        if (!NUMBER.matcher(typed).matches()) {
            throw notation.refused(Problem.UNREADABLE, text);
        }
        if (FINER_THAN_A_HUNDREDTH.matcher(typed).matches()) {
            throw notation.refused(Problem.FINE, text);
        }
        double number = toDouble(typed);
        if (number < least || number > most) {
            throw notation.refused(Problem.RANGE, text);
        }
        return number;
    }

    /** The value of a number whose minus may be a hyphen or the minus sign U+2212. */
    static double toDouble(String number) {
        return Double.parseDouble(number.replace('−', '-'));
    }

    /** True when the number starts with + or −, either kind of minus. */
    static boolean hasSign(String number) {
        return "+-−".indexOf(number.charAt(0)) >= 0;
    }
}
