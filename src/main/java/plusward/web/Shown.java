package plusward.web;

import java.time.LocalDate;
import java.time.Period;
import java.util.Collection;
import java.util.Locale;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import org.springframework.context.MessageSource;
import org.springframework.context.i18n.LocaleContextHolder;
import plusward.optics.Degrees;
import plusward.optics.Lens;
import plusward.optics.Quantity;

/**
 * How values of the core look on a screen: with a real minus sign, their unit, and a word where nothing was measured.
 *
 * <p>In templates as {@code @shown}: {@code @shown.of(x)} for any value, {@code @shown.number(x)} where the column names
 * the unit.
 */
public final class Shown {

    private static final char MINUS = '−';

    private final MessageSource messages;

    Shown(MessageSource messages) {
        this.messages = messages;
    }

    /** Any value of the core: a quantity with its unit, a lens, a turn, a date; "not measured" when it is absent. */
    public String of(@Nullable Object value) {
        return of(value, LocaleContextHolder.getLocale());
    }

    /** The same in another language. */
    public String of(@Nullable Object value, Locale language) {
        if (value == null) {
            return messages.getMessage("shown.absent", null, language);
        }
        if (value instanceof Quantity<?> quantity) {
            String pattern = quantity instanceof Degrees ? "shown.angle" : "shown.quantity";
            return messages.getMessage(pattern, new Object[] {number(quantity), quantity.unit()}, language);
        }
        return value instanceof Enum<?> word ? word(word, language) : plain(value, language);
    }

    /** The number alone, signed as its kind is: {@code +3.50}, {@code −0.75}, {@code 25}. Empty when absent. */
    public String number(@Nullable Quantity<?> quantity) {
        return quantity == null ? "" : withMinus(quantity.toString());
    }

    /** {@code +4.00 −0.50 × 180}; "not measured" when absent. */
    public String lens(@Nullable Lens lens) {
        return of(lens);
    }

    /** {@code 5 years 10 months}, from one day to another. */
    public String age(LocalDate bornOn, LocalDate on) {
        Period age = Period.between(bornOn, on);
        Object[] parts = {age.getYears(), age.getMonths()};
        return messages.getMessage("shown.age", parts, LocaleContextHolder.getLocale());
    }

    private String plain(Object value, Locale language) {
        if (value instanceof Collection<?> several) {
            return several.stream().map(each -> of(each, language)).collect(Collectors.joining(", "));
        }
        if (value instanceof Lens lens) {
            return withMinus(lens.toString()).replace(" x ", " × ");
        }
        return value instanceof Number number ? withMinus(number.toString()) : value.toString();
    }

    /** A word of the core, such as an eye: {@code eye.right}; its own notation where no message renames it. */
    private String word(Enum<?> word, Locale language) {
        String kind = word.getDeclaringClass().getSimpleName().replaceAll("(?<=[a-z])(?=[A-Z])", "-");
        String key = (kind + "." + word.name().replace('_', '-')).toLowerCase(Locale.ROOT);
        return String.valueOf(messages.getMessage(key, null, word.toString(), language));
    }

    private static String withMinus(String number) {
        return number.replace('-', MINUS);
    }
}
