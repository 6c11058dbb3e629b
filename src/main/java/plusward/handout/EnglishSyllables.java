package plusward.handout;

import java.util.Locale;
import java.util.regex.Pattern;

/**
 * Counts the syllables of an English word by its spelling: groups of vowels, less those that are not spoken, plus those that
 * stand together and are spoken apart.
 *
 * <p>Off by one in some words; over a text the errors even out. Each digit counts as one.
 */
final class EnglishSyllables {

    private static final Pattern VOWELS = Pattern.compile("[aeiouy]+");

    /** The e of "like" and "safely", of "gives" and of "turned"; not that of "table", "glasses" and "needed". */
    private static final Pattern SILENT =
            Pattern.compile("(?<![aeiouy])(?<![^aeiouy]l)e(?=$|ly$|ful$|less$|ment$|times$|thing$|where$)"
                    + "|(?<![aeiouysxzcg])(?<![cs]h)(?<![^aeiouy]l)e(?=s$)"
                    + "|(?<![aeiouytd])e(?=d$)");

    /** "doing", "trying"; "radio", "diet", "idea", "area", "react". */
    private static final Pattern APART = Pattern.compile("[aeouy]ing|[dv]io|iet|(?:id|ar)ea$|^rea(?=ct|l)");

    private static final Pattern DIGIT = Pattern.compile("\\p{N}");

    private EnglishSyllables() {}

    /** At least 1. */
    static int in(String word) {
        String lower = word.toLowerCase(Locale.ENGLISH);
        String letters = lower.replaceAll("[’']s?$", "");
        int spoken = count(VOWELS, letters) - count(SILENT, letters) + count(APART, letters) + count(DIGIT, letters);
        return Math.max(1, spoken);
    }

    private static int count(Pattern pattern, String text) {
        return (int) pattern.matcher(text).results().count();
    }
}
