package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;
import static plusward.rules.Judged.cell;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.course.CourseText;
import plusward.course.Limits;

class TurnNotHeldTests {

    private static final TurnNotHeld RULE = new TurnNotHeld();

    /** L = 10 Δ: J AAPOS 2014;18:261. A latent turn never breaks. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            add  | distance | near    | through add | answer  | source
                 | ET 9.9   | ET 9.9  |             | no      | under the limit
                 | ET 10    | ET 10   |             | no      | at the limit
                 | ET 10.1  | ET 4    |             | act     | over it at distance
                 | ET 4     | E(T) 11 |             | act     | intermittent, at near
                 | E 40     | E 40    |             | no      | latent
                 | XT 40    | ET 40   |             | no      | turned out is another finding
                 | ET 12    |         |             | act     | one that breaks is enough
                 | ET 4     |         |             | unknown | near is missing
                 |          | ET 4    |             | unknown | distance is missing
                 |          |         |             | unknown | both are missing
            2.50 | ET 4     | ET 30   | ET 4        | no      | held through the add
            2.50 | ET 4     | ET 30   | ET 12       | act     | not held through the add
            2.50 | ET 4     | ET 30   |             | unknown | not measured through the add
            """)
    void aTurnThatShowsOverTheLimitIsNotHeld(
            String add, String distance, String near, String throughAdd, String answer, String source) {
        assertThat(judged(add, distance, near, throughAdd)).as(source).answers(answer);
    }

    @Test
    void withoutGlassesItCannotBeTold() {
        assertThat(Judged.by(RULE, "turn_cc_distance=ET 20"))
                .isUndecided()
                .says("cannot be told", "No glasses are on record");
    }

    @Test
    void saysTheReadingsAndCarriesTheLadder() {
        assertThat(judged(null, "ET 14", "ET 4", null))
                .reads("ET 14 at distance, with glasses: over the limit of 10 Δ."
                        + " ET 4 at near, with glasses: held, the limit is 10 Δ.")
                .hasEvidence("distance=14, near=4, limit=10")
                .hasChecks(Ladder.reasons(situation("turn_cc_distance=ET 14", "turn_cc_near=ET 4"))
                        .size());
        assertThat(judged("2.50", "ET 4", "ET 30", "ET 12"))
                .says("ET 12 at near, through the add")
                .hasEvidence("distance=4, nearThroughAdd=12, limit=10");
        assertThat(judged(null, "ET 4", "ET 4", null)).says("held, the limit is 10 Δ");
    }

    private static Situation situation(String... turns) {
        String[] entries = {"worn_right=+3.00", turns[0], turns[1]};
        return Situation.of(CourseText.visit(entries), CourseText.DAY, Limits.DEFAULT);
    }

    private static Finding judged(String add, String distance, String near, String throughAdd) {
        return Judged.by(
                RULE,
                "worn_right=+3.00",
                cell("worn_add", add),
                cell("turn_cc_distance", distance),
                cell("turn_cc_near", near),
                cell("turn_add_near", throughAdd));
    }
}
