package plusward.web;

import java.text.FieldPosition;
import java.text.Format;
import java.text.MessageFormat;
import java.text.ParsePosition;
import java.util.Locale;
import org.jspecify.annotations.Nullable;
import org.springframework.context.support.ResourceBundleMessageSource;

/** Message bundles in which a plain {@code {0}} writes a number as it is: the year 2026, never 2,026. */
final class Bundles extends ResourceBundleMessageSource {

    @Override
    protected MessageFormat createMessageFormat(String message, @Nullable Locale locale) {
        MessageFormat format = super.createMessageFormat(message, locale);
        Format[] formats = format.getFormats();
        for (int i = 0; i < formats.length; i++) {
            if (formats[i] == null) {
                format.setFormat(i, new AsItIs());
            }
        }
        return format;
    }

    private static final class AsItIs extends Format {

        @Override
        public StringBuffer format(Object value, StringBuffer to, FieldPosition position) {
            return to.append(value);
        }

        @Override
        public @Nullable Object parseObject(String source, ParsePosition position) {
            return null;
        }
    }
}
