package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;
import static plusward.rules.Judged.cell;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.course.CourseText;
import plusward.course.Limits;
import plusward.exam.HoursPerDay;
import plusward.optics.Millimetres;
import plusward.optics.PrismDioptres;

class WearShortTests {

    /** 8 hours a day: common practice, no source. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            worn  | hours | near  | answer  | source
            +3.00 | 8.01  | E 4   | no      | over it
            +3.00 | 8     | E 4   | no      | at it
            +3.00 | 7.99  | E 4   | look    | under it, held
            +3.00 | 7.99  | ET 12 | act     | under it, not held
            +3.00 | 0     | E 4   | look    | never
            +3.00 |       | ET 12 | unknown | not written down
                  | 2     | ET 12 | no      | no glasses on record
            """)
    void glassesAreWornLongEnough(String worn, String hours, String near, String answer, String source) {
        assertThat(Judged.by(
                        new WearShort(),
                        cell("worn_right", worn),
                        cell("wear_hours", hours),
                        "turn_cc_distance=E 2",
                        cell("turn_cc_near", near)))
                .as(source)
                .answers(answer);
    }

    @Test
    void saysTheHoursAndTheClinicsOwnLimit() {
        assertThat(Judged.by(new WearShort(), "worn_right=+3.00", "wear_hours=4"))
                .says("Worn 4 ", "≥ 8 ")
                .hasEvidence("wear=4, limit=8")
                .hasChecks(2);
        assertThat(Judged.by(new WearShort(), "worn_right=+3.00", "wear_hours=9"))
                .says("Worn 9 ");
        Limits limits =
                new Limits(PrismDioptres.of(10), Millimetres.of(1), Millimetres.of(4.5), HoursPerDay.of(10), 8, 12, 90);
        assertThat(Judged.by(
                        new WearShort(),
                        CourseText.visit("worn_right=+3.00", "wear_hours=9.99"),
                        CourseText.DAY,
                        limits))
                .isMet(Weight.LOOK);
    }
}
