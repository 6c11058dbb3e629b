package plusward.exam;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.util.regex.Pattern;
import plusward.optics.Dioptres;
import plusward.optics.Millimetres;

/** Reads the plain numbers, dates and texts of a visit. Every method refuses with {@link NotationException}. */
final class MeasureNotation {

    private static final Pattern NUMBER = Pattern.compile("[+\\-−]?(?:\\d{1,4}(?:\\.\\d{1,2})?|\\.\\d{1,2})");
    private static final int LONGEST_LINE = 80;
    private static final int LONGEST_NOTE = 4000;

    private MeasureNotation() {}

    static LocalDate requiredDate(String text) {
        if (text.isBlank()) {
            throw new NotationException("date", "missing", text);
        }
        return date(text);
    }

    /** An ISO date between 1900 and 2200, such as 2026-03-14. */
    static LocalDate date(String text) {
        try {
            LocalDate date = LocalDate.parse(text.strip());
            if (date.getYear() >= 1900 && date.getYear() < 2200) {
                return date;
            }
        } catch (DateTimeException notADate) {
            throw new NotationException("date", "unreadable", text);
        }
        throw new NotationException("date", "range", text);
    }

    /** A near add or a trial plus: 0 to 4 D; a sign is not needed, a minus is refused. */
    static Dioptres add(String text) {
        return Dioptres.of(number("add", text, 0, 4));
    }

    static HoursPerDay hours(String text) {
        return HoursPerDay.of(number("hours", text, 0, 24));
    }

    /** A segment top relative to the pupil centre: −20 to +20 mm, so the sign matters and must be typed unless 0. */
    static Millimetres height(String text) {
        double height = number("segment", text, -20, 20);
        if (height != 0 && Character.isDigit(text.strip().charAt(0))) {
            throw new NotationException("segment", "sign", text);
        }
        return Millimetres.of(height);
    }

    /** A pupil diameter: 1 to 10 mm. */
    static Millimetres pupil(String text) {
        return Millimetres.of(number("pupil", text, 1, 10));
    }

    /** An interpupillary distance: 30 to 80 mm. */
    static Millimetres pupilDistance(String text) {
        return Millimetres.of(number("pupil-distance", text, 30, 80));
    }

    /** Whole weeks, 0 to 260. */
    static Integer weeks(String text) {
        String typed = text.strip();
        if (!typed.matches("\\d{1,3}") || Integer.parseInt(typed) > 260) {
            throw new NotationException("weeks", "unreadable", text);
        }
        return Integer.valueOf(typed);
    }

    static String line(String text) {
        return plainText("line", text, LONGEST_LINE);
    }

    static String note(String text) {
        return plainText("note", text.replace("\r\n", "\n"), LONGEST_NOTE);
    }

    private static String plainText(String notation, String text, int longest) {
        String typed = text.strip();
        if (typed.length() > longest) {
            throw new NotationException(notation, "long", typed.substring(0, longest));
        }
        if (typed.chars().anyMatch(c -> Character.isISOControl(c) && !(c == '\n' && longest == LONGEST_NOTE))) {
            throw new NotationException(notation, "control", typed);
        }
        return typed;
    }

    private static double number(String notation, String text, double least, double most) {
        String typed = text.strip();
        if (!NUMBER.matcher(typed).matches()) {
            throw new NotationException(notation, "unreadable", text);
        }
        double number = Double.parseDouble(typed.replace('−', '-'));
        if (number < least || number > most) {
            throw new NotationException(notation, "range", text);
        }
        return number;
    }
}
