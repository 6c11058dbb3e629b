package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.course.CourseText;

class SuddenLargerTurnTests {

    private static final SuddenLargerTurn RULE = new SuddenLargerTurn();

    /** Hoyt and Good 1995 and later series; each way with its own limits has a test of its own. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            onset | cycloplegic | earlier | distance | near  | answer  | says                   | source
            80    | +1.00       | ET 4    | ET 14    | ET 14 | act     | went from 4 Δ to 14 Δ  | the rise is asked first
            80    | +1.00       | ET 14   | ET 14    | ET 14 | act     | first seen at 80       | then the late onset
            80    | +3.00       | ET 14   | ET 14    | ET 4  | act     | distance exceeds near  | then the excess at distance
            80    | +3.00       | ET 14   | ET 14    | ET 14 | no      | No rise                | none of them
                  | +1.00       | ET 14   | ET 14    | ET 14 | unknown | not on record          | onset is missing
                  | +1.00       | ET 14   | ET 14    | ET 4  | act     | distance exceeds near  | one that is met is enough
            80    | +3.00       | ET 4    | ET 4     |       | unknown | reading with glasses   | near is missing
            """)
    void theFirstWayThatIsMetIsSaid(
            Integer onset,
            String cycloplegic,
            String earlier,
            String distance,
            String near,
            String answer,
            String says,
            String source) {
        assertThat(Judged.latest(RULE, CourseText.course(CourseText.patient("2012-01-01", onset), """
                        visit_date | worn_right | cycloplegic_right | turn_cc_distance | turn_cc_near
                        2024-12-14 | +3.00      | %1$s              | %2$s             |
                        2025-03-14 | +3.00      | %1$s              | %3$s             | %4$s
                        """.formatted(
                                cycloplegic, earlier, distance, near == null ? "" : near))))
                .as(source)
                .answers(answer)
                .says(says);
    }

    @Test
    void aVisitWithoutGlassesShowsNone() {
        assertThat(Judged.by(RULE, "turn_sc_distance=ET 30")).isNotMet();
    }
}
