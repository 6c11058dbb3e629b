package plusward.readback;

import java.time.LocalDate;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import plusward.course.Course;
import plusward.course.CourseText;
import plusward.exam.Field;
import plusward.exam.Reason;
import plusward.web.Sentences;
import plusward.web.Words;

/** Types a visit on 2025-03-14, of a child born on 2019-05-02, after a visit on 2024-03-14, and reads it back in English. */
final class Reread {

    static final LocalDate BEFORE = LocalDate.parse("2024-03-14");
    static final LocalDate DAY = LocalDate.parse("2025-03-14");

    private static final Sentences SENTENCES = Words.sentences();

    private Reread() {}

    /** Each entry is {@code column=text}. */
    static Map<Field, String> typed(String... entries) {
        Map<Field, String> typed = new EnumMap<>(Map.of(Field.VISIT_DATE, DAY.toString()));
        for (String entry : entries) {
            int sign = entry.indexOf('=');
            typed.put(Field.named(entry.substring(0, sign)).orElseThrow(), entry.substring(sign + 1));
        }
        return typed;
    }

    /** With no earlier visit. */
    static ReadBack of(String... entries) {
        return ReadBack.of(new Course(CourseText.patient("2019-05-02"), List.of()), typed(entries), DAY);
    }

    /** Among the visits of a table, as {@link CourseText#course} writes them. */
    static ReadBack among(String table, String... entries) {
        return ReadBack.of(CourseText.course("2019-05-02", table), typed(entries), DAY);
    }

    /** What is read of one field after an earlier visit at which it held the other text, or nothing. */
    static String field(Field field, @Nullable String before, String now) {
        String column = field.column();
        String earlier = before == null ? "" : before;
        return words(among("visit_date | %s%n%s | %s".formatted(column, BEFORE, earlier), column + "=" + now)
                .at(field)
                .understood());
    }

    static String words(List<Reason> reasons) {
        return reasons.stream().map(Reread::words).collect(Collectors.joining(" · "));
    }

    static String words(Reason reason) {
        return SENTENCES.of(reason, Locale.ENGLISH);
    }
}
