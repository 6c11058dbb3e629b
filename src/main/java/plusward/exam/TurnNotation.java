package plusward.exam;

import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import plusward.exam.HorizontalTurn.Direction;
import plusward.optics.PrismDioptres;

/** Reads the notation of a turn; see {@link Turn#parse}. */
final class TurnNotation {

    private static final String SIZE = "(\\d{1,3}(?:\\.\\d)?)(?:\\s*\\+\\s*(\\d{1,3}(?:\\.\\d)?))?\\s*(?:Δ|∆|PD)?";
    private static final String NAME = "([EX]|[RL]H)(T|\\(T\\))?(['′’]?)";
    private static final Pattern NAME_FIRST = Pattern.compile(NAME + "\\s*" + SIZE + "(['′’]?)");
    private static final Pattern SIZE_FIRST = Pattern.compile(SIZE + "\\s*" + NAME);
    private static final Pattern ORTHO = Pattern.compile("ORTHO(['′’]?)");

    private final String typed;
    private final Viewing viewing;
    private @Nullable HorizontalTurn horizontal;
    private @Nullable VerticalTurn vertical;

    private TurnNotation(String typed, Viewing viewing) {
        this.typed = typed;
        this.viewing = viewing;
    }

    static Turn parse(String text, Viewing viewing) {
        TurnNotation notation = new TurnNotation(text, viewing);
        String rest = text.strip().toUpperCase(Locale.ROOT);
        while (!rest.isEmpty()) {
            rest = notation.readPart(rest).stripLeading();
        }
        return notation.turn();
    }

    private Turn turn() {
        if (horizontal == null && vertical == null) {
            throw refused("unreadable");
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
            return takeNamed(nameFirst.group(1), nameFirst.group(2), size(nameFirst, 4), rest, nameFirst.end());
        }
        Matcher sizeFirst = SIZE_FIRST.matcher(rest);
        if (sizeFirst.lookingAt()) {
            refusePrimeAtDistance(sizeFirst.group(5));
            return takeNamed(sizeFirst.group(3), sizeFirst.group(4), size(sizeFirst, 1), rest, sizeFirst.end());
        }
        throw refused(rest.matches("[\\d.+\\s]+(?:Δ|∆|PD)?") ? "direction" : "unreadable");
    }

    private String takeNamed(String name, @Nullable String mark, PrismReading prism, String rest, int end) {
        Phase phase = mark == null ? Phase.LATENT : mark.equals("T") ? Phase.MANIFEST : Phase.INTERMITTENT;
        if (name.length() == 1) {
            Direction direction = name.equals("E") ? Direction.INWARD : Direction.OUTWARD;
            return take(new HorizontalTurn(direction, phase, prism), rest, end);
        }
        if (vertical != null) {
            throw refused("twice");
        }
        vertical = new VerticalTurn(name.equals("RH") ? Eye.RIGHT : Eye.LEFT, phase, prism);
        return after(rest, end);
    }

    private String take(HorizontalTurn turn, String rest, int end) {
        if (horizontal != null) {
            throw refused("twice");
        }
        horizontal = turn;
        return after(rest, end);
    }

    private String after(String rest, int end) {
        if (end < rest.length() && !Character.isWhitespace(rest.charAt(end)) && rest.charAt(end) != ',') {
            throw refused("unreadable");
        }
        return end < rest.length() && rest.charAt(end) == ',' ? rest.substring(end + 1) : rest.substring(end);
    }

    private PrismReading size(Matcher matcher, int group) {
        try {
            String other = matcher.group(group + 1);
            return new PrismReading(prism(matcher.group(group)), other == null ? null : prism(other));
        } catch (IllegalArgumentException outOfRange) {
            throw refused("range");
        }
    }

    private static PrismDioptres prism(String number) {
        return PrismDioptres.of(Double.parseDouble(number));
    }

    private void refusePrimeAtDistance(String primes) {
        if (!primes.isEmpty() && viewing == Viewing.DISTANCE) {
            throw refused("prime");
        }
    }

    private NotationException refused(String problem) {
        return new NotationException("turn", problem, typed);
    }
}
