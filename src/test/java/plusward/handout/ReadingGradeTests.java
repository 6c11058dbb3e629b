package plusward.handout;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ReadingGradeTests {

    /** The published example of the Flesch-Kincaid grade: 11.3 (13 words, 24 syllables, one sentence). */
    @Test
    void thePublishedSentenceHasItsPublishedGrade() {
        ReadingGrade grade = ReadingGrade.of(
                List.of("The Australian platypus is seemingly a hybrid of a mammal and reptilian creature."));
        assertThat(grade.value()).isCloseTo(11.3, within(0.05));
    }

    @Test
    void shortWordsInShortSentencesAreEasy() {
        // 6 words, 6 syllables, 2 sentences: 0.39 × 3 + 11.8 × 1 − 15.59 = −2.62
        assertThat(ReadingGrade.of(List.of("The cat sat. The dog ran.")).value())
                .isCloseTo(-2.62, within(0.005));
    }

    @Test
    void sixIsPlainAndMoreIsNot() {
        assertThat(new ReadingGrade(6.0).isPlain()).isTrue();
        assertThat(new ReadingGrade(6.01).isPlain()).isFalse();
    }

    @ParameterizedTest
    @CsvSource({
        "glasses, 2",
        "eye, 1",
        "focus, 2",
        "pupil, 2",
        "area, 3",
        "little, 2",
        "looked, 1",
        "needed, 2",
        "chair, 1"
    })
    void syllablesAreCounted(String word, int syllables) {
        assertThat(EnglishSyllables.in(word)).isEqualTo(syllables);
    }
}
