package plusward.exam;

import java.util.Arrays;
import java.util.Locale;

/** The drops that put focusing to rest before a cycloplegic refraction, by generic name. */
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
     * @throws NotationException when it is none of them
     */
    public static CycloplegicAgent parse(String text) {
        String typed = text.strip().toLowerCase(Locale.ROOT);
        return Arrays.stream(values())
                .filter(each -> each.written.equals(typed))
                .findFirst()
                .orElseThrow(() -> new NotationException("agent", "unreadable", text));
    }

    @Override
    public String toString() {
        return written;
    }
}
