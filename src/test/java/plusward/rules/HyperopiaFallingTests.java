package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class HyperopiaFallingTests {

    private static final HyperopiaFalling RULE = new HyperopiaFalling();

    /**
     * Refractions at 0, 1 and 2 years. The slope is half the change from first to third; its 95 % t interval is wholly below
     * 0 when the middle one lies close to the line. With t = 12.706 (1 degree of freedom) and the middle one off the line by d,
     * half the interval is 12.706 × d × √(2/3) / √2 = 7.34 d.
     */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            first | second | third | answer  | source
            +4.00 | +3.50  | +3.00 | note    | on the line: -0.50 a year
            +4.00 | +3.56  | +3.00 | note    | 0.06 off: half the interval 0.44, slope -0.50
            +4.00 | +3.57  | +3.00 | no      | 0.07 off: half the interval 0.51, slope -0.50
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
            +3.00 | +4.00 | note    | right -0.50   | the right falls
            +4.00 | +3.00 | note    | left -0.50    | the left falls
            +4.00 | +4.00 | no      | No fall       | neither
            +4.00 |       | unknown | both eyes     | no trend in the left
            +3.00 |       | note    | right -0.50   | one eye is enough
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
                        2023-03-14 | +3.50             | +4.50
                        2024-03-13 | +3.00             | +4.00
                        """))
                .says("right -0.50 D/y a year, likely -0.50 D/y to -0.50 D/y, from 3 refractions; left -0.50")
                .hasEvidence("right=-0.50, rightHigh=-0.50, left=-0.50, leftHigh=-0.50, limit=0.00")
                .hasChecks(1);
    }

    /** Halfway from +4.00. */
    private static String middle(String last) {
        return last == null ? "" : last.equals("+3.00") ? "+3.50" : "+4.00";
    }
}
