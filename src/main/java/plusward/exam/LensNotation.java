package plusward.exam;

import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import plusward.optics.Axis;
import plusward.optics.Dioptres;
import plusward.optics.Lens;

/**
 * Reads a lens or a refraction as the trade writes it.
 *
 * <p>{@code +3.50}, {@code +3.50 DS}, {@code +3.50 -0.75 x 180}, {@code plano}, {@code pl -0.50 x 90},
 * {@code +3.00 +1.00 x 90}. Sphere −30 to +30 D, cylinder −15 to +15 D, both to 0.01 D and with their sign; axis 1 to 180,
 * 0 read as 180. Plus-cylinder form is kept as typed. {@link Lens#toString} writes what this reads.
 */
public final class LensNotation {

    private static final String POWER = "([+\\-−]?\\d{1,3}(?:\\.\\d+)?|\\.\\d+|[+\\-−]\\.\\d+)";
    private static final Pattern LENS = Pattern.compile("(?:(PLANO|PL)|" + POWER + ")\\s*(?:D?S(?:PH)?|D)?"
            + "(?:\\s*(?:/\\s*)?" + POWER + "\\s*(?:D?C(?:YL)?)?\\s*(?:X|×|@|AX(?:IS)?)\\s*(\\d{1,3})\\s*°?)?");
    private static final Dioptres STRONGEST_SPHERE = Dioptres.of(30);
    private static final Dioptres STRONGEST_CYLINDER = Dioptres.of(15);

    private LensNotation() {}

    /**
     * The lens that the text describes, in the form in which it is written.
     *
     * @throws NotationException when the text is not a lens: {@code unreadable}, {@code sign} (a power other than 0 without
     *     + or −), {@code fine} (finer than 0.01 D), {@code range}, {@code axis} (outside 0 to 180, or missing)
     */
    public static Lens parse(String text) {
        Matcher matcher = LENS.matcher(text.strip().toUpperCase(Locale.ROOT));
        if (!matcher.matches()) {
            throw refused(looksLikeMissingAxis(text) ? "axis" : "unreadable", text);
        }
        Dioptres sphere = matcher.group(2) == null ? Dioptres.ZERO : power(matcher.group(2), STRONGEST_SPHERE, text);
        return matcher.group(3) == null
                ? Lens.sphere(sphere)
                : new Lens(sphere, power(matcher.group(3), STRONGEST_CYLINDER, text), axis(matcher.group(4), text));
    }

    private static Dioptres power(String number, Dioptres strongest, String text) {
        if (number.matches(".*\\.\\d{3,}")) {
            throw refused("fine", text);
        }
        Dioptres power = Dioptres.of(Double.parseDouble(number.replace('−', '-')));
        if (power.amount() != 0 && (Character.isDigit(number.charAt(0)) || number.charAt(0) == '.')) {
            throw refused("sign", text);
        }
        if (power.size().isOver(strongest)) {
            throw refused("range", text);
        }
        return power;
    }

    private static Axis axis(@Nullable String digits, String text) {
        try {
            return Axis.of(Integer.parseInt(String.valueOf(digits)));
        } catch (IllegalArgumentException outOfRange) {
            throw refused("axis", text);
        }
    }

    private static boolean looksLikeMissingAxis(String text) {
        return text.strip().matches("[+\\-−]?[\\d.]+\\s+[+\\-−][\\d.]+\\s*(?:[x×]\\s*)?");
    }

    private static NotationException refused(String problem, String text) {
        return new NotationException("lens", problem, text);
    }
}
