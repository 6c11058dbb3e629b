package plusward.rules;

/**
 * Where a rule or a value comes from, by its number in the list of sources. The citation is a name and needs no translation.
 *
 * <p>A test holds that every {@link #id()} has its entry in {@code docs/sources.md}.
 */
public enum Source {
    PEDIG_2009("pedig-2009", "Pediatric Eye Disease Investigator Group, Arch Ophthalmol 2009;127:59"),
    ANSI_Z80_1("ansi-z80-1", "ANSI Z80.1, summaries of 2010 and 2015"),
    JAAPOS_2014("jaapos-2014", "J AAPOS 2014;18:261"),
    LUDWIG_1988("ludwig-1988", "Ludwig et al. 1988"),
    HOYT_GOOD_1995("hoyt-good-1995", "Hoyt and Good 1995"),
    AAO_PPP_2022("aao-ppp-2022", "AAO Esotropia and Exotropia Preferred Practice Pattern 2022"),
    ACUITY_REFERRAL("cms-acuity", "Referral criteria for acuity by age; the criterion from 60 months is from memory"),
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
