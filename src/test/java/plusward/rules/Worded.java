package plusward.rules;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.text.MessageFormat;
import java.util.Locale;
import java.util.Properties;
import java.util.Set;
import org.assertj.core.api.Assertions;
import plusward.exam.Reason;
import plusward.optics.Quantity;

/** Words a reason in English from the bundles of the core; a key without a message, or a gap without a value, fails. */
final class Worded {

    private static final Properties MESSAGES = load("findings", "course");

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

    /** The keys of the findings' own messages. */
    static Set<String> findings() {
        return load("findings").stringPropertyNames();
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

    private static Properties load(String... bundles) {
        Properties messages = new Properties();
        for (String bundle : bundles) {
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
