package plusward.entry;

import java.util.Arrays;
import java.util.Collections;
import java.util.EnumMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import org.springframework.util.MultiValueMap;
import plusward.draft.Draft;
import plusward.exam.Examination;
import plusward.exam.ExaminationWriter;
import plusward.exam.Field;
import plusward.rules.Suspicion;
import plusward.visit.RecordedVisit;

/**
 * A visit as it is typed.
 *
 * @param text the text of every field, empty where nothing was typed
 * @param version the version of the visit that was read into this form; {@link #NONE} for a new one
 * @param day the day for which it was begun, as the page sent it; empty when the page was opened just now
 * @param why the reason for a correction
 * @param confirmed the tokens of unlikely entries that were said to be right
 */
record VisitForm(Map<Field, String> text, int version, String day, String why, Set<String> confirmed) {

    /** What "as last time" copies: the glasses, never a measurement. */
    static final Set<Field> GLASSES =
            Set.of(Field.WORN_RIGHT, Field.WORN_LEFT, Field.WORN_ADD, Field.WORN_SINCE, Field.SEGMENT_STYLE);

    /** The version of a visit that was not read from the store. */
    static final int NONE = -1;

    VisitForm {
        Map<Field, String> every = new EnumMap<>(Field.class);
        Map<Field, String> given = text;
        Arrays.stream(Field.values()).forEach(field -> every.put(field, given.getOrDefault(field, "")));
        text = Collections.unmodifiableMap(every);
        confirmed = Set.copyOf(confirmed);
    }

    private VisitForm(Map<Field, String> text, int version) {
        this(text, version, "", "", Set.of());
    }

    /** Nothing typed yet. */
    static VisitForm blank() {
        return new VisitForm(Map.of(), NONE);
    }

    /** From the parameters of a request, by the names of the columns; others are left aside. */
    static VisitForm of(MultiValueMap<String, String> sent) {
        String version = first(sent, "version");
        Map<Field, String> text = new EnumMap<>(Field.class);
        Arrays.stream(Field.values()).forEach(field -> text.put(field, first(sent, field.column())));
        return new VisitForm(
                text,
                version.matches("\\d{1,9}") ? Integer.parseInt(version) : NONE,
                first(sent, "day"),
                first(sent, "why"),
                new HashSet<>(sent.getOrDefault("confirmed", List.of())));
    }

    private static String first(MultiValueMap<String, String> sent, String name) {
        return Objects.requireNonNullElse(sent.getFirst(name), "");
    }

    /** As one would type what was examined. */
    static VisitForm of(Examination examination) {
        return new VisitForm(ExaminationWriter.write(examination), NONE);
    }

    static VisitForm of(RecordedVisit visit) {
        return new VisitForm(ExaminationWriter.write(visit.examination()), visit.version());
    }

    static VisitForm of(Draft draft) {
        int version = draft.place().isNew() ? NONE : draft.version();
        return new VisitForm(draft.typed(), version, draft.place().begunFor().toString(), draft.why(), Set.of());
    }

    String at(Field field) {
        return text.getOrDefault(field, "");
    }

    boolean hasConfirmed(Suspicion suspicion) {
        return confirmed.contains(suspicion.token());
    }

    /** True when nothing but the day and the examiner is there. */
    boolean isBlank() {
        return text.entrySet().stream()
                .filter(each -> each.getKey() != Field.VISIT_DATE && each.getKey() != Field.EXAMINER)
                .allMatch(each -> each.getValue().isBlank());
    }

    VisitForm with(Field field, String typed) {
        return with(Map.of(field, typed));
    }

    /** The same with other text in some of the fields. */
    VisitForm with(Map<Field, String> typed) {
        Map<Field, String> changed = new EnumMap<>(text);
        changed.putAll(typed);
        return new VisitForm(changed, version, day, why, confirmed);
    }
}
