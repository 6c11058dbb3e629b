package plusward.rules;

import java.util.Locale;

/** How much a finding asks of the reader: a decision, a look, or nothing but to know it. Heaviest first. */
public enum Weight {
    ACT,
    LOOK,
    NOTE;

    public String code() {
        return name().toLowerCase(Locale.ROOT);
    }
}
