package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;
import static plusward.rules.Judged.cell;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class LensesOffOrderTests {

    private static final LensesOffOrder RULE = new LensesOffOrder();

    /** ANSI Z80.1: ±0.13 D to 6.50, add ±0.12 D; every limit of the standard has its rows beside the standard. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            right             | left  | add  | read right       | read left | read add | answer  | source
            +5.00             | +5.00 |      | +5.12            | +5.12     |          | no      | 0.12 more
            +5.00             | +5.00 |      | +5.13            | +5.13     |          | no      | 0.13 more
            +5.00             | +5.00 |      | +5.14            | +5.00     |          | look    | 0.14 more, right
            +5.00             | +5.00 |      | +5.00            | +5.14     |          | look    | 0.14 more, left
            +4.50 -1.00 x 180 | +5.00 |      | +3.50 +1.00 x 90 | +5.00     |          | no      | read in plus cylinder
            +3.50 +1.00 x 90  | +5.00 |      | +4.50 -1.00 x 4  | +5.00     |          | look    | axis 4° off at 1.00 D
            +5.00             | +4.00 |      | +4.00            | +5.00     |          | look    | right and left exchanged
            +5.00             | +5.00 | 2.50 | +5.00            | +5.00     | 2.62     | no      | add 0.12 more
            +5.00             | +5.00 | 2.50 | +5.00            | +5.00     | 2.63     | look    | add 0.13 more
            +5.00             | +5.00 | 2.50 | +5.00            | +5.00     |          | unknown | the add was not read
            +5.00             | +5.00 |      | +5.00            | +5.00     | 0.12     | no      | no add ordered, none to speak of read
            +5.00             | +5.00 |      | +5.00            | +5.00     | 2.50     | look    | an add that was not ordered
            +5.00             | +5.00 |      | +5.00            |           |          | unknown | the left was not read
            +5.00             | +5.00 |      |                  | +5.00     |          | unknown | the right was not read
            +5.00             |       |      | +5.00            | +5.00     |          | unknown | no left order on record
            +5.00             | +5.00 |      |                  |           |          | unknown | nothing was read
            +5.00             | +5.00 |      | +5.14            |           |          | look    | one eye is enough
                              |       |      | +5.00            | +5.00     |          | no      | no glasses on record
            """)
    void lensesAreAsOrdered(
            String right,
            String left,
            String add,
            String readRight,
            String readLeft,
            String readAdd,
            String answer,
            String source) {
        assertThat(Judged.by(
                        RULE,
                        cell("worn_right", right),
                        cell("worn_left", left),
                        cell("worn_add", add),
                        cell("made_right", readRight),
                        cell("made_left", readLeft),
                        cell("made_add", readAdd)))
                .as(source)
                .answers(answer);
    }

    @Test
    void asksForADecisionWhenTheTurnIsNotHeld() {
        assertThat(Judged.by(RULE, "worn_right=+5.00", "made_right=+4.00", "turn_cc_distance=ET 20"))
                .isMet(Weight.ACT);
    }

    @Test
    void saysEveryFaultAndCarriesOrderAndReading() {
        assertThat(Judged.by(
                        RULE,
                        "worn_right=+5.00",
                        "worn_left=+4.00",
                        "worn_add=2.50",
                        "made_right=+5.00 -0.50 x 90",
                        "made_left=+4.00",
                        "made_add=2.00"))
                .reads("By lensmeter: right the meridian with less plus reads +4.50 D, ordered +5.00 D: off by 0.50 D"
                        + " (allowed ≤ 0.13 D); right the cylinder reads 0.50 D, ordered 0.00 D: off by 0.50 D"
                        + " (allowed ≤ 0.13 D); the add reads +2.00 D, ordered +2.50 D (allowed off by ≤ 0.12 D).")
                .hasEvidence("orderedRight=+5.00, madeRight=+5.00 -0.50 x 90, orderedLeft=+4.00, madeLeft=+4.00,"
                        + " orderedAdd=+2.50, madeAdd=+2.00")
                .hasChecks(2);
        assertThat(Judged.by(RULE, "worn_right=+5.00", "worn_left=+5.00", "made_right=+5.00", "made_left=+5.00"))
                .says("as ordered within ANSI Z80.1");
        assertThat(Judged.by(RULE, "worn_right=+5.00")).says("missing or not complete");
        assertThat(Judged.by(RULE)).says("No glasses");
    }

    @Test
    void namesTheLeftEye() {
        assertThat(Judged.by(RULE, "worn_left=+5.00", "made_left=+6.00")).says("left the meridian with more plus");
    }
}
