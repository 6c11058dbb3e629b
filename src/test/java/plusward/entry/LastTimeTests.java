package plusward.entry;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Instant;
import java.time.LocalDate;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import plusward.course.CourseText;
import plusward.exam.Examination;
import plusward.exam.Field;
import plusward.visit.RecordedVisit;

class LastTimeTests {

    private static final Instant AT = Instant.parse("2026-01-05T09:00:00Z");
    private static final List<Field> WORN = List.of(Field.WORN_RIGHT, Field.WORN_LEFT, Field.WORN_ADD);

    /** The visits of a table, in its order. */
    private static LastTime last(String table) {
        List<Examination> examinations =
                CourseText.rows(table).stream().map(CourseText::exam).toList();
        return LastTime.of(IntStream.range(0, examinations.size())
                .mapToObj(i -> new RecordedVisit(i + 1, 0, examinations.get(i), "staff", AT, "staff", AT))
                .toList());
    }

    @Test
    void thereIsNothingWhenThereIsNoEarlierVisit() {
        LastTime none = LastTime.of(List.of());
        assertThat(none.visit()).isEmpty();
        assertThat(none.having(WORN)).isEmpty();
        assertThat(none.glasses()).isEmpty();
    }

    @Test
    void theVisitBeforeIsTheLatestWhateverTheOrder() {
        LastTime last = last("""
                visit_date | worn_right
                2024-03-14 | +3.00
                2025-03-14 |
                2023-03-14 | +2.00
                """);
        assertThat(last.visit().orElseThrow().date()).isEqualTo(LocalDate.parse("2025-03-14"));
    }

    @Test
    void theFieldsOfARowComeFromOneVisit() {
        LastTime last = last("""
                visit_date | worn_right | worn_left | worn_add | pd_mm
                2023-03-14 | +2.00      | +2.50     | 2.50     | 50
                2024-03-14 |            | +3.00     |          | 51
                2025-03-14 |            |           |          | 52
                """);
        LastTime.Earlier found = last.having(WORN).orElseThrow();
        assertThat(found.date()).isEqualTo(LocalDate.parse("2024-03-14"));
        assertThat(found.text()).isEqualTo(Map.of(Field.WORN_LEFT, "+3.00"));
        assertThat(last.having(List.of(Field.WORN_ADD)).orElseThrow().date()).isEqualTo(LocalDate.parse("2023-03-14"));
        assertThat(last.having(List.of(Field.MADE_RIGHT, Field.MADE_LEFT))).isEmpty();
    }

    @Test
    void theGlassesComeFromOneVisitAndAreEmptyWhereItLacksThem() {
        LastTime last = last("""
                visit_date | worn_right | worn_left | worn_add | worn_since | segment_style | made_right | wear_hours
                2023-03-14 | +2.00      | +2.50     | 2.50     | 2022-11-02 | flat-top 28   | +2.12      | 12
                2024-03-14 | +3.00      |           |          | 2024-01-09 |               | +3.12      | 10
                2025-03-14 |            |           | 3.00     | 2025-02-01 | round         | +3.37      | 8
                """);
        assertThat(last.glasses()).contains(glasses("+3.00", "2024-01-09"));
    }

    private static Map<Field, String> glasses(String right, String since) {
        Map<Field, String> glasses = new EnumMap<>(Field.class);
        VisitForm.GLASSES.forEach(field -> glasses.put(field, ""));
        glasses.put(Field.WORN_RIGHT, right);
        glasses.put(Field.WORN_SINCE, since);
        return glasses;
    }

    @Test
    void thereAreNoGlassesToCopyWhenNoLensWasWorn() {
        assertThat(last("""
                visit_date | worn_add | made_right | ordered_right
                2024-03-14 | 2.50     | +3.00      | +3.00
                """).glasses()).isEmpty();
    }
}
