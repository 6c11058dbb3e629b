package plusward.web;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatCode;

import java.io.IOException;
import java.io.InputStreamReader;
import java.io.Reader;
import java.nio.charset.StandardCharsets;
import java.text.MessageFormat;
import java.util.HashMap;
import java.util.Locale;
import java.util.Map;
import java.util.Properties;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.springframework.core.io.Resource;
import org.springframework.core.io.support.PathMatchingResourcePatternResolver;

/** What holds for the messages of every feature. */
class MessageBundlesTests {

    static Stream<Resource> files() throws IOException {
        return Stream.of(new PathMatchingResourcePatternResolver().getResources("classpath*:messages/*.properties"));
    }

    @ParameterizedTest
    @MethodSource("files")
    void everyMessageIsAFormatAndKeepsItsApostrophes(Resource file) throws IOException {
        read(file).forEach((key, text) -> {
            assertThat(text.toString()).as("%s: write an apostrophe as ’", key).doesNotContain("'");
            assertThatCode(() -> new MessageFormat(text.toString(), Locale.ENGLISH))
                    .as("%s", key)
                    .doesNotThrowAnyException();
        });
    }

    @Test
    void noKeyStandsInTwoBundles() throws IOException {
        Map<String, String> home = new HashMap<>();
        for (Resource file : files().toList()) {
            String language = String.valueOf(file.getFilename()).replaceFirst("^.*?(_[a-z]{2})?\\.properties$", "$1");
            for (Object key : read(file).keySet()) {
                assertThat(home.put(key + language, file.getFilename()))
                        .as("%s, also in %s", key, file)
                        .isNull();
            }
        }
        assertThat(home).isNotEmpty();
    }

    private static Properties read(Resource file) throws IOException {
        Properties messages = new Properties();
        try (Reader reader = new InputStreamReader(file.getInputStream(), StandardCharsets.UTF_8)) {
            messages.load(reader);
        }
        return messages;
    }
}
