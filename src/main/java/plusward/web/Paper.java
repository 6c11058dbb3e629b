package plusward.web;

import java.util.Locale;

/** The paper a sheet is printed on. */
public enum Paper {
    A4,
    LETTER;

    /** Reads {@code letter} in any case; everything else is A4. */
    public static Paper named(String name) {
        return LETTER.code().equals(name.strip().toLowerCase(Locale.ROOT)) ? LETTER : A4;
    }

    /** The paper as addresses and stylesheets write it: {@code letter}. */
    public String code() {
        return name().toLowerCase(Locale.ROOT);
    }
}
