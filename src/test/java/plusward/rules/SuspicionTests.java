package plusward.rules;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.course.CourseText;
import plusward.course.Visit;
import plusward.exam.Field;

class SuspicionTests {

    /** Our own choice, no source: both spheres 1.00 D or more and of opposite sign. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            before            | now               | asked | source
            +3.50             | -3.50             | true  | the sign alone
            +1.00             | -1.00             | true  | both at the limit
            +0.99             | -3.50             | false | the earlier one just under it
            +3.50             | -0.99             | false | this one just under it
            +3.50             | +3.50             | false | the same
            -3.50             | +3.50             | true  | the other way round
            +3.50 -1.00 x 180 | -4.50 +1.00 x 90  | true  | compared in the same cylinder form
                              | -3.50             | false | nothing to compare with
            """)
    void aSphereOfTheOtherSignIsAskedAbout(String before, String now, boolean asked, String source) {
        for (String measure : List.of("worn", "made", "cycloplegic", "manifest", "ordered")) {
            for (String eye : List.of("right", "left")) {
                String column = measure + "_" + eye;
                assertThat(suspected(column, before, now))
                        .as("%s, %s", source, column)
                        .isEqualTo(asked ? List.of("sign-flipped " + column) : List.of());
            }
        }
    }

    @Test
    void theLastVisitThatHasTheLensIsComparedWith() {
        assertThat(codes("""
                        visit_date | worn_right
                        2024-03-14 | +3.50
                        2024-06-14 |
                        2024-09-14 | -3.50
                        """)).containsExactly("sign-flipped worn_right");
    }

    /** Our own choice, no source: each within 0.50 D of the other eye's earlier lens, one 1.00 D or more from its own. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            right before      | left before      | right now         | left now          | asked | source
            +5.00             | +3.00            | +3.00             | +5.00             | true  | exchanged
            +5.00             | +3.00            | +3.50             | +5.50             | true  | 0.50 D from the other eye's
            +5.00             | +3.00            | +3.51             | +5.00             | false | 0.51 D from it
            +4.00             | +3.00            | +3.00             | +4.00             | true  | the eyes 1.00 D apart
            +3.99             | +3.00            | +3.00             | +3.99             | false | the eyes 0.99 D apart
            +5.00             | +3.00            | +5.00             | +3.00             | false | as before
            +3.00 -2.00 x 20  | +3.00 -2.00 x 160 | +3.00 -2.00 x 160 | +3.00 -2.00 x 20 | true  | only the axes tell the eyes apart
            +5.00             |                  | +3.00             | +5.00             | false | one eye was missing
            """)
    void eyesThatLookExchangedAreAskedAbout(
            String rightBefore, String leftBefore, String rightNow, String leftNow, boolean asked, String source) {
        assertThat(codes("""
                        visit_date | cycloplegic_right | cycloplegic_left
                        2024-03-14 | %s                | %s
                        2025-03-14 | %s                | %s
                        """.formatted(rightBefore, leftBefore == null ? "" : leftBefore, rightNow, leftNow)))
                .as(source)
                .isEqualTo(asked ? List.of("sides-exchanged cycloplegic_right") : List.of());
    }

    @Test
    void aLensmeterReadingOfTheOtherSideIsAskedAbout() {
        assertThat(codes(
                        CourseText.visit("worn_right=+5.00", "worn_left=+3.00", "made_right=+3.12", "made_left=+5.00")))
                .containsExactly("sides-exchanged made_right");
    }

    /** 0.25 D, as the rulebook has it. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            cycloplegic | manifest | asked | source
            +3.00       | +3.25    | false | 0.25 D under
            +3.00       | +3.26    | true  | 0.26 D under
            +3.00       | +2.00    | false | more plus, as is usual
            +3.00       |          | false | nothing to compare with
            """)
    void lessPlusUnderCycloplegiaIsAskedAbout(String cycloplegic, String manifest, boolean asked, String source) {
        String found = manifest == null ? "" : manifest;
        assertThat(codes(CourseText.visit("cycloplegic_left=" + cycloplegic, "manifest_left=" + found)))
                .as(source)
                .isEqualTo(asked ? List.of("under-manifest cycloplegic_left") : List.of());
    }

    /** Our own choice, no source: twice the last comparable reading, which was 10 Δ or more. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            before  | now     | asked | source
            ET 10   | ET 20   | true  | just twice
            ET 10   | ET 19.9 | false | just under twice
            ET 9.9  | ET 30   | false | the earlier one under 10 Δ
            XT 12   | XT 25   | true  | outward too
            XT 12   | ET 25   | false | the other side is another matter
            ET 15   | ET 15+16 | true | 31.7 Δ in all
            """)
    void aTurnThatHasDoubledIsAskedAbout(String before, String now, boolean asked, String source) {
        for (String column : List.of("turn_sc_distance", "turn_cc_near", "turn_add_near", "turn_trial_near")) {
            assertThat(suspected(column, before, now))
                    .as("%s, %s", source, column)
                    .isEqualTo(asked ? List.of("turn-doubled " + column) : List.of());
        }
    }

    @Test
    void laterVisitsDoNotCount() {
        var course = CourseText.course(Judged.BORN, """
                visit_date | worn_right
                2024-03-14 | +3.50
                2024-06-14 | -3.50
                """);
        assertThat(codes(course.visits().get(0))).isEmpty();
    }

    @Test
    void aConfirmationIsForTheTextThatWasAskedAbout() {
        Suspicion first = suspicion("ET 20");
        assertThat(first.token()).isEqualTo("turn-doubled:turn_cc_near:ET 20");
        assertThat(suspicion("ET 22").token()).isNotEqualTo(first.token());
        assertThat(first.field()).isEqualTo(Field.TURN_CC_NEAR);
        assertThat(Worded.of(first.because()))
                .isEqualTo("20 Δ after 10 Δ on 2024-03-14: it has doubled. Is it the total, and not added twice?");
    }

    private static Suspicion suspicion(String now) {
        return Suspicion.at(latest("""
                visit_date | turn_cc_near
                2024-03-14 | ET 10
                2025-03-14 | %s
                """.formatted(now))).get(0);
    }

    private static List<String> suspected(String column, String before, String now) {
        return codes("""
                visit_date | %s
                2024-03-14 | %s
                2025-03-14 | %s
                """.formatted(column, before == null ? "" : before, now));
    }

    private static List<String> codes(String table) {
        return codes(latest(table));
    }

    private static Visit latest(String table) {
        return CourseText.course(Judged.BORN, table).latest().orElseThrow();
    }

    private static List<String> codes(Visit visit) {
        return Suspicion.at(visit).stream()
                .map(each -> each.code() + " " + each.field().column())
                .toList();
    }
}
