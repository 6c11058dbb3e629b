package plusward.course;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.exam.Field;

class GazePatternTests {

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', nullValues = "-", textBlock = """
            up     | down   | up - down (Δ) | letter | source
            ET 10  | ET 25  | -15           | V      | from memory: V from 15 Δ
            ET 10  | ET 24  | -14           | -      | from memory: V from 15 Δ
            X 8    | E 7    | -15           | V      | -8 - 7
            ET 25  | ET 15  | 10            | A      | from memory: A from 10 Δ
            ET 25  | ET 16  | 9             | -      | from memory: A from 10 Δ
            ortho  | XT 10  | 10            | A      | 0 - (-10)
            ET 20  | ET 20  | 0             | -      | definition
            ET 20  | -      | -             | -      | one reading is no difference
            -      | ET 20  | -             | -      | one reading is no difference
            RHT 4  | ET 20  | -             | -      | the horizontal turn is not stated, which is not 0
            """)
    void upMinusDownNamesThePattern(String up, String down, String difference, String letter, String source) {
        GazePattern pattern = pattern(Field.TURN_CC_UP, up, Field.TURN_CC_DOWN, down);
        assertThat(pattern.upMinusDown() == null ? null : pattern.upMinusDown().toString())
                .as(source)
                .isEqualTo(difference);
        assertThat(pattern.letter().map(Enum::name).orElse(null)).as(source).isEqualTo(letter);
        assertThat(pattern.rightMinusLeft()).isNull();
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', nullValues = "-", textBlock = """
            right  | left   | right - left (Δ) | source
            ET 18  | ET 35  | -17              | 18 - 35
            ET 35  | ET 18  | 17               | 35 - 18
            ET 35  | -      | -                | one reading is no difference
            """)
    void rightMinusLeftIsTheSideDifference(String right, String left, String difference, String source) {
        GazePattern pattern = pattern(Field.TURN_CC_RIGHT_GAZE, right, Field.TURN_CC_LEFT_GAZE, left);
        assertThat(
                        pattern.rightMinusLeft() == null
                                ? null
                                : pattern.rightMinusLeft().toString())
                .as(source)
                .isEqualTo(difference);
        assertThat(pattern.upMinusDown()).isNull();
        assertThat(pattern.letter()).isEmpty();
    }

    private static GazePattern pattern(Field one, String first, Field other, String second) {
        Map<String, String> row = new HashMap<>();
        row.put(Field.VISIT_DATE.column(), "2026-03-14");
        row.put(one.column(), Objects.requireNonNullElse(first, ""));
        row.put(other.column(), Objects.requireNonNullElse(second, ""));
        Course course = new Course(CourseText.patient("2020-01-31"), List.of(CourseText.exam(row)));
        return GazePattern.at(course.visits().get(0));
    }
}
