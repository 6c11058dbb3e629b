package plusward.exam;

import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import plusward.exam.Acuity.Kind;
import plusward.optics.LogMar;

/** Reads the notation of visual acuity; see {@link Acuity#parse}. */
final class AcuityNotation {

    private static final Pattern SNELLEN =
            Pattern.compile("(\\d{1,2}(?:\\.\\d{1,2})?)\\s*/\\s*(\\d{1,4}(?:\\.\\d{1,2})?)\\s*(?:([+\\-−])\\s*(\\d))?");
    private static final Pattern LOGMAR = Pattern.compile("([+\\-−]?\\d(?:\\.\\d{1,2})?)\\s*LOGMAR");
    private static final Pattern DECIMAL = Pattern.compile("\\d?\\.\\d{1,3}|[12]");
    /** From 20/6 to counting fingers at about half a metre; outside this a slip is likelier (common practice, no source). */
    private static final LogMar BEST = LogMar.of(-0.5);

    private static final LogMar WORST = LogMar.of(2.0);

    private AcuityNotation() {}

    static Acuity parse(String text) {
        String written = text.strip();
        String upper = written.toUpperCase(Locale.ROOT);
        Matcher snellen = SNELLEN.matcher(upper);
        if (snellen.matches()) {
            return chart(written, snellen(snellen, text), text);
        }
        Matcher logMar = LOGMAR.matcher(upper);
        if (logMar.matches()) {
            return chart(written, LogMar.of(number(logMar.group(1))), text);
        }
        return DECIMAL.matcher(upper).matches()
                ? chart(written, ofDecimal(number(upper), text), text)
                : words(upper, text);
    }

    private static LogMar snellen(Matcher matcher, String text) {
        double numerator = number(matcher.group(1));
        double denominator = number(matcher.group(2));
        if (numerator <= 0 || denominator <= 0) {
            throw refused("range", text);
        }
        LogMar line = LogMar.ofSnellen(numerator, denominator);
        if (matcher.group(4) == null) {
            return line;
        }
        LogMar letters = LogMar.ONE_LETTER.times(Integer.parseInt(matcher.group(4)));
        return matcher.group(3).equals("+") ? line.minus(letters) : line.plus(letters);
    }

    private static LogMar ofDecimal(double decimal, String text) {
        if (decimal <= 0) {
            throw refused("range", text);
        }
        return LogMar.ofSnellen(decimal, 1);
    }

    private static Acuity chart(String written, LogMar size, String text) {
        if (size.isUnder(BEST) || size.isOver(WORST)) {
            throw refused("range", text);
        }
        return new Acuity(Kind.CHART, written, size);
    }

    private static Acuity words(String upper, String text) {
        Kind kind = switch (upper) {
            case "CF" -> Kind.CF;
            case "HM" -> Kind.HM;
            case "LP" -> Kind.LP;
            case "NLP" -> Kind.NLP;
            case "FIXES AND FOLLOWS" -> Kind.FIXES_AND_FOLLOWS;
            default -> throw refused("unreadable", text);
        };
        return new Acuity(kind, kind == Kind.FIXES_AND_FOLLOWS ? "fixes and follows" : upper, null);
    }

    private static double number(String digits) {
        return Double.parseDouble(digits.replace('−', '-'));
    }

    private static NotationException refused(String problem, String text) {
        return new NotationException("acuity", problem, text);
    }
}
