package plusward.exam;

/**
 * Text that is not in the notation asked for.
 *
 * <p>Carries what was read, what is wrong with it and which notation was expected, so that the screen can say both what
 * happened and what would be accepted, with an example. Holds no sentence of its own.
 */
public final class NotationException extends IllegalArgumentException {

    private final String notation;
    private final String problem;
    private final String read;

    /**
     * A refusal of one text.
     *
     * @param notation the notation that was expected: {@code lens}, {@code turn}, {@code acuity} …
     * @param problem what is wrong, as the last part of a message key: {@code unreadable}, {@code sign}, {@code range} …
     * @param read the text as it was typed
     */
    NotationException(String notation, String problem, String read) {
        super(notation + "." + problem);
        this.notation = notation;
        this.problem = problem;
        this.read = read;
    }

    /** The text as it was typed. */
    public String read() {
        return read;
    }

    /** What is wrong, as a message with the text read as its first value. */
    public Reason reason() {
        return Reason.of("notation." + notation + "." + problem, read);
    }

    /** What would be accepted, with an example. */
    public Reason accepted() {
        return Reason.of("notation." + notation + ".accepted");
    }
}
