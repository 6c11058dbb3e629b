package plusward.handout;

import java.util.List;
import java.util.Locale;
import java.util.regex.Pattern;

/**
 * The school grade that a text takes, by Flesch and Kincaid: 0.39 × words/sentences + 11.8 × syllables/words − 15.59.
 *
 * <p>Every paragraph ends a sentence. "The Australian platypus is seemingly a hybrid of a mammal and reptilian creature" is
 * 11.3, as published.
 */
record ReadingGrade(double value) {

    /** The highest grade at which the sheet is plain enough. */
    static final double WANTED = 6.0;

    private static final Pattern SENTENCE_END = Pattern.compile("[.!?]+(?=\\s|$)");
    private static final Pattern WORD = Pattern.compile("[\\p{L}\\p{N}]+(?:[’'.,-][\\p{L}\\p{N}]+)*");

    static ReadingGrade of(Sheet sheet) {
        return of(sheet.prose());
    }

    static ReadingGrade of(List<String> paragraphs) {
        List<String> sentences = paragraphs.stream()
                .flatMap(SENTENCE_END::splitAsStream)
                .filter(sentence -> WORD.matcher(sentence).find())
                .toList();
        List<String> words = sentences.stream()
                .flatMap(sentence -> WORD.matcher(sentence).results().map(found -> found.group()))
                .toList();
        double syllables = words.stream().mapToInt(EnglishSyllables::in).sum();
        double perSentence = (double) words.size() / sentences.size();
        return new ReadingGrade(0.39 * perSentence + 11.8 * syllables / words.size() - 15.59);
    }

    public boolean isPlain() {
        return value <= WANTED;
    }

    /** With one decimal: {@code 4.1}. */
    @Override
    public String toString() {
        return String.format(Locale.ROOT, "%.1f", value);
    }
}
