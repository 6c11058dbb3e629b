package plusward.exam;

/**
 * Whether a turn shows: manifest (a tropia, written T), intermittent (written (T)) or latent (a phoria, seen only when
 * one eye is covered; no T).
 */
public enum Phase {
    /** A tropia: the eyes are turned with both uncovered. */
    MANIFEST("T"),
    /** Turned some of the time. */
    INTERMITTENT("(T)"),
    /** A phoria: turned only while one eye is covered. */
    LATENT("");

    private final String mark;

    Phase(String mark) {
        this.mark = mark;
    }

    /** What is written behind the letter of the direction. */
    public String mark() {
        return mark;
    }

    /** True when the turn shows at least some of the time. */
    public boolean shows() {
        return this != LATENT;
    }
}
