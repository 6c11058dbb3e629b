package plusward.entry;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.Map;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.child.ChildCard;
import plusward.exam.ExaminationReader;
import plusward.exam.Field;

class VisitDatesTests {

    private static final ChildCard CHILD =
            new ChildCard(1, "A-1", null, null, LocalDate.parse("2019-05-02"), null, "en", null, 0);
    private static final LocalDate TODAY = LocalDate.parse("2026-03-09");

    @ParameterizedTest
    @CsvSource(delimiter = '|', nullValues = "-", textBlock = """
        # visit    | worn since | refused     | because
        2019-05-01 | -          | VISIT_DATE  | entry.date.before-birth
        2019-05-02 | -          | -           | -
        2026-03-09 | -          | -           | -
        2026-03-10 | -          | VISIT_DATE  | entry.date.future
        2026-03-09 | 2019-05-01 | WORN_SINCE  | entry.date.before-birth
        2026-03-09 | 2019-05-02 | -           | -
        2026-03-09 | 2026-03-09 | -           | -
        2026-03-08 | 2026-03-09 | WORN_SINCE  | entry.date.after-visit
        """)
    void aVisitAndItsGlassesLieBetweenBirthAndToday(String visit, String since, Field field, String because) {
        Map<Field, String> text = since == null
                ? Map.of(Field.VISIT_DATE, visit)
                : Map.of(Field.VISIT_DATE, visit, Field.WORN_SINCE, since);
        var refused = VisitDates.check(ExaminationReader.read(text).examination(), CHILD, TODAY);
        if (field == null) {
            assertThat(refused).isEmpty();
        } else {
            assertThat(refused).singleElement().satisfies(each -> {
                assertThat(each.name()).isEqualTo(field.column());
                assertThat(each.problem().key()).isEqualTo(because);
            });
        }
    }
}
