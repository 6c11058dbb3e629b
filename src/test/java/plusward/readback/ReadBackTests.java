package plusward.readback;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.course.Course;
import plusward.course.CourseText;
import plusward.course.Limits;
import plusward.course.RandomCourses;
import plusward.exam.Examination;
import plusward.exam.ExaminationReader;
import plusward.exam.ExaminationWriter;
import plusward.exam.Field;
import plusward.exam.Generator;
import plusward.rules.Finding;
import plusward.rules.Rulebook;
import plusward.rules.Suspicion;

class ReadBackTests {

    private static final LocalDate ON = LocalDate.parse("2025-06-01");

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            column         | typed      | problem                | accepted
            made_left      | 3.00       | lacks a sign           | Enter
            turn_cc_near   | ET         | ET                     | Enter
            acuity_right   | 20/        | 20/                    | Enter
            wear_hours     | 25         | 25                     | Enter
            visit_date     | 2025-02-30 | 2025-02-30             | Enter
            """)
    void aRefusedFieldSaysWhatIsWrongAndWhatIsAccepted(String column, String typed, String problem, String accepted) {
        FieldRead read = Reread.of(column + "=" + typed).at(Field.named(column).orElseThrow());
        assertThat(read.name()).isEqualTo(column);
        assertThat(read.understood()).isEmpty();
        assertThat(read.problem()).hasSize(2);
        assertThat(Reread.words(read.problem().get(0))).contains(problem);
        assertThat(Reread.words(read.problem().get(1))).startsWith(accepted);
    }

    @Test
    void aRefusedFieldDoesNotHideTheReadingOfTheOthers() {
        ReadBack read = Reread.of("made_left=3.00", "turn_cc_near=ET 1x", "worn_right=+3.50", "turn_cc_distance=ET 25");
        assertThat(read.at(Field.MADE_LEFT).refused()).isNotNull();
        assertThat(read.at(Field.TURN_CC_NEAR).refused()).isNotNull();
        assertThat(Reread.words(read.at(Field.WORN_RIGHT).understood())).isEqualTo("SE +3.50 D");
        assertThat(read.at(Field.WORN_RIGHT).problem()).isEmpty();
        assertThat(read.findings()).extracting(Finding.Met::code).contains("turn-not-held");
    }

    @Test
    void ofTwoMeasuresAtOddsOneIsRefusedAndTheOtherRead() {
        ReadBack read = Reread.of("segment_left_mm=-3.5", "segment_height_left_mm=18.5", "pupil_height_left_mm=20");
        assertThat(read.at(Field.SEGMENT_LEFT_MM).refused()).isNotNull();
        assertThat(Reread.words(read.at(Field.PUPIL_HEIGHT_LEFT_MM).understood()))
                .isEqualTo("segment top −1.5 mm from the pupil centre");
    }

    @Test
    void theDayOfTheReadingStandsForADateThatCannotBeRead() {
        Course course = CourseText.course("2019-05-02", """
                visit_date | turn_cc_near
                2024-03-14 | ET 10
                2025-06-02 | ET 40
                """);
        for (String date : List.of("", " ", "yesterday")) {
            Map<Field, String> typed = Reread.typed("visit_date=" + date, "turn_cc_near=ET 12", "next_visit_weeks=1");
            ReadBack read = ReadBack.of(course, typed, ON);
            assertThat(read.at(Field.VISIT_DATE).refused()).isNotNull();
            assertThat(read.at(Field.VISIT_DATE).understood()).isEmpty();
            assertThat(Reread.words(read.at(Field.NEXT_VISIT_WEEKS).understood()))
                    .isEqualTo("around 2025-06-08");
            assertThat(Reread.words(read.at(Field.TURN_CC_NEAR).understood()))
                    .endsWith("since 2024-03-14: may be noise");
        }
    }

    @Test
    void aDoubtStandsAtItsFieldAlone() {
        ReadBack read = Reread.among("visit_date | worn_right\n2024-03-14 | +3.50", "worn_right=-3.50", "pd_mm=52");
        assertThat(read.at(Field.WORN_RIGHT).doubts())
                .extracting(Suspicion::code)
                .containsExactly("sign-flipped");
        assertThat(read.fields().values())
                .filteredOn(field -> !field.doubts().isEmpty())
                .extracting(FieldRead::field)
                .containsExactly(Field.WORN_RIGHT);
    }

    @Test
    void anEmptyPageIsReadAsAVisitAtWhichNothingWasMeasured() {
        ReadBack read = ReadBack.of(new Course(CourseText.patient("2019-05-02"), List.of()), Map.of(), ON);
        assertThat(read.fields()).containsOnlyKeys(Field.values());
        assertThat(read.facts()).isEmpty();
        assertThat(read.segment()).isNull();
    }

    /** A thousand pages of anything, of which every sentence must be worded. */
    @Test
    void anyTextIsReadBack() {
        List<Course> courses = RandomCourses.all();
        for (int seed = 0; seed < 1000; seed++) {
            ReadBack read = ReadBack.of(courses.get(seed % courses.size()), new Generator(seed).fields(), ON);
            read.fields().values().forEach(field -> {
                assertThat(Reread.words(field.understood())).doesNotContain("{", "null");
                assertThat(Reread.words(field.problem())).isNotNull();
                assertThat(field.refused() == null || field.understood().isEmpty())
                        .isTrue();
            });
        }
    }

    /** The visit is typed as it is written; what it would raise is what it raises once it is stored. */
    @Test
    void whatItWouldRaiseIsWhatItRaisesAfterSaving() {
        int raised = 0;
        for (Course course : RandomCourses.all()) {
            for (Examination examination : course.examinations()) {
                Course others = new Course(
                        course.patient(),
                        course.examinations().stream()
                                .filter(each -> !each.equals(examination))
                                .toList());
                ReadBack read = ReadBack.of(others, ExaminationWriter.write(examination), ON);
                assertThat(read.fields().values()).allMatch(field -> field.refused() == null);
                assertThat(read.findings())
                        .isEqualTo(Rulebook.met(course.on(examination.date()).orElseThrow(), ON, Limits.DEFAULT));
                raised += read.findings().size();
            }
        }
        assertThat(raised).isGreaterThan(500);
    }

    /** Of pages that are half wrong, the findings are those of the fields that can be read. */
    @Test
    void whatIsRefusedRaisesNothingAndTheRestRaisesItsOwn() {
        Course none = new Course(RandomCourses.all().get(0).patient(), List.of());
        for (int seed = 0; seed < 300; seed++) {
            Map<Field, String> typed = new Generator(seed).fields();
            typed.put(Field.VISIT_DATE, "2025-03-14");
            ReadBack read = ReadBack.of(none, typed, ON);
            read.fields().values().stream()
                    .filter(field -> field.refused() != null)
                    .forEach(field -> typed.put(field.field(), ""));
            Examination rest = ExaminationReader.read(typed).examination();
            assertThat(rest).isNotNull();
            assertThat(read.findings()).isEqualTo(Rulebook.met(none.with(rest), ON, Limits.DEFAULT));
        }
    }
}
