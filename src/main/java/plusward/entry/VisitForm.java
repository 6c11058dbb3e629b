package plusward.entry;

import java.util.Arrays;
import java.util.EnumMap;
import java.util.Map;
import java.util.Set;
import plusward.exam.Examination;
import plusward.exam.ExaminationWriter;
import plusward.exam.Field;
import plusward.visit.RecordedVisit;

/** A visit as it is typed: the text of every field, empty where nothing was typed. */
final class VisitForm {

    /** What "as last time" copies: the glasses, never a measurement. */
    static final Set<Field> GLASSES =
            Set.of(Field.WORN_RIGHT, Field.WORN_LEFT, Field.WORN_ADD, Field.WORN_SINCE, Field.SEGMENT_STYLE);

    /** The version of a visit that was not read from the store. */
    private static final int NONE = -1;

    private final Map<Field, String> typed = new EnumMap<>(Field.class);
    private final int version;

    private VisitForm(Map<Field, String> typed, int version) {
        Arrays.stream(Field.values()).forEach(field -> this.typed.put(field, typed.getOrDefault(field, "")));
        this.version = version;
    }

    /** Nothing typed yet. */
    static VisitForm blank() {
        return new VisitForm(Map.of(), NONE);
    }

    /** From the parameters of a request, by the names of the columns; others are left aside. */
    static VisitForm of(Map<String, String> sent) {
        String version = sent.getOrDefault("version", "");
        VisitForm form = new VisitForm(Map.of(), version.matches("\\d{1,9}") ? Integer.parseInt(version) : NONE);
        form.typed.replaceAll((field, nothing) -> sent.getOrDefault(field.column(), ""));
        return form;
    }

    /** As one would type what was examined. */
    static VisitForm of(Examination examination) {
        return new VisitForm(ExaminationWriter.write(examination), NONE);
    }

    static VisitForm of(RecordedVisit visit) {
        return new VisitForm(ExaminationWriter.write(visit.examination()), visit.version());
    }

    /** The version of the visit that was read into this form; none for a new one, which no stored visit has. */
    public int version() {
        return version;
    }

    String at(Field field) {
        return typed.getOrDefault(field, "");
    }

    VisitForm with(Field field, String text) {
        VisitForm changed = new VisitForm(typed, version);
        changed.typed.put(field, text);
        return changed;
    }

    /** The same with the glasses of an earlier visit in place of those typed. */
    VisitForm withGlassesOf(Examination earlier) {
        Map<Field, String> glasses = ExaminationWriter.write(earlier);
        VisitForm changed = new VisitForm(typed, version);
        GLASSES.forEach(field -> changed.typed.put(field, glasses.getOrDefault(field, "")));
        return changed;
    }

    Map<Field, String> text() {
        return typed;
    }
}
