package plusward.exam;

import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import plusward.optics.Axis;
import plusward.optics.Dioptres;
import plusward.optics.Lens;

/**
 * Reads a lens or a refraction as the trade writes it.
 *
 * <p>{@code +3.50}, {@code +3.50 DS}, {@code +3.50 -0.75 x 180}, {@code plano}, {@code pl -0.50 x 90},
 * {@code +3.00 +1.00 x 90}. Sphere −30 to +30 D, cylinder −15 to +15 D, both to 0.01 D and with their sign; axis 1 to 180,
 * 0 read as 180. Plus-cylinder form is kept as typed. {@link Lens#toString} writes what this reads.
 *
 * <p>{@code @} before the angle is refused: on a power cross it names the meridian that <em>has</em> the power, which is at
 * right angles to the axis.
 */
public final class LensNotation {

    /** A number is taken whole: {@code +10 x 90} must not become +1 with the cylinder 0. */
    private static final String POWER = "([+\\-−]?(?:\\d++(?:\\.\\d++)?+|\\.\\d++))";

    /** The unit may stand behind the power: DS, D, SPH. */
    private static final String SPHERE = "(?:(PLANO|PL)|" + POWER + ")\\s*(?:DS|D|SPH)?\\s*";
    /** Begins with a sign, a space or a slash, so that it cannot be the tail of the sphere. */
    private static final String CYLINDER = "/?\\s*(?:(?=[+\\-−])|(?<=[\\s/]))" + POWER + "\\s*(?:DC|D|CYL)?\\s*";

    private static final Pattern SPHERE_ONLY = Pattern.compile(SPHERE);
    private static final Pattern TORIC = Pattern.compile(SPHERE + CYLINDER + "(?:X|×|AXIS|AX)\\s*(\\d{1,3})(?:\\s*°)?");
    /** A sphere and a cylinder, and then no axis, or a number that is none. */
    private static final Pattern WITHOUT_AXIS = Pattern.compile(SPHERE + CYLINDER + "(?:X|×|AXIS|AX)?\\s*[\\d.+\\-]*");

    private static final Pattern FINER_THAN_A_HUNDREDTH = Pattern.compile(".*\\.\\d{3,}");
    /** Beyond these a slip of the hand is likelier (common practice, no source). */
    private static final Dioptres STRONGEST_SPHERE = Dioptres.of(30);

    private static final Dioptres STRONGEST_CYLINDER = Dioptres.of(15);

    private LensNotation() {}

    /**
     * The lens that the text describes, in the form in which it is written.
     *
     * @throws NotationException when the text is not a lens: {@code unreadable}, {@code long}, {@code comma}, {@code sign}
     *     (a power other than 0 without + or −), {@code fine} (finer than 0.01 D), {@code range}, {@code axis} (outside 0 to
     *     180, or missing)
     */
    public static Lens parse(String text) {
        String typed = Notation.LENS.typed(text).toUpperCase(Locale.ROOT);
        Matcher toric = TORIC.matcher(typed);
        if (toric.matches()) {
            Dioptres cylinder = power(toric.group(3), STRONGEST_CYLINDER, text);
            return new Lens(sphere(toric, text), cylinder, axis(toric.group(4), text));
        }
        Matcher sphere = SPHERE_ONLY.matcher(typed);
        if (sphere.matches()) {
            return Lens.sphere(sphere(sphere, text));
        }
        throw Notation.LENS.refused(WITHOUT_AXIS.matcher(typed).matches() ? Problem.AXIS : Problem.UNREADABLE, text);
    }

    /** The first power, 0 for plano. */
    private static Dioptres sphere(Matcher matcher, String text) {
        return matcher.group(1) == null ? power(matcher.group(2), STRONGEST_SPHERE, text) : Dioptres.ZERO;
    }

    /** A power within its limit; no sign is needed for 0. */
    private static Dioptres power(String number, Dioptres strongest, String text) {
        if (FINER_THAN_A_HUNDREDTH.matcher(number).matches()) {
            throw Notation.LENS.refused(Problem.FINE, text);
        }
        Dioptres power = Dioptres.of(MeasureNotation.toDouble(number));
        if (power.amount() != 0 && !MeasureNotation.hasSign(number)) {
            throw Notation.LENS.refused(Problem.SIGN, text);
        }
        if (power.size().isOver(strongest)) {
            throw Notation.LENS.refused(Problem.RANGE, text);
        }
        return power;
    }

    /** Whole degrees, 0 to 180. */
    private static Axis axis(String digits, String text) {
        int degrees = Integer.parseInt(digits);
        if (degrees > 180) {
            throw Notation.LENS.refused(Problem.AXIS, text);
        }
        return Axis.of(degrees);
    }
}
