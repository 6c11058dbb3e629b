package plusward.exam;

/**
 * Marks on a photograph from which nothing can be told safely, and why.
 *
 * <p>Holds no sentence of its own: {@link #reason} is a message key that starts with {@code marks.} or {@code notation.}.
 */
public final class RefusedMarks extends IllegalArgumentException {

    private final Reason reason;

    RefusedMarks(Reason reason) {
        super(reason.key());
        this.reason = reason;
    }

    /** What is wrong, with the numbers that show it. */
    public Reason reason() {
        return reason;
    }
}
