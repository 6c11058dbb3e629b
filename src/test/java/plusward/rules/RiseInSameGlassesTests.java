package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class RiseInSameGlassesTests {

    private static final RiseInSameGlasses RULE = new RiseInSameGlasses();

    /** A likely real rise: Pediatric Eye Disease Investigator Group, Arch Ophthalmol 2009;127:59. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            column           | before | now     | answer | source
            turn_cc_distance | ET 14  | ET 19.9 | no     | 5.9 is noise
            turn_cc_distance | ET 14  | ET 20   | act    | 6.0 is likely real
            turn_cc_near     | ET 30  | ET 41.9 | no     | 11.9 is noise over 20
            turn_cc_near     | ET 30  | ET 42   | act    | 12.0 is likely real
            turn_add_near    | ET 2   | ET 8    | act    | through the add, held or not
            turn_sc_distance | ET 14  | ET 30   | no     | without glasses it does not count
            turn_cc_distance | ET 20  | ET 14   | no     | a fall
            turn_cc_distance | XT 10  | ET 2    | act    | inward of before, by 12
            turn_cc_distance |        | ET 20   | no     | nothing to compare with
            turn_cc_distance | ET 14  |         | no     | nothing now
            """)
    void aLikelyRealRise(String column, String before, String now, String answer, String source) {
        assertThat(Judged.latest(RULE, """
                        visit_date | worn_right | cycloplegic_right | %s
                        2024-12-14 | +3.00      | +3.00             | %s
                        2025-03-14 | +3.00      | +3.00             | %s
                        """.formatted(column, text(before), text(now))))
                .as(source)
                .answers(answer);
    }

    /** Unchanged within 0.50 D, 6 months: common practice, no source. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            refracted  | right then        | left then | right now        | left now | answer  | source
            2024-09-14 | +3.00             | +3.00     | +3.50            | +2.50    | act     | 0.50 in either direction, 6 months before
            2024-09-13 | +3.00             | +3.00     | +3.00            | +3.00    | unknown | a day over 6 months before
            2024-12-14 | +3.00             | +3.00     | +3.51            | +3.00    | no      | 0.51 more, right
            2024-12-14 | +3.00             | +3.00     | +3.00            | +2.49    | no      | 0.51 less, left
            2024-12-14 | +3.50 -1.00 x 180 |           | +2.50 +1.00 x 90 |          | act     | +3.00 in either cylinder form
            2024-12-14 | +3.00             |           |                  | +3.00    | unknown | no eye was refracted twice
            2024-12-14 | +3.00             | +3.00     | +3.00            |          | act     | one eye was refracted twice
            2024-12-14 | +3.00             | +3.00     |                  |          | unknown | refracted once
            """)
    void hyperopiaIsTheSame(
            String refracted, String r1, String l1, String r2, String l2, String answer, String source) {
        assertThat(Judged.latest(RULE, """
                        visit_date | worn_right | cycloplegic_right | cycloplegic_left | turn_cc_near
                        2024-09-10 | +3.00      |                   |                  | ET 4
                        %s         | +3.00      | %s                | %s               |
                        2025-03-14 | +3.00      | %s                | %s               | ET 14
                        """.formatted(refracted, text(r1), text(l1), text(r2), text(l2))))
                .as(source)
                .answers(answer);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            worn then | since then | worn now | since now  | answer | source
            +3.00     | 2024-01-01 | +3.00    | 2024-01-01 | act    | the same pair
            +3.00     |            | +3.00    |            | act    | the same powers, dates not known
            +3.00     | 2024-01-01 | +3.00    | 2025-01-01 | no     | a new pair of the same powers
            +3.00     |            | +3.25    |            | no     | other powers
            """)
    void theGlassesAreTheSame(
            String then, String sinceThen, String now, String sinceNow, String answer, String source) {
        assertThat(Judged.latest(RULE, """
                        visit_date | worn_right | worn_since | cycloplegic_right | turn_cc_near
                        2024-12-14 | %s         | %s         | +3.00             | ET 4
                        2025-03-14 | %s         | %s         | +3.00             | ET 14
                        """.formatted(then, text(sinceThen), now, text(sinceNow))))
                .as(source)
                .answers(answer);
    }

    @Test
    void saysTheReadingsAndCarriesTheRefractions() {
        assertThat(Judged.latest(RULE, """
                        visit_date | worn_right | cycloplegic_right | cycloplegic_left | turn_cc_near
                        2024-12-14 | +3.00      | +3.00             | +3.25            | ET 4
                        2025-03-14 | +3.00      | +3.25             | +3.00            | ET 14
                        """))
                .says("At near, with glasses the turn went from 4 Δ to 14 Δ since 2024-12-14")
                .hasEvidence("before=4, after=14, since=2024-12-14, limit=6, cycloplegicOn=2025-03-14,"
                        + " cycloplegicRight=+3.25, cycloplegicLeft=+3.00, earlierOn=2024-12-14,"
                        + " earlierRight=+3.00, earlierLeft=+3.25")
                .hasChecks(3);
    }

    @Test
    void saysThatHyperopiaIsNotKnown() {
        assertThat(Judged.latest(RULE, """
                        visit_date | worn_right | turn_cc_distance
                        2024-12-14 | +3.00      | ET 4
                        2025-03-14 | +3.00      | ET 14
                        """))
                .isUndecided()
                .says("At distance, with glasses the turn went from 4 Δ to 14 Δ", "no two cycloplegic refractions");
    }

    private static String text(String cell) {
        return cell == null ? "" : cell;
    }
}
