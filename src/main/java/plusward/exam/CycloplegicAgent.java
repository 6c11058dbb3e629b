package plusward.exam;

import java.util.Arrays;
import java.util.Locale;

/**
 * The drops that put focusing to rest before a cycloplegic refraction, by generic name.
 *
 * <p>How deeply each does so is not modelled; the agent is recorded so that a doctor can weigh the refraction.
 */
public enum CycloplegicAgent {
    CYCLOPENTOLATE("cyclopentolate"),
    ATROPINE("atropine"),
    TROPICAMIDE("tropicamide"),
    OTHER("other");

    private final String written;

    CycloplegicAgent(String written) {
        this.written = written;
    }

    /**
     * Reads the word as it is written in a table of visits, in any case.
     *
     * @throws NotationException {@code unreadable} when it is none of them
     */
    public static CycloplegicAgent parse(String text) {
        String typed = Notation.AGENT.typed(text).toLowerCase(Locale.ROOT);
        return Arrays.stream(values())
                .filter(each -> each.written.equals(typed))
                .findFirst()
                .orElseThrow(() -> Notation.AGENT.refused(Problem.UNREADABLE, text));
    }

    /** The word that {@link #parse} reads: {@code cyclopentolate}. */
    @Override
    public String toString() {
        return written;
    }
}
