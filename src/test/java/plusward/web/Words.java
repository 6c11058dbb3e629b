package plusward.web;

import java.io.IOException;
import java.io.UncheckedIOException;
import org.springframework.context.MessageSource;

/** The words of the application, from its bundles, without a context. */
public final class Words {

    private Words() {}

    public static Sentences sentences() {
        try {
            WebConfiguration configuration = new WebConfiguration();
            MessageSource messages = configuration.messageSource();
            return configuration.sentences(messages, configuration.shown(messages));
        } catch (IOException fault) {
            throw new UncheckedIOException(fault);
        }
    }
}
