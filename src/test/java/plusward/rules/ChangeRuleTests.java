package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;

import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.course.Course;
import plusward.course.CourseText;
import plusward.exam.TurnCondition;

class ChangeRuleTests {

    /** Pediatric Eye Disease Investigator Group, Arch Ophthalmol 2009;127:59. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            before  | after   | real | noise | source
            ET 14   | ET 19   | no   | note  | 5
            ET 14   | ET 19.9 | no   | note  | 5.9
            ET 14   | ET 20   | note | no    | 6.0
            ET 20   | ET 14   | note | no    | a fall
            ET 30   | ET 41   | no   | note  | 11
            ET 30   | ET 41.9 | no   | note  | 11.9
            ET 30   | ET 42   | note | no    | 12.0
            ET 18   | ET 26   | no   | note  | the larger angle rules
            ET 8    | ET 8    | no   | note  | no change at all
            E 2     | ET 8    | note | no    | under 10: extrapolated
            XT 4    | ET 4    | note | no    | from outward to inward by 8
                    | ET 8    | unknown | unknown | nothing before
            ET 8    |         | unknown | unknown | nothing now
            """)
    void aChangeIsRealOrNoise(String before, String after, String real, String noise, String source) {
        for (String column : List.of("turn_cc_distance", "turn_cc_near", "turn_add_near")) {
            TurnCondition condition = TurnCondition.valueOf(column.substring(5).toUpperCase(Locale.ROOT));
            Course course = CourseText.course(
                    Judged.BORN, """
                    visit_date | worn_right | worn_add | %s
                    2024-03-14 | +3.00      | 2.50     | %s
                    2025-03-14 | +3.00      | 2.50     | %s
                    """.formatted(column, before == null ? "" : before, after == null ? "" : after));
            assertThat(Judged.latest(new ChangeRule(condition, true), course))
                    .as(source)
                    .answers(real);
            assertThat(Judged.latest(new ChangeRule(condition, false), course))
                    .as(source)
                    .answers(noise);
        }
    }

    @Test
    void comparesLikeWithLike() {
        String table = """
                visit_date | worn_right | turn_cc_distance | turn_cc_near | turn_sc_distance
                2024-03-14 | +3.00      | ET 4             | ET 14        | ET 30
                2024-09-14 | +3.00      |                  | ET 15        | ET 30
                2025-03-14 | +3.00      | ET 14            |              |
                """;
        assertThat(Judged.latest(new ChangeRule(TurnCondition.CC_DISTANCE, true), table))
                .says("from 4 Δ to 14 Δ since 2024-03-14");
        assertThat(Judged.latest(new ChangeRule(TurnCondition.CC_NEAR, true), table))
                .isUndecided();
    }

    @Test
    void saysTheLimitTheGlassesAndWhetherItIsExtrapolated() {
        assertThat(Judged.latest(new ChangeRule(TurnCondition.CC_NEAR, true), """
                        visit_date | worn_right | turn_cc_near
                        2024-03-14 | +3.00      | ET 14
                        2025-03-14 | +3.00      | ET 4
                        """))
                .reads("At near, with glasses: from 14 Δ to 4 Δ since 2024-03-14. From 6 Δ a change is likely real."
                        + " The glasses are the same. By published repeatability of the prism and cover test.")
                .hasEvidence("condition=cc-near, since=2024-03-14, before=14, after=4, limit=6")
                .hasChecks(0);
        assertThat(Judged.latest(new ChangeRule(TurnCondition.CC_NEAR, false), """
                        visit_date | worn_right | turn_cc_near
                        2024-03-14 | +2.00      | ET 4
                        2025-03-14 | +3.00      | ET 9
                        """))
                .isMet(Weight.NOTE)
                .says("Under 6 Δ a change cannot be told from noise", "glasses were changed", "extrapolated");
    }

    @Test
    void throughAnAddThatIsNotWornNothingIsMissing() {
        assertThat(Judged.by(new ChangeRule(TurnCondition.ADD_NEAR, true), "worn_right=+3.00"))
                .isNotMet()
                .says("No add is worn");
        assertThat(Judged.by(new ChangeRule(TurnCondition.CC_NEAR, true), "worn_right=+3.00"))
                .isUndecided()
                .says("near, with glasses");
        assertThat(Judged.by(new ChangeRule(TurnCondition.ADD_NEAR, true), "worn_right=+3.00", "worn_add=2.50"))
                .isUndecided();
    }
}
