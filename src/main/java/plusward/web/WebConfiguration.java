package plusward.web;

import java.io.IOException;
import java.time.Clock;
import java.time.ZoneId;
import java.util.Arrays;
import java.util.Objects;
import org.springframework.beans.factory.annotation.Value;
import org.springframework.context.MessageSource;
import org.springframework.context.annotation.Bean;
import org.springframework.context.annotation.Configuration;
import org.springframework.core.io.Resource;
import org.springframework.core.io.support.PathMatchingResourcePatternResolver;

@Configuration(proxyBeanMethods = false)
class WebConfiguration {

    @Bean
    Clock clock() {
        return Clock.system(ZoneId.systemDefault());
    }

    /**
     * Every bundle under {@code messages/}, one a feature.
     *
     * <p>Each message is a message format even when it takes no value, so that an apostrophe is always written twice.
     */
    @Bean
    MessageSource messageSource() throws IOException {
        Bundles source = new Bundles();
        source.setBasenames(bundles());
        source.setDefaultEncoding("UTF-8");
        source.setAlwaysUseMessageFormat(true);
        source.setFallbackToSystemLocale(false);
        return source;
    }

    @Bean
    Shown shown(MessageSource messages) {
        return new Shown(messages);
    }

    @Bean
    Sentences sentences(MessageSource messages, Shown shown) {
        return new Sentences(messages, shown);
    }

    @Bean
    Screen screen() {
        return new Screen();
    }

    @Bean
    Clinic clinic(
            @Value("${plusward.clinic.name}") String name,
            @Value("${plusward.clinic.phone}") String phone,
            @Value("${plusward.clinic.address}") String address) {
        return new Clinic(name, phone, address);
    }

    @Bean
    Troubles troubles(Clock clock) {
        return new Troubles(clock);
    }

    @Bean
    ErrorAnswers errorAnswers(MessageSource messages) {
        return new ErrorAnswers(messages);
    }

    static String[] bundles() throws IOException {
        Resource[] files = new PathMatchingResourcePatternResolver().getResources("classpath*:messages/*.properties");
        return Arrays.stream(files)
                .map(file -> Objects.requireNonNull(file.getFilename()))
                .map(name -> "messages/" + name.replaceFirst("(_[a-z]{2})?\\.properties$", ""))
                .distinct()
                .sorted()
                .toArray(String[]::new);
    }
}
