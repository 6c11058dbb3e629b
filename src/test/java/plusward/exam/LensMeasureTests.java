package plusward.exam;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.EnumSet;
import java.util.Map;
import java.util.Objects;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import plusward.optics.Lens;

class LensMeasureTests {

    private static Examination with(Field field, String text) {
        Examination read = ExaminationReader.read(Map.of(Field.VISIT_DATE, "2025-03-14", field, text))
                .examination();
        return Objects.requireNonNull(read);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            measure     | right             | left
            WORN        | WORN_RIGHT        | WORN_LEFT
            MADE        | MADE_RIGHT        | MADE_LEFT
            CYCLOPLEGIC | CYCLOPLEGIC_RIGHT | CYCLOPLEGIC_LEFT
            MANIFEST    | MANIFEST_RIGHT    | MANIFEST_LEFT
            ORDERED     | ORDERED_RIGHT     | ORDERED_LEFT
            """)
    void aMeasureHasAFieldForEachEye(LensMeasure measure, Field right, Field left) {
        assertThat(measure.field(Eye.RIGHT)).isEqualTo(right);
        assertThat(measure.field(Eye.LEFT)).isEqualTo(left);
        assertThat(measure.eye(right)).isEqualTo(Eye.RIGHT);
        assertThat(measure.eye(left)).isEqualTo(Eye.LEFT);
        assertThat(LensMeasure.of(right)).contains(measure);
        assertThat(LensMeasure.of(left)).contains(measure);
    }

    @Test
    void aFieldThatHoldsNoLensBelongsToNoMeasure() {
        EnumSet<Field> others = EnumSet.allOf(Field.class);
        for (LensMeasure measure : LensMeasure.values()) {
            others.removeAll(Arrays.asList(measure.field(Eye.RIGHT), measure.field(Eye.LEFT)));
        }
        assertThat(others).hasSize(Field.values().length - 10);
        assertThat(others).allSatisfy(field -> assertThat(LensMeasure.of(field)).isEmpty());
    }

    @ParameterizedTest
    @EnumSource
    void theLensIsThatOfItsFieldAndTheOtherEyeIsMissing(LensMeasure measure) {
        for (Eye eye : Eye.values()) {
            Examination examination = with(measure.field(eye), "+3.50 -0.75 x 180");
            Lens lens = Lens.of(3.50, -0.75, 180);
            assertThat(measure.in(examination, eye)).contains(lens);
            assertThat(measure.in(examination, eye.other())).isEmpty();
            assertThat(measure.in(examination).measured()).containsExactly(lens);
            for (LensMeasure other : EnumSet.complementOf(EnumSet.of(measure))) {
                assertThat(other.in(examination).isEmpty()).isTrue();
            }
        }
    }
}
