package plusward.readback;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Properties;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import plusward.course.GazePattern;
import plusward.exam.Eye;
import plusward.exam.Phase;

/** Every sentence that reading back can say is worded, and no word is left over. */
class ReadBackMessagesTests {

    private static final Path MESSAGES = Path.of("src/main/resources/messages/readback.properties");

    /** A whole key between quotation marks, or in a template. */
    private static final Pattern KEY = Pattern.compile("(?:\"|#\\{)(readback(?:\\.[a-z-]*[a-z])+)(?=[\"(}])");

    @Test
    void everyKeyHasAMessageAndEveryMessageAKey() throws IOException {
        Set<String> used = new TreeSet<>(built().collect(Collectors.toSet()));
        used.addAll(keysIn(Path.of("src/main/java/plusward/readback")));
        used.addAll(keysIn(Path.of("src/main/resources/templates")));
        Properties messages = new Properties();
        try (var file = Files.newBufferedReader(MESSAGES)) {
            messages.load(file);
        }
        assertThat(new TreeSet<>(messages.stringPropertyNames())).isEqualTo(used);
        assertThat(messages.values()).noneMatch(message -> message.toString().isBlank());
    }

    private static Set<String> keysIn(Path folder) throws IOException {
        try (Stream<Path> files = Files.walk(folder)) {
            Set<String> keys = new TreeSet<>();
            for (Path file : files.filter(Files::isRegularFile).toList()) {
                KEY.matcher(Files.readString(file)).results().forEach(found -> keys.add(found.group(1)));
            }
            return keys;
        }
    }

    /** The keys that are put together, from all that they can be put together of. */
    private static Stream<String> built() {
        Stream<String> eyes = words(Eye.values())
                .flatMap(eye -> Stream.concat(
                        Stream.of("readback.turn." + eye + "-higher"),
                        Stream.of("even", "short", "over", "unknown").map(how -> "readback.plus." + eye + "." + how)));
        Stream<String> turns = Stream.concat(
                Stream.of("inward", "outward", "real-in", "real-out", "noise-in", "noise-out")
                        .map(way -> "readback.turn." + way),
                words(Phase.values()).map(phase -> "readback.turn.shows." + phase));
        Stream<String> acuities = Stream.of("same", "better", "worse").map(how -> "readback.acuity." + how);
        Stream<String> letters = Stream.concat(Stream.of("none"), words(GazePattern.Letter.values()))
                .map(letter -> "readback.gaze.up-down." + letter);
        return Stream.of(eyes, turns, acuities, letters).flatMap(each -> each);
    }

    private static Stream<String> words(Enum<?>... values) {
        return Stream.of(values).map(value -> value.name().toLowerCase(Locale.ROOT));
    }
}
