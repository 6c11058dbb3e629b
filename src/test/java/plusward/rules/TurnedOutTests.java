package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;
import static plusward.rules.Judged.cell;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class TurnedOutTests {

    /** L = 10 Δ: J AAPOS 2014;18:261. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            worn  | add  | distance | near    | through add | answer  | source
            +3.00 |      | XT 9.9   | ortho   |             | no      | under the limit
            +3.00 |      | XT 10    | ortho   |             | no      | at the limit
            +3.00 |      | XT 10.1  | ortho   |             | act     | over it
            +3.00 |      | ortho    | X(T) 11 |             | act     | intermittent, at near
            +3.00 | 2.50 | ortho    | ortho   | XT 11       | act     | through the add
            +3.00 |      | X 40     | X 40    |             | no      | latent
            +3.00 |      | ET 40    | ET 40   |             | no      | inward
            +3.00 |      | XT 11    |         |             | act     | one is enough
            +3.00 |      | ET 4     |         |             | unknown | near is missing
            +3.00 |      |          | ET 4    |             | unknown | distance is missing
            +3.00 | 2.50 | ET 4     | ET 4    |             | unknown | near through the add is missing
            +3.00 | 2.50 | ET 4     |         | ET 4        | no      | near is judged through the add
            +3.00 |      |          |         |             | unknown | nothing was measured
                  |      | XT 20    | XT 20   |             | no      | no glasses on record
            """)
    void anOutwardTurnShowsOverTheLimit(
            String worn, String add, String distance, String near, String throughAdd, String answer, String source) {
        assertThat(judged(worn, add, distance, near, throughAdd)).as(source).answers(answer);
    }

    @Test
    void saysEveryReadingThatShowsOutward() {
        assertThat(judged("+3.00", "2.50", "XT 12", "X(T) 4", "ortho"))
                .reads("XT 12 at distance, with glasses; X(T) 4 at near, with glasses: an outward turn that shows,"
                        + " over the limit (≤ 10 Δ).")
                .hasEvidence("distance=-12, near=-4, limit=10")
                .hasChecks(3);
        assertThat(judged("+3.00", "2.50", null, null, "XT 12")).hasEvidence("nearThroughAdd=-12, limit=10");
        assertThat(judged("+3.00", null, "ET 4", "ET 4", null)).says("No outward turn over the limit");
        assertThat(judged("+3.00", null, "ET 4", null, null)).says("cannot be excluded");
    }

    private static Finding judged(String worn, String add, String distance, String near, String throughAdd) {
        return Judged.by(
                new TurnedOut(),
                cell("worn_right", worn),
                cell("worn_add", add),
                cell("turn_cc_distance", distance),
                cell("turn_cc_near", near),
                cell("turn_add_near", throughAdd));
    }
}
