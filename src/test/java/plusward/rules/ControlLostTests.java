package plusward.rules;

import static plusward.rules.FindingAssert.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ControlLostTests {

    private static final ControlLost RULE = new ControlLost();

    /** A likely real rise: 6 Δ to 20 Δ, 12 Δ above (Pediatric Eye Disease Investigator Group, Arch Ophthalmol 2009;127:59). */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            before   | now     | answer | source
            ET 5.1   | ET 11   | no     | 5.9 is noise
            ET 5     | ET 11   | act    | 6.0 is likely real
            ET 4     | ET 10   | no     | real, and still held
            ET 10    | ET 21.9 | no     | 11.9 is noise over 20
            ET 10    | ET 22   | act    | 12.0 is likely real
            E 8      | ET 11   | no     | it shows now, by a change that may be noise
            ET 12    | ET 20   | no     | was not held before
            XT 2     | ET 11   | act    | held before, whatever the side
            """)
    void wasHeldAndBreaksAtDistanceByARealRise(String before, String now, String answer, String source) {
        assertThat(Judged.latest(RULE, """
                        visit_date | worn_right | cycloplegic_right | turn_cc_distance | turn_cc_near
                        2024-09-14 | +3.00      | +3.00             | %s               | ET 4
                        2025-03-14 | +3.00      |                   | %s               | ET 4
                        """.formatted(before, now))).as(source).answers(answer);
    }

    @Test
    void isRaisedOnlyWhereThePatternTurns() {
        assertThat(Judged.latest(RULE, """
                        visit_date | worn_right | cycloplegic_right | turn_cc_distance | turn_cc_near
                        2024-03-14 | +3.00      | +3.00             | ET 4             | ET 4
                        2024-09-14 | +3.00      |                   | ET 14            | ET 4
                        2025-03-14 | +3.00      |                   | ET 14            | ET 4
                        """)).isNotMet().says("earlier visit");
    }

    @Test
    void isRaisedAgainAfterItWasHeldAgain() {
        assertThat(Judged.latest(RULE, """
                        visit_date | worn_right | cycloplegic_right | turn_cc_distance | turn_cc_near
                        2023-09-14 | +3.00      |                   | ET 4             | ET 4
                        2024-03-14 | +3.00      | +3.00             | ET 14            | ET 4
                        2024-09-14 | +3.00      |                   | ET 5             | ET 4
                        2025-03-14 | +3.00      |                   | ET 14            | ET 4
                        """))
                .isMet(Weight.ACT)
                .says("2024-09-14", "5 Δ", "14 Δ")
                .hasEvidence("distance=14, near=4, limit=10, heldOn=2024-09-14, distanceThen=5");
    }

    @Test
    void carriesTheLadder() {
        Finding finding = Judged.latest(RULE, """
                visit_date | worn_right | cycloplegic_right | turn_cc_distance | turn_cc_near
                2024-09-14 | +3.00      | +3.00             | ET 4             | ET 4
                2025-03-14 | +3.00      |                   | ET 14            | ET 5
                """);
        assertThat(finding).hasChecks(9);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            refracted  | before | distance | near  | answer  | source
            2023-03-14 | ET 4   | ET 14    | ET 4  | act     | refracted 24 months ago
            2023-03-13 | ET 4   | ET 14    | ET 4  | unknown | a refraction of the last 24 months is missing
            2023-03-13 | ET 4   | ET 4     | ET 4  | no      | held
            2023-03-13 | ET 4   | ET 10    | ET 14 | no      | not held at near only
            2023-03-14 | ET 4   |          | ET 14 | unknown | not held at near, distance is missing
            2023-03-14 | ET 14  |          | ET 14 | no      | never held
            2023-03-14 | ET 4   |          | ET 4  | unknown | cannot be judged at all
            2023-03-14 |        | ET 14    | ET 14 | no      | never known to be held
            """)
    void whatIsMissingMayHideIt(
            String refracted, String before, String distance, String near, String answer, String source) {
        assertThat(Judged.latest(RULE, """
                        visit_date | worn_right | cycloplegic_right | turn_cc_distance | turn_cc_near
                        %s         | +3.00      | +3.00             |                  |
                        2024-09-14 | +3.00      |                   | %s               | ET 4
                        2025-03-14 | +3.00      |                   | %s               | %s
                        """.formatted(refracted, text(before), text(distance), text(near))))
                .as(source)
                .answers(answer);
    }

    private static String text(String cell) {
        return cell == null ? "" : cell;
    }
}
