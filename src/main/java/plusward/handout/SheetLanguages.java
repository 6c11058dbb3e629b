package plusward.handout;

/** The languages in which there is a message file for the sheet. English is the file without a language in its name. */
final class SheetLanguages {

    static final String ENGLISH = "en";

    private SheetLanguages() {}

    static boolean isWritten(String language) {
        return language.equals(ENGLISH)
                || (language.matches("[a-z]{2}")
                        && SheetLanguages.class.getResource("/messages/handout_" + language + ".properties") != null);
    }

    /** The language asked for; where none was asked for the child's own, or English while that is not written. */
    static String chosen(String asked, String childs) {
        if (!asked.isBlank()) {
            return asked;
        }
        return isWritten(childs) ? childs : ENGLISH;
    }
}
