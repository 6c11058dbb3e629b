package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class HyperopiaFallingTests {

    private static final HyperopiaFalling RULE = new HyperopiaFalling();

    /**
     * Refractions at 0, 1 and 2 years. The slope is half the change from first to third. With t = 12.706 (1 degree of freedom)
     * and the middle one off the line by d, half its 95 % interval is 12.706 × d × √(2/3) / √2 = 7.34 d, and never under
     * 12.706 × 0.0722 / √2 = 0.65, which the steps of a refraction cause by themselves.
     */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            first | second | third | answer  | source
            +4.00 | +3.35  | +2.70 | note    | on the line: slope -0.65, half the interval just under 0.65
            +4.00 | +3.36  | +2.72 | no      | on the line: slope -0.64, half the interval 0.65
            +4.00 | +3.13  | +2.00 | note    | 0.13 off: half the interval 0.95, slope -1.00
            +4.00 | +3.14  | +2.00 | no      | 0.14 off: half the interval 1.03, slope -1.00
            +3.00 | +3.50  | +4.00 | no      | rising
            +3.00 | +3.00  | +3.00 | no      | level
            +4.00 |        | +3.00 | unknown | two refractions are no trend
            """)
    void theIntervalLiesWhollyBelowZero(String first, String second, String third, String answer, String source) {
        String table = """
                visit_date | cycloplegic_right | cycloplegic_left
                2022-03-14 | %1$s              | %1$s
                2023-03-14 | %2$s              | %2$s
                2024-03-13 | %3$s              | %3$s
                """.formatted(first, second == null ? "" : second, third);
        assertThat(Judged.latest(RULE, table)).as(source).answers(answer);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            right | left  | answer  | says          | source
            +2.00 | +4.00 | note    | right -1.00   | the right falls
            +4.00 | +2.00 | note    | left -1.00    | the left falls
            +4.00 | +4.00 | no      | No fall       | neither
            +4.00 |       | unknown | both eyes     | no trend in the left
            +2.00 |       | note    | right -1.00   | one eye is enough
            """)
    void eitherEyeCounts(String right, String left, String answer, String says, String source) {
        assertThat(Judged.latest(RULE, """
                        visit_date | cycloplegic_right | cycloplegic_left
                        2022-03-14 | +4.00             | +4.00
                        2023-03-14 | %1$s              | %2$s
                        2024-03-13 | %3$s              | %4$s
                        """.formatted(middle(right), middle(left), right, left == null ? "" : left)))
                .as(source)
                .answers(answer)
                .says(says);
    }

    @Test
    void saysTheSlopeItsIntervalAndTheNumberOfRefractions() {
        assertThat(Judged.latest(RULE, """
                        visit_date | cycloplegic_right | cycloplegic_left
                        2022-03-14 | +4.00             | +5.00
                        2023-03-14 | +3.00             | +4.00
                        2024-03-13 | +2.00             | +3.00
                        """))
                .says("right -1.00 D/y, likely -1.65 D/y to -0.35 D/y, from 3 refractions; left -1.00")
                .hasEvidence("right=-1.00, rightHigh=-0.35, left=-1.00, leftHigh=-0.35, limit=0.00")
                .hasChecks(1);
    }

    /** Halfway from +4.00. */
    private static String middle(String last) {
        return last == null ? "" : last.equals("+2.00") ? "+3.00" : "+4.00";
    }
}
