package plusward.exam;

import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import plusward.exam.Acuity.Kind;
import plusward.optics.LogMar;

/**
 * Reads the notation of visual acuity; see {@link Acuity#parse}.
 *
 * <p>A Snellen fraction may have up to nine letters more or fewer behind it: {@code 20/25-2} is two letters of the 20/25 line
 * missed, 0.04 logMAR worse than the line. A number without a fraction is a decimal acuity, so {@code 0.1} is 20/200; logMAR
 * is only read where the word stands behind the number.
 *
 * <p>Accepted from −0.5 to 2.0 logMAR.
 */
final class AcuityNotation {

    private static final String NUMBER = "(\\d+(?:\\.\\d+)?|\\.\\d+)";
    private static final Pattern SNELLEN =
            Pattern.compile(NUMBER + "\\s*/\\s*" + NUMBER + "(?:\\s*([+\\-−])\\s*(\\d))?");
    private static final Pattern LOGMAR = Pattern.compile("([+\\-−]?)" + NUMBER + "\\s*LOGMAR");
    private static final Pattern DECIMAL = Pattern.compile(NUMBER);
    /** From 20/6 to counting fingers at about half a metre; outside this a slip is likelier (common practice, no source). */
    private static final LogMar BEST = LogMar.of(-0.5);

    /** Counting fingers and less are written in words. */
    private static final LogMar WORST = LogMar.of(2.0);

    /** As it was typed, for the refusal. */
    private final String text;

    /** Without the white space around it: what is kept. */
    private final String typed;

    private AcuityNotation(String text) {
        this.text = text;
        this.typed = Notation.ACUITY.typed(text);
    }

    /** Tries the numbers first, then the words. */
    static Acuity parse(String text) {
        return new AcuityNotation(text).acuity();
    }

    private Acuity acuity() {
        String upper = typed.toUpperCase(Locale.ROOT);
        Matcher snellen = SNELLEN.matcher(upper);
        if (snellen.matches()) {
            return chart(snellen(snellen));
        }
        Matcher logMar = LOGMAR.matcher(upper);
        if (logMar.matches()) {
            return chart(LogMar.of(MeasureNotation.toDouble(logMar.group(1) + logMar.group(2))));
        }
        return DECIMAL.matcher(upper).matches() ? chart(fraction(Double.parseDouble(upper), 1)) : words(upper);
    }

    /** The line, and 0.02 for every letter more or fewer. */
    private LogMar snellen(Matcher matcher) {
        LogMar line = fraction(Double.parseDouble(matcher.group(1)), Double.parseDouble(matcher.group(2)));
        if (matcher.group(4) == null) {
            return line;
        }
        LogMar letters = LogMar.ONE_LETTER.times(Integer.parseInt(matcher.group(4)));
        return matcher.group(3).equals("+") ? line.minus(letters) : line.plus(letters);
    }

    /** A zero above or below the line is out of range: nothing is that small or that large. */
    private LogMar fraction(double numerator, double denominator) {
        if (numerator == 0 || denominator == 0) {
            throw Notation.ACUITY.refused(Problem.RANGE, text);
        }
        return LogMar.ofSnellen(numerator, denominator);
    }

    /** A reading on a chart; {@code range} when no chart reaches so far. */
    private Acuity chart(LogMar size) {
        if (size.isUnder(BEST) || size.isOver(WORST)) {
            throw Notation.ACUITY.refused(Problem.RANGE, text);
        }
        return new Acuity(Kind.CHART, typed, size);
    }

    /** Fingers, hand movements, light, or a child who fixes and follows. */
    private Acuity words(String upper) {
        return switch (upper) {
            case "CF" -> Acuity.of(Kind.CF);
            case "HM" -> Acuity.of(Kind.HM);
            case "LP" -> Acuity.of(Kind.LP);
            case "NLP" -> Acuity.of(Kind.NLP);
            case "FIXES AND FOLLOWS" -> Acuity.of(Kind.FIXES_AND_FOLLOWS);
            default -> throw Notation.ACUITY.refused(Problem.UNREADABLE, text);
        };
    }
}
