package plusward.web;

import java.util.Locale;
import org.jspecify.annotations.Nullable;
import org.springframework.context.MessageSource;
import org.springframework.context.i18n.LocaleContextHolder;
import plusward.exam.Reason;

/**
 * Words a {@link Reason}: looks up its key in the message bundles and puts in its values as {@link Shown} shows them.
 *
 * <p>In templates as {@code @sentences.of(reason)}. A reason among the values is worded first.
 */
public final class Sentences {

    private final MessageSource messages;
    private final Shown shown;

    Sentences(MessageSource messages, Shown shown) {
        this.messages = messages;
        this.shown = shown;
    }

    /**
     * The sentence in the language of the screen.
     *
     * @throws org.springframework.context.NoSuchMessageException when no bundle has the key
     */
    public String of(Reason reason) {
        return of(reason, LocaleContextHolder.getLocale());
    }

    /** The sentence in the language asked for; in English where that language does not have it. */
    public String of(Reason reason, Locale language) {
        Object[] values =
                reason.values().stream().map(value -> worded(value, language)).toArray();
        return messages.getMessage(reason.key(), values, language);
    }

    /** A count stays a number, so that a message can choose its words by it. */
    private Object worded(@Nullable Object value, Locale language) {
        if (value instanceof Integer || value instanceof Long) {
            return value;
        }
        return value instanceof Reason nested ? of(nested, language) : shown.of(value, language);
    }
}
