package plusward.rules;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.course.CourseText;
import plusward.course.Limits;
import plusward.course.Visit;

class LadderTests {

    @Test
    void namesEveryLineInOrderWithTheChildsOwnNumbers() {
        assertThat(lines("""
                        visit_date | worn_right | worn_left | worn_add | worn_since | wear_hours | made_right | made_left | made_add | cycloplegic_right | cycloplegic_left | manifest_right | manifest_left | turn_cc_distance | turn_cc_near | turn_add_near | segment_style | segment_right_mm | segment_left_mm | pupil_mm
                        2025-01-14 | +3.00      | +3.00     | 2.50     | 2024-06-01 | 10         |            |           |          | +3.25             | +3.25            | +2.00          | +2.00         | E 4              | ET 20        | ET 4          | round         | -2               | -2              | 4
                        2025-03-14 | +3.00      | +3.00     | 2.50     | 2024-06-01 | 10         | +3.00      | +3.00     | 2.50     |                   |                  |                |               | E 4              | ET 20        | ET 14         | round         | -3.5             | -2              | 4
                        """))
                .containsExactly(
                        "Ruled out: Worn 10 h/day (asked for: ≥ 8 h/day).",
                        "Ruled out: By lensmeter both lenses are as ordered within ANSI Z80.1.",
                        "Ruled out: These glasses are worn since 2024-06-01, longer than the 8 weeks in which a turn settles.",
                        "Ruled out: Worn plus is as strong as the latest cycloplegic refraction within the allowance (≤ 0.50 D).",
                        "Ruled out: The last cycloplegic refraction is of 2025-01-14; due after 3 months.",
                        "Ruled out: The cycloplegic refraction of 2025-01-14 agrees with the manifest one of that day or a"
                                + " cycloplegic one of the 6 months before.",
                        "Found: The segment top lies below the pupil’s lower edge by right +1.5 mm, left 0.0 mm"
                                + " (pupil 4.0 mm measured; allowed ≤ 1.0 mm).",
                        "Ruled out: Near was measured through the add.",
                        "Ruled out: At near, through the add the turn went from 4 Δ to 14 Δ since 2025-01-14: more than"
                                + " measurement noise.",
                        "Ask and look: Signs that ask for urgent examination: limited abduction, nystagmus, swollen discs,"
                                + " headache or vomiting, unsteadiness, double vision; a turn with little hyperopia, or not"
                                + " lowered by full plus.",
                        "Ask and look: What is left, the doctor weighs.");
    }

    @Test
    void saysOfEachLineThatItIsNotKnown() {
        assertThat(lines("""
                        visit_date | worn_right | turn_cc_distance
                        2025-03-14 | +3.00      | ET 20
                        """))
                .containsExactly(
                        "Not known: Hours a day were not written down.",
                        "Not known: The lensmeter reading of these glasses is missing or not complete.",
                        "Not known: It is not known since when these glasses are worn; a turn settles within 8 weeks or so.",
                        "Not known: Worn plus cannot be compared in both eyes: a lens or a cycloplegic refraction of the last"
                                + " 24 months is missing.",
                        "Found: No cycloplegic refraction is on record.",
                        "Not known: There is no earlier reading at distance, with glasses to tell a change from noise.",
                        lines("visit_date\n2025-03-14").get(5),
                        "Ask and look: What is left, the doctor weighs.");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            since      | line                                            | source
            2025-01-17 | Ruled out: These glasses are worn since         | 8 weeks to the day
            2025-01-18 | Found: These glasses are worn since 2025-01-18, less than the 8 weeks | a day less
                       | Not known: It is not known since when           | not on record
            """)
    void glassesNeedTimeToSettle(String since, String line, String source) {
        assertThat(lines("""
                        visit_date | worn_right | worn_since | turn_cc_distance
                        2025-03-14 | +3.00      | %s         | ET 20
                        """.formatted(since == null ? "" : since))).as(source).anyMatch(each -> each.startsWith(line));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            add  | style       | near  | through add | right (mm) | first line                    | second line                          | source
                 |             | ET 20 |             |            | Found: Near is not held       |                                      | no add
                 |             | ET 4  |             |            |                               |                                      | near is held
                 |             |       |             |            |                               |                                      | near is not known, no add
            2.50 | round       | ET 20 | ET 20       | -2         | Ruled out: The segment top    | Ruled out: Near was measured through | all three
            2.50 | round       | ET 20 | ET 20       | -9         | Found: The segment top        | Ruled out: Near was measured through | too low
            2.50 | round       | ET 20 | ET 20       |            | Not known: Where the segment  | Ruled out: Near was measured through | height missing
            2.50 | round       | ET 20 |             | -9         | Found: The segment top        | Not known: Near was not measured     | not through the add
            2.50 | progressive | ET 20 | ET 20       | -9         | Not known: A progressive lens | Ruled out: Near was measured through | no line
            2.50 | round       | ET 20 | ET 4        | -9         |                               |                                      | held through the add
            """)
    void nearIsAskedOnlyWhereItIsNotHeldOrNotKnown(
            String add,
            String style,
            String near,
            String throughAdd,
            String height,
            String first,
            String second,
            String source) {
        List<String> found =
                lines("""
                visit_date | worn_right | worn_add | turn_cc_distance | turn_cc_near | turn_add_near | segment_style | segment_right_mm | segment_left_mm
                2025-03-14 | +3.00      | %s       | ET 20            | %s           | %s            | %s            | %6$s             | %6$s
                """.formatted(text(add), text(near), text(throughAdd), text(style), "", text(height))).stream()
                        .filter(line ->
                                line.contains(" segment ") || line.contains(": Near ") || line.contains("progressive"))
                        .toList();
        assertThat(found).as(source).hasSize(first == null ? 0 : second == null ? 1 : 2);
        if (first != null) {
            assertThat(found.get(0)).startsWith(first);
        }
        if (second != null) {
            assertThat(found.get(1)).startsWith(second);
        }
    }

    /** A likely real change: Pediatric Eye Disease Investigator Group, Arch Ophthalmol 2009;127:59. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            before  | now     | answer    | says                      | source
            ET 8    | ET 13.9 | Found     | may be measurement noise  | 5.9
            ET 8    | ET 14   | Ruled out | more than measurement     | 6.0
            ET 10   | ET 12   | Found     | may be measurement noise  | 10 was held
            ET 10.1 | ET 12   | Ruled out | over the limit too        | 10.1 was not held either
            ET 30   | ET 33   | Ruled out | over the limit too        | it was never held
            ET 40   | ET 20   | Ruled out | more than measurement     | a fall, and still not held
            """)
    void aChangeIsRealOrMayBeNoise(String before, String now, String answer, String says, String source) {
        String line = lines("""
                        visit_date | worn_right | turn_cc_distance
                        2025-01-14 | +3.00      | %s
                        2025-03-14 | +3.00      | %s
                        """.formatted(before, now)).stream()
                .filter(each -> each.contains(" went from "))
                .findFirst()
                .orElseThrow();
        assertThat(line).as(source).startsWith(answer).contains(says, "2025-01-14");
    }

    @Test
    void everyReadingThatBreaksIsComparedWithItsOwn() {
        assertThat(lines("""
                        visit_date | worn_right | turn_cc_distance | turn_cc_near
                        2025-01-14 | +3.00      | ET 4             | ET 8
                        2025-03-14 | +3.00      | ET 14            | ET 12
                        """))
                .filteredOn(line -> line.contains(" went from "))
                .satisfiesExactly(
                        distance -> assertThat(distance).startsWith("Ruled out: At distance"),
                        near -> assertThat(near).startsWith("Found: At near"));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            cycloplegic | manifest | line                                       | source
            +3.00       | +4.00    | Found: The cycloplegic refraction of 2025-01-14 shows less plus | doubted on its own day
            +3.00       | +3.00    | Ruled out: The cycloplegic refraction of 2025-01-14 agrees      | agrees on its own day
            +3.00       |          | Not known: The cycloplegic refraction of 2025-01-14 has nothing | nothing beside it
            """)
    void theRefractionIsTrustedOrNotOnItsOwnDay(String cycloplegic, String manifest, String line, String source) {
        assertThat(lines("""
                        visit_date | worn_right | cycloplegic_right | manifest_right | turn_cc_distance
                        2025-01-14 | +3.00      | %s                | %s             | ET 4
                        2025-03-14 | +3.00      |                   | +5.00          | ET 20
                        """.formatted(cycloplegic, text(manifest))))
                .as(source)
                .anyMatch(each -> each.startsWith(line));
    }

    @Test
    void aTurnThatGlassesDoNotExplainIsSaidBeforeTheUrgentSigns() {
        List<String> lines = lines("""
                visit_date | worn_right | turn_cc_distance | turn_cc_near
                2025-03-14 | +3.00      | ET 20            | ET 4
                """);
        assertThat(lines.get(lines.size() - 3)).startsWith("Found: With glasses the turn is 20 Δ at distance and 4 Δ");
    }

    @Test
    void theClinicsWeeksAreUsed() {
        Visit visit = CourseText.visit("worn_right=+3.00", "worn_since=2025-03-10", "turn_cc_distance=ET 20");
        Limits d = Limits.DEFAULT;
        Limits none = new Limits(
                d.turn(), d.segmentTolerance(), d.pupil(), d.wear(), 0, d.cycloplegicMonths(), d.overdueDays());
        assertThat(Ladder.at(visit, visit.date(), none).get(2).answer()).isEqualTo(Ladder.Answer.RULED_OUT);
    }

    private static List<String> lines(String table) {
        Visit visit = CourseText.course(Judged.BORN, table).latest().orElseThrow();
        return Ladder.at(visit, visit.date(), Limits.DEFAULT).stream()
                .map(step -> Worded.of(step.verdict()) + ": " + Worded.of(step.because()))
                .toList();
    }

    private static String text(String cell) {
        return cell == null ? "" : cell;
    }
}
