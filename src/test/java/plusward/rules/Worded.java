package plusward.rules;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.text.MessageFormat;
import java.util.List;
import java.util.Locale;
import java.util.Properties;
import java.util.Set;
import java.util.stream.Stream;
import org.assertj.core.api.Assertions;
import plusward.exam.Reason;
import plusward.optics.Quantity;

/** Words a reason in English from the bundles of the core; a key without a message, or a gap without a value, fails. */
final class Worded {

    private static final Path BUNDLES = Path.of("src/main/resources/messages");
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

    /** The keys of one bundle. */
    static Set<String> keys(String bundle) {
        return load(bundle).stringPropertyNames();
    }

    /** The bundles of the findings: {@code findings}, and one for each further language. */
    static List<String> languagesOfFindings() throws IOException {
        try (Stream<Path> files = Files.list(BUNDLES)) {
            return files.map(file -> file.getFileName().toString())
                    .filter(name -> name.matches("findings(_\\w+)?\\.properties"))
                    .map(name -> name.replace(".properties", ""))
                    .toList();
        }
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
            try (var reader = Files.newBufferedReader(BUNDLES.resolve(bundle + ".properties"))) {
                messages.load(reader);
            } catch (IOException unreadable) {
                throw new UncheckedIOException(unreadable);
            }
        }
        return messages;
    }
}
