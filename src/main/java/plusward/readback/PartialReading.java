package plusward.readback;

import java.time.LocalDate;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import plusward.exam.Examination;
import plusward.exam.ExaminationReader;
import plusward.exam.Field;
import plusward.exam.Refusal;

/**
 * As much of a typed visit as can be read: what is refused is left out, and the rest stands.
 *
 * @param examination what could be read
 * @param refused what could not
 */
record PartialReading(Examination examination, Map<Field, Refusal> refused) {

    /** A date that cannot be read is taken to be {@code day} until it can. */
    static PartialReading of(Map<Field, String> typed, LocalDate day) {
        Map<Field, String> text = new EnumMap<>(Field.class);
        text.putAll(typed);
        Map<Field, Refusal> refused = new EnumMap<>(Field.class);
        ExaminationReader.Result result = ExaminationReader.read(text);
        while (!result.refusals().isEmpty()) {
            leaveOut(result.refusals(), text, refused, day);
            result = ExaminationReader.read(text);
        }
        Examination read = result.examination();
        return new PartialReading(read == null ? Examination.empty(day) : read, refused);
    }

    private static void leaveOut(
            List<Refusal> refusals, Map<Field, String> text, Map<Field, Refusal> refused, LocalDate day) {
        refusals.forEach(refusal -> {
            refused.putIfAbsent(refusal.field(), refusal);
            text.put(refusal.field(), refusal.field() == Field.VISIT_DATE ? day.toString() : "");
        });
    }
}
