package plusward.rules;

/**
 * Where a rule or a value comes from, by its number in the list of sources. The citation is a name and needs no translation.
 *
 * <p>A test holds that every {@link #id()} has its entry in {@code docs/sources.md}.
 */
public enum Source {
    PEDIG_2009("pedig-2009", "Pediatric Eye Disease Investigator Group, Arch Ophthalmol 2009;127:59"),
    ANSI_Z80_1("ansi-z80-1", "ANSI Z80.1"),
    COMMON_PRACTICE("common-practice", "Common practice, no source");

    private final String id;
    private final String citation;

    Source(String id, String citation) {
        this.id = id;
        this.citation = citation;
    }

    public String id() {
        return id;
    }

    public String citation() {
        return citation;
    }
}
