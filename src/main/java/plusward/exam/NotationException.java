package plusward.exam;

import java.util.Arrays;
import java.util.stream.Stream;

/**
 * Text that is not in the notation asked for.
 *
 * <p>Carries what was read, what is wrong with it and which notation was expected, so that the screen can say both what
 * happened and what would be accepted, with an example. Holds no sentence of its own.
 */
public final class NotationException extends IllegalArgumentException {

    /** A megabyte in a cell is refused, not repeated. */
    private static final int LONGEST_SHOWN = 80;

    private final String notation;
    private final String read;
    private final String[] beside;

    /**
     * A refusal of one text; made by {@link Notation#refused}.
     *
     * @param notation the notation that was expected
     * @param problem what is wrong
     * @param read the text as it was typed
     * @param beside what else the sentence needs, such as the other entry of two that disagree
     */
    NotationException(Notation notation, Problem problem, String read, String... beside) {
        super(notation.key() + "." + problem.key());
        this.notation = notation.key();
        this.read = shortened(read);
        this.beside = beside.clone();
    }

    /** The text as it was typed; over 80 characters, its beginning and {@code …}. */
    public String read() {
        return read;
    }

    /** What is wrong, as a message with the text read as its first value: {@code notation.lens.sign}. */
    public Reason reason() {
        return new Reason(
                "notation." + getMessage(),
                Stream.concat(Stream.<Object>of(read), Arrays.stream(beside)).toList());
    }

    /** What would be accepted, with an example: {@code notation.lens.accepted}. */
    public Reason accepted() {
        return Reason.of("notation." + notation + ".accepted");
    }

    private static String shortened(String text) {
        if (text.length() <= LONGEST_SHOWN) {
            return text;
        }
        boolean splitsAPair = Character.isHighSurrogate(text.charAt(LONGEST_SHOWN - 1));
        return text.substring(0, splitsAPair ? LONGEST_SHOWN - 1 : LONGEST_SHOWN) + "…";
    }
}
