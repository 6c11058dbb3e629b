package plusward.exam;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalStateException;

import java.io.IOException;
import java.io.InputStreamReader;
import java.io.Reader;
import java.nio.charset.StandardCharsets;
import java.text.MessageFormat;
import java.util.Arrays;
import java.util.HashSet;
import java.util.Locale;
import java.util.Properties;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/**
 * Everything that can be wrong with a text has a sentence that says so, and everything that can be typed one that says how.
 *
 * <p>{@link Notation} lists the pairs, and nothing outside the list can be thrown.
 */
class NotationMessagesTests {

    private static final Properties NOTATION = bundle("notation");
    private static final Properties FIELDS = bundle("fields");

    @Test
    void everyProblemOfEveryNotationHasASentenceThatRepeatsWhatWasRead() {
        problemKeys().forEach(key -> {
            assertThat(NOTATION.getProperty(key)).as(key).isNotBlank();
            String sentence = sentence(NOTATION.getProperty(key), "‹typed›", "‹beside›");
            assertThat(sentence).as(key).endsWith(".").doesNotContain("{", "}", "'");
            // what is missing cannot be repeated
            assertThat(sentence.contains("‹typed›")).as(key).isEqualTo(!key.endsWith(".missing"));
        });
    }

    @Test
    void everyNotationSaysWhatToEnterWithAnExample() {
        acceptedKeys().forEach(key -> {
            assertThat(NOTATION.getProperty(key)).as(key).isNotBlank();
            assertThat(sentence(NOTATION.getProperty(key)))
                    .as(key)
                    .startsWith("Enter ")
                    .endsWith(".")
                    .doesNotContain("{", "'");
        });
    }

    @Test
    void noMessageIsLeftOver() {
        Set<String> used = Stream.concat(problemKeys(), acceptedKeys()).collect(Collectors.toSet());
        assertThat(NOTATION.stringPropertyNames()).isEqualTo(used);
    }

    @Test
    void everyFieldHasAShortLabelOfItsOwn() {
        Set<String> keys = Arrays.stream(Field.values())
                .map(field -> "field." + field.column())
                .collect(Collectors.toSet());
        assertThat(FIELDS.stringPropertyNames()).isEqualTo(keys);
        assertThat(FIELDS.values())
                .allSatisfy(label -> assertThat(label.toString())
                        .isNotBlank()
                        .hasSizeLessThan(40)
                        .doesNotContain("'", "{"));
        assertThat(new HashSet<>(FIELDS.values())).hasSameSizeAs(keys);
    }

    @Test
    void aProblemThatANotationDoesNotDeclareCannotBeThrown() {
        assertThatIllegalStateException().isThrownBy(() -> Notation.WEEKS.refused(Problem.PRIME, "ET' 6"));
    }

    @Test
    void theRefusalNamesTheKeysOfItsMessages() {
        NotationException refusal = Notation.SEGMENT_STYLE.refused(Problem.UNREADABLE, "flat");
        assertThat(refusal.reason()).isEqualTo(Reason.of("notation.segment-style.unreadable", "flat"));
        assertThat(refusal.accepted()).isEqualTo(Reason.of("notation.segment-style.accepted"));
    }

    @Test
    void whatWasReadIsShortenedWithoutCuttingACharacterInTwo() {
        assertThat(read("a".repeat(80))).isEqualTo("a".repeat(80));
        assertThat(read("a".repeat(81))).isEqualTo("a".repeat(80) + "…");
        assertThat(read("a".repeat(79) + "😀")).isEqualTo("a".repeat(79) + "…");
        assertThat(read("a".repeat(78) + "😀b")).isEqualTo("a".repeat(78) + "😀…");
    }

    private static String read(String text) {
        return Notation.NOTE.refused(Problem.LONG, text).read();
    }

    private static Stream<String> problemKeys() {
        return Arrays.stream(Notation.values())
                .flatMap(notation -> notation.problems().stream()
                        .map(problem -> "notation." + notation.key() + "." + problem.key()));
    }

    private static Stream<String> acceptedKeys() {
        return Arrays.stream(Notation.values()).map(notation -> "notation." + notation.key() + ".accepted");
    }

    private static String sentence(String pattern, Object... values) {
        return new MessageFormat(pattern, Locale.ENGLISH).format(values);
    }

    private static Properties bundle(String name) {
        try (Reader file = new InputStreamReader(
                NotationMessagesTests.class.getResourceAsStream("/messages/" + name + ".properties"),
                StandardCharsets.UTF_8)) {
            Properties bundle = new Properties();
            bundle.load(file);
            return bundle;
        } catch (IOException broken) {
            throw new IllegalStateException(broken);
        }
    }
}
