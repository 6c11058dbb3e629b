package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;
import static plusward.rules.Judged.cell;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NearGapTests {

    private static final NearGap RULE = new NearGap();

    /** Near minus distance of 10 Δ or more with plus on: Ludwig et al. 1988. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            distance | near    | add  | answer  | source
            E 4      | E 13.9  |      | no      | 9.9
            E 4      | E 14    |      | look    | 10.0, near held
            ET 4     | ET 14   |      | act     | 10.0, near not held, no add
            ET 12    | ET 22   |      | act     | not held at both, no add
            ET 4     | ET 14   | 2.50 | look    | an add is worn
            X 4      | E 6     |      | look    | from outward to inward: 10
            ET 14    | ET 4    |      | no      | distance is larger
            ET 4     |         |      | unknown | near is missing
                     | ET 14   |      | unknown | distance is missing
            """)
    void nearExceedsDistance(String distance, String near, String add, String answer, String source) {
        assertThat(judged("+3.00", "+3.00", distance, near, add)).as(source).answers(answer);
    }

    /** Full plus: no more than 0.50 D short in either eye (common practice, no source). */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            worn  | cycloplegic | near  | answer  | source
            +3.00 | +3.50       | ET 14 | act     | 0.50 short is full
            +3.00 | +3.51       | ET 14 | no      | 0.51 short: not judged
            +3.00 |             | ET 14 | unknown | not known
            +3.00 |             | ET 13 | no      | no gap, whatever is worn
                  | +3.00       | ET 14 | no      | no glasses on record
            """)
    void fullPlusIsOn(String worn, String cycloplegic, String near, String answer, String source) {
        assertThat(judged(worn, cycloplegic, "ET 4", near, null)).as(source).answers(answer);
    }

    @Test
    void saysTheNumbers() {
        assertThat(judged("+3.00", "+3.00", "ET 4", "ET 24", null))
                .says("24 Δ at near, 4 Δ at distance, a gap of 20 Δ", "from 10 Δ")
                .hasEvidence("distance=4, near=24, gap=20, limit=10")
                .hasChecks(2);
        assertThat(judged("+3.00", "+3.00", "ET 4", "ET 6", null)).says("by 2 Δ", "from 10 Δ");
        assertThat(judged("+2.00", "+3.00", "ET 4", "ET 24", null)).says("Full plus is not on");
    }

    private static Finding judged(String worn, String cycloplegic, String distance, String near, String add) {
        return Judged.by(
                RULE,
                cell("worn_right", worn),
                cell("worn_left", worn),
                cell("worn_add", add),
                cell("cycloplegic_right", cycloplegic),
                cell("cycloplegic_left", cycloplegic),
                cell("turn_cc_distance", distance),
                cell("turn_cc_near", near),
                add == null ? "turn_add_near=" : "turn_add_near=E 2");
    }
}
