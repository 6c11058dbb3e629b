package plusward.handout;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import plusward.course.Course;
import plusward.course.CourseText;

class SheetTests {

    private static final List<String> PROMISES =
            List.of("cure", "guarantee", "will be fine", "no need to worry", "always works");

    /** Every variant that a clinic meets: what is changed of a child who is held with full plus. */
    static Stream<Arguments> variants() {
        return Stream.of(
                Arguments.of("held", new String[] {}),
                Arguments.of("not held at distance", new String[] {"turn_cc_distance=ET 20"}),
                Arguments.of("not held at near", new String[] {"turn_cc_near=E(T) 18"}),
                Arguments.of("not held at all", new String[] {"turn_cc_distance=ET 20", "turn_cc_near=ET 25"}),
                Arguments.of("held through the add", new String[] {
                    "worn_add=2.50",
                    "turn_cc_near=ET 20",
                    "turn_add_near=E 4",
                    "segment_right_mm=-2",
                    "segment_left_mm=-2"
                }),
                Arguments.of("line too low", new String[] {
                    "worn_add=2.50",
                    "turn_cc_near=ET 20",
                    "turn_add_near=ET 14",
                    "segment_right_mm=-5",
                    "segment_left_mm=-5"
                }),
                Arguments.of("add, line not measured", new String[] {"worn_add=2.50", "turn_add_near=E 4"}),
                Arguments.of(
                        "progressive",
                        new String[] {"worn_add=2.50", "turn_add_near=E 4", "segment_style=progressive"}),
                Arguments.of("turned out", new String[] {"turn_cc_distance=XT 14"}),
                Arguments.of("leaning out", new String[] {"turn_cc_distance=X(T) 6"}),
                Arguments.of("nothing measured with glasses", new String[] {"turn_cc_distance=", "turn_cc_near="}),
                Arguments.of("no turn measured without glasses", new String[] {"turn_sc_distance=", "turn_sc_near="}),
                Arguments.of("acuity not measured", new String[] {"acuity_right=", "acuity_left="}),
                Arguments.of("acuity low", new String[] {"acuity_right=20/80", "acuity_left=20/70"}),
                Arguments.of("one eye sees worse", new String[] {"acuity_left=20/100"}),
                Arguments.of(
                        "too young for a chart",
                        new String[] {"acuity_right=fixes and follows", "acuity_left=fixes and follows"}),
                Arguments.of("unequal eyes", new String[] {"cycloplegic_left=+6.00", "worn_left=+6.00"}),
                Arguments.of("one eye refracted", new String[] {"cycloplegic_left="}),
                Arguments.of("worn three hours", new String[] {"wear_hours=3"}),
                Arguments.of("wear not known", new String[] {"wear_hours="}),
                Arguments.of("plus to be changed", new String[] {"ordered_right=+4.50", "ordered_left=+4.50"}),
                Arguments.of("first glasses ordered", new String[] {
                    "worn_right=",
                    "worn_left=",
                    "wear_hours=",
                    "turn_cc_distance=",
                    "turn_cc_near=",
                    "ordered_right=+4.00",
                    "ordered_left=+4.00"
                }),
                Arguments.of("no glasses ordered yet", new String[] {
                    "worn_right=", "worn_left=", "wear_hours=", "turn_cc_distance=", "turn_cc_near="
                }),
                Arguments.of("no next visit", new String[] {"next_visit_weeks="}),
                Arguments.of("high hyperopia", new String[] {
                    "cycloplegic_right=+8.00", "cycloplegic_left=+8.00", "worn_right=+8.00", "worn_left=+8.00"
                }));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("variants")
    void isPlainEnoughToRead(String variant, String[] changes) {
        assertThat(ReadingGrade.of(Sheets.heldBut(changes)).value()).isLessThanOrEqualTo(ReadingGrade.WANTED);
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("variants")
    void hasNoPlaceholderNoPromiseAndNoUnexplainedTerm(String variant, String[] changes) {
        String text = Sheets.text(Sheets.heldBut(changes));
        assertThat(text).doesNotContain("{", "}", "null", "NaN", "??");
        assertThat(text.toLowerCase(Locale.ROOT)).doesNotContain(PROMISES);
        assertThat(text).doesNotContain("cycloplegic", "esotropia", "hyperopia", "dioptre", "bifocal", "strabismus");
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("variants")
    void saysWhenToCallAndThatItDoesNotReplaceAdvice(String variant, String[] changes) {
        Sheet sheet = Sheets.heldBut(changes);
        assertThat(sheet.signs()).hasSize(7);
        assertThat(Sheets.text(sheet)).contains("Do not change or stop the glasses without asking us");
    }

    @Test
    void theExactNumbersAreTheChilds() {
        String numbers = Sheets.heldBut().numbers().toString();
        assertThat(numbers)
                .contains("+4.00 D")
                .contains("ET 30")
                .contains("E 4")
                .contains("20/25");
    }

    @Test
    void aHeldTurnIsSaidAsStraightEyes() {
        assertThat(Sheets.text(Sheets.heldBut())).contains("straight with the glasses on");
    }

    @Test
    void aTurnNotHeldIsNotCalledStraight() {
        assertThat(Sheets.text(Sheets.heldBut("turn_cc_distance=ET 20", "turn_cc_near=ET 25")))
                .doesNotContain("eyes were straight with the glasses on");
    }

    @Test
    void acuityThatWasNotMeasuredIsNotCalledGood() {
        assertThat(Sheets.text(Sheets.heldBut("acuity_right=", "acuity_left="))).doesNotContain("That is good.");
    }

    @Test
    void withoutAddNothingIsSaidOfALine() {
        Sheet sheet = Sheets.heldBut();
        assertThat(sheet.line()).isNull();
        assertThat(Sheets.text(sheet)).doesNotContain("the line");
    }

    @Test
    void withoutVisitOrCycloplegicRefractionNoSheetIsWritten() {
        Course none = new Course(CourseText.patient("2019-05-02"), List.of());
        assertThatThrownBy(() -> Sheets.of("Mara", none, CourseText.DAY)).isInstanceOf(NoTrueSheet.class);
        assertThatThrownBy(() -> Sheets.heldBut("cycloplegic_right=", "cycloplegic_left="))
                .isInstanceOf(NoTrueSheet.class);
    }

    @Test
    void withoutHyperopiaOrWithMinusLensesNoSheetIsWritten() {
        assertThatThrownBy(() -> Sheets.heldBut("cycloplegic_right=plano", "cycloplegic_left=plano"))
                .isInstanceOf(NoTrueSheet.class);
        assertThatThrownBy(() -> Sheets.heldBut("worn_right=-1.00", "worn_left=-1.00"))
                .isInstanceOf(NoTrueSheet.class);
    }
}
