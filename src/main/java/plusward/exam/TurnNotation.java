package plusward.exam;

import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import plusward.exam.HorizontalTurn.Direction;
import plusward.optics.PrismDioptres;

/**
 * Reads the notation of a turn; see {@link Turn#parse}.
 *
 * <p>One or two parts, horizontal and vertical in either order, with white space or a comma between. A part is a direction
 * and a size in either order, in any case: {@code ET 25}, {@code ET25}, {@code 25 ET}, {@code 25Δ ET}, {@code 25 pd ET},
 * {@code ET 30+25}; or {@code ortho}. A prime behind the direction, or behind a size that follows it, marks a near reading.
 */
final class TurnNotation {

    /** A number is taken whole, so that its last digit is never read as another number. */
    private static final String NUMBER = "(\\d++(?:\\.\\d++)?+)";
    /** One prism, or one before each eye; Δ is the Greek capital or the increment sign. */
    private static final String SIZE = NUMBER + "(?:\\s*\\+\\s*" + NUMBER + ")?(?:\\s*(?:Δ|∆|PD))?";
    /** Direction, phase, and the prime of a near reading in any of the three characters that keyboards give for it. */
    private static final String NAME = "([EX]|[RL]H)(T|\\(T\\))?(['′’]?)";

    private static final Pattern NAME_FIRST = Pattern.compile(NAME + "\\s*" + SIZE + "(['′’]?)");
    private static final Pattern SIZE_FIRST = Pattern.compile(SIZE + "\\s*" + NAME);
    private static final Pattern NAME_ONLY = Pattern.compile(NAME);
    private static final Pattern SIZE_ONLY = Pattern.compile(SIZE);
    private static final Pattern ORTHO = Pattern.compile("ORTHO(['′’]?)");
    private static final Pattern FINER_THAN_A_TENTH = Pattern.compile(".*\\.\\d{2,}");

    /** As it was typed, for the refusal. */
    private final String text;

    /** The distance of the field. */
    private final Viewing viewing;

    private @Nullable HorizontalTurn horizontal;
    private @Nullable VerticalTurn vertical;

    private TurnNotation(String text, Viewing viewing) {
        this.text = text;
        this.viewing = viewing;
    }

    /** Reads part after part until nothing is left. */
    static Turn parse(String text, Viewing viewing) {
        TurnNotation notation = new TurnNotation(text, viewing);
        String rest = Notation.TURN.typed(text).toUpperCase(Locale.ROOT);
        while (!rest.isEmpty()) {
            rest = notation.readPart(rest).stripLeading();
        }
        return notation.turn();
    }

    /** What was read; an empty text states nothing and is no turn. */
    private Turn turn() {
        if (horizontal == null && vertical == null) {
            throw refused(Problem.UNREADABLE);
        }
        return new Turn(horizontal, vertical);
    }

    /** Reads one part from the front and gives back what follows it. */
    private String readPart(String rest) {
        Matcher ortho = ORTHO.matcher(rest);
        if (ortho.lookingAt()) {
            refusePrimeAtDistance(ortho.group(1));
            return take(HorizontalTurn.ORTHO, rest, ortho.end());
        }
        Matcher nameFirst = NAME_FIRST.matcher(rest);
        if (nameFirst.lookingAt()) {
            refusePrimeAtDistance(nameFirst.group(3) + nameFirst.group(6));
            return takeNamed(nameFirst, 1, size(nameFirst, 4), rest);
        }
        Matcher sizeFirst = SIZE_FIRST.matcher(rest);
        if (sizeFirst.lookingAt()) {
            refusePrimeAtDistance(sizeFirst.group(5));
            return takeNamed(sizeFirst, 3, size(sizeFirst, 1), rest);
        }
        throw refused(whatIsMissing(rest));
    }

    /** Says what is lacking when only a size, or only a direction, is there. */
    private static Problem whatIsMissing(String rest) {
        if (SIZE_ONLY.matcher(rest).matches()) {
            return Problem.DIRECTION;
        }
        return NAME_ONLY.matcher(rest).matches() ? Problem.SIZE : Problem.UNREADABLE;
    }

    /** Keeps a part whose direction stands in the group {@code name}, and gives back what follows it. */
    private String takeNamed(Matcher part, int name, PrismReading prism, String rest) {
        Phase phase = phase(part.group(name + 1));
        return switch (part.group(name)) {
            case "E" -> take(new HorizontalTurn(Direction.INWARD, phase, prism), rest, part.end());
            case "X" -> take(new HorizontalTurn(Direction.OUTWARD, phase, prism), rest, part.end());
            case "RH" -> take(new VerticalTurn(Eye.RIGHT, phase, prism), rest, part.end());
            default -> take(new VerticalTurn(Eye.LEFT, phase, prism), rest, part.end());
        };
    }

    /** No T is latent, T manifest, (T) intermittent. */
    private static Phase phase(@Nullable String mark) {
        if (mark == null) {
            return Phase.LATENT;
        }
        return mark.equals("T") ? Phase.MANIFEST : Phase.INTERMITTENT;
    }

    private String take(HorizontalTurn turn, String rest, int end) {
        if (horizontal != null) {
            throw refused(Problem.TWICE);
        }
        horizontal = turn;
        return after(rest, end);
    }

    private String take(VerticalTurn turn, String rest, int end) {
        if (vertical != null) {
            throw refused(Problem.TWICE);
        }
        vertical = turn;
        return after(rest, end);
    }

    /** What follows a part: nothing, or white space or a comma and the next part. */
    private String after(String rest, int end) {
        String following = rest.substring(end);
        if (following.isEmpty() || Character.isWhitespace(following.charAt(0))) {
            return following;
        }
        if (following.charAt(0) != ',' || following.length() == 1) {
            throw refused(Problem.UNREADABLE);
        }
        return following.substring(1);
    }

    /** The size in this group and, when prisms were split, in the next. */
    private PrismReading size(Matcher matcher, int group) {
        PrismDioptres one = prism(matcher.group(group));
        String second = matcher.group(group + 1);
        PrismDioptres other = second == null ? null : prism(second);
        try {
            return new PrismReading(one, other);
        } catch (IllegalArgumentException outOfRange) {
            throw refused(Problem.RANGE);
        }
    }

    /** Prism dioptres to 0.1; {@code fine} for more decimals. */
    private PrismDioptres prism(String number) {
        if (FINER_THAN_A_TENTH.matcher(number).matches()) {
            throw refused(Problem.FINE);
        }
        return PrismDioptres.of(Double.parseDouble(number));
    }

    /** A near reading in a field for distance is a reading in the wrong field. */
    private void refusePrimeAtDistance(String primes) {
        if (!primes.isEmpty() && viewing == Viewing.DISTANCE) {
            throw refused(Problem.PRIME);
        }
    }

    private NotationException refused(Problem problem) {
        return Notation.TURN.refused(problem, text);
    }
}
