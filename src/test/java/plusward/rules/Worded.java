package plusward.rules;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.text.MessageFormat;
import java.util.List;
import java.util.Locale;
import java.util.Properties;
import org.assertj.core.api.Assertions;
import plusward.exam.Reason;
import plusward.optics.Quantity;

/** Words a reason in English from the bundles of the core; a key without a message, or a gap without a value, fails. */
final class Worded {

    private static final Properties MESSAGES = load();

    private Worded() {}

    static String of(Reason reason) {
        String pattern = message(reason.key());
        String sentence = new MessageFormat(pattern, Locale.ENGLISH)
                .format(reason.values().stream().map(Worded::value).toArray());
        Assertions.assertThat(sentence).as(reason.key()).doesNotContain("{", "null");
        return sentence;
    }

    static String message(String key) {
        String pattern = MESSAGES.getProperty(key);
        Assertions.assertThat(pattern).as("a message for %s", key).isNotNull();
        return pattern;
    }

    static boolean has(String key) {
        return MESSAGES.containsKey(key);
    }

    private static Object value(Object value) {
        if (value instanceof Reason nested) {
            return of(nested);
        }
        if (value instanceof Quantity<?> quantity) {
            return quantity + " " + quantity.unit();
        }
        return value instanceof Number ? value : value.toString();
    }

    private static Properties load() {
        Properties messages = new Properties();
        for (String bundle : List.of("findings", "course")) {
            try (var reader =
                    Files.newBufferedReader(Path.of("src/main/resources/messages/" + bundle + ".properties"))) {
                messages.load(reader);
            } catch (IOException unreadable) {
                throw new UncheckedIOException(unreadable);
            }
        }
        return messages;
    }
}
