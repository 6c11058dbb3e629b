package plusward.course;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.text.MessageFormat;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Properties;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.MatchResult;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;

class CourseMessagesTests {

    private static final Path SOURCES = Path.of("src/main/java/plusward/course");
    /** A whole key between quotation marks. */
    private static final java.util.regex.Pattern KEY =
            java.util.regex.Pattern.compile("\"((?:aca|control|model|pattern|prediction)\\.[a-z.-]*[a-z])\"");

    private static final Properties MESSAGES = messages();

    @Test
    void every_key_of_the_package_has_a_message_and_every_message_a_key() throws IOException {
        assertThat(MESSAGES.stringPropertyNames()).containsExactlyInAnyOrderElementsOf(keys());
    }

    @ParameterizedTest
    @MethodSource("stories")
    void every_reason_of_a_course_is_worded_with_all_its_values(Story story) {
        assertThat(reasons(story)).isNotEmpty().allSatisfy(reason -> {
            String sentence = worded(reason);
            assertThat(sentence).doesNotContain("{", "'", "null");
            reason.values()
                    .forEach(value -> assertThat(sentence)
                            .as(reason.key())
                            .contains(value instanceof Reason nested ? worded(nested) : value.toString()));
        });
    }

    @Test
    void a_sentence_reads_as_it_is_meant() {
        Visit visit = CourseText.visit("worn_right=+3.00", "turn_cc_distance=E(T) 14", "turn_cc_near=E 4");
        assertThat(Control.at(visit, Limits.DEFAULT).because().stream().map(CourseMessagesTests::worded))
                .containsExactly(
                        "E(T) 14 at distance, with glasses: over the limit of 10.",
                        "E 4 at near, with glasses: held, the limit is 10.");
    }

    static List<Story> stories() {
        return Story.all();
    }

    private static List<Reason> reasons(Story story) {
        return story.course().visits().stream()
                .flatMap(visit -> Stream.of(
                                Control.at(visit, story.limits()).because(),
                                Pattern.at(visit, story.limits()).because(),
                                VisitModel.at(visit).notes(),
                                GradientAca.at(visit).stream()
                                        .map(AcaEstimate::from)
                                        .toList(),
                                HeterophoriaAca.at(visit).stream()
                                        .map(AcaEstimate::from)
                                        .toList())
                        .flatMap(List::stream))
                .toList();
    }

    private static String worded(Reason reason) {
        Object[] values = reason.values().stream()
                .map(value -> value instanceof Reason nested ? worded(nested) : value.toString())
                .toArray();
        return new MessageFormat(MESSAGES.getProperty(reason.key()), Locale.ENGLISH).format(values);
    }

    /** Every key that stands whole in the sources, and every name of a condition, a state and a pattern. */
    private static Set<String> keys() throws IOException {
        Set<String> keys = new TreeSet<>();
        try (Stream<Path> files = Files.list(SOURCES)) {
            for (Path file : files.toList()) {
                keys.addAll(KEY.matcher(Files.readString(file))
                        .results()
                        .map(MatchResult::group)
                        .map(quoted -> quoted.replace("\"", ""))
                        .collect(Collectors.toSet()));
            }
        }
        Arrays.stream(TurnCondition.values()).map(Control::key).forEach(keys::add);
        Arrays.stream(ControlState.values())
                .map(state -> "control.state." + state.code())
                .forEach(keys::add);
        Arrays.stream(PatternKind.values())
                .map(kind -> "pattern.kind." + kind.code())
                .forEach(keys::add);
        return keys;
    }

    private static Properties messages() {
        Properties messages = new Properties();
        try (var reader = Files.newBufferedReader(
                Path.of("src/main/resources/messages/course.properties"), StandardCharsets.UTF_8)) {
            messages.load(reader);
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
        return messages;
    }
}
