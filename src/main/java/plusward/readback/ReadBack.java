package plusward.readback;

import java.time.LocalDate;
import java.util.Arrays;
import java.util.Collections;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import plusward.course.Course;
import plusward.course.Limits;
import plusward.course.SegmentPlace;
import plusward.course.Visit;
import plusward.exam.Field;
import plusward.exam.Reason;
import plusward.exam.Refusal;
import plusward.rules.Finding;
import plusward.rules.Rulebook;
import plusward.rules.Suspicion;

/**
 * A visit read back while it is typed, by the code that will read it when it is saved.
 *
 * @param fields every field
 * @param facts what the fields say together, such as the plus that is still short
 * @param segment where the segment sits; absent when it was not measured or no add is worn
 * @param findings what the visit would raise, heaviest first
 */
public record ReadBack(
        Map<Field, FieldRead> fields,
        List<Reason> facts,
        @Nullable SegmentDrawing segment,
        List<Finding.Met> findings) {

    public ReadBack {
        fields = Collections.unmodifiableMap(new EnumMap<>(fields));
        facts = List.copyOf(facts);
        findings = List.copyOf(findings);
    }

    /**
     * Reads typed text as a visit among the child's others.
     *
     * @param others the child's visits without the one that is typed; those after it are not looked at
     * @param on the day of the reading, which stands for a date that cannot be read
     */
    public static ReadBack of(Course others, Map<Field, String> typed, LocalDate on) {
        PartialReading reading = PartialReading.of(typed, on);
        Visit visit = others.with(reading.examination());
        List<Suspicion> doubts = Suspicion.at(visit);
        FieldReader reader = new FieldReader(visit);
        Map<Field, FieldRead> fields = new EnumMap<>(Field.class);
        Arrays.stream(Field.values()).forEach(field -> {
            List<Suspicion> ofField =
                    doubts.stream().filter(doubt -> doubt.field() == field).toList();
            Refusal refused = reading.refused().get(field);
            List<Reason> understood = refused == null ? reader.read(field, typed.getOrDefault(field, "")) : List.of();
            fields.put(field, new FieldRead(field, understood, refused, ofField));
        });
        return new ReadBack(
                fields,
                Facts.of(visit),
                SegmentPlace.at(visit, Limits.DEFAULT).map(SegmentDrawing::of).orElse(null),
                Rulebook.met(visit, on, Limits.DEFAULT));
    }

    /** What was read of a field. */
    public FieldRead at(Field field) {
        return Objects.requireNonNull(fields.get(field));
    }
}
