package plusward.course;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import plusward.exam.PerEye;
import plusward.optics.Dioptres;

class CycloplegicInForceTests {

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            refracted  | visit      | in force | source
            2023-03-14 | 2025-03-14 | true     | 24 calendar months to the day
            2023-03-14 | 2025-03-15 | false    | a day more
            2024-02-29 | 2026-02-28 | true     | from a leap day: the last day of the month
            2024-02-29 | 2026-03-01 | false    | a day more
            2025-03-13 | 2025-03-14 | true     | the day before
            """)
    void it_serves_for_24_calendar_months(String refracted, String visit, boolean inForce, String source) {
        Visit latest = CourseText.course("2019-05-02", """
                visit_date | cycloplegic_right
                %s         | +3.00
                %s         |
                """.formatted(refracted, visit))
                .latest()
                .orElseThrow();
        assertThat(CycloplegicInForce.at(latest).isPresent()).as(source).isEqualTo(inForce);
        assertThat(CycloplegicInForce.latest(latest).orElseThrow().takenOn()).isEqualTo(LocalDate.parse(refracted));
    }

    @Test
    void the_latest_counts_and_a_later_one_does_not_exist_yet() {
        Course course = CourseText.course("2019-05-02", """
                visit_date | cycloplegic_right | cycloplegic_left | cycloplegic_agent
                2023-03-14 | +3.00             | +4.00            | atropine
                2024-03-14 | +4.00 -1.00 x 180 |                  |
                2024-09-14 |                   |                  | cyclopentolate
                2025-03-14 | +5.00             | +5.00            |
                """);
        CycloplegicInForce found = CycloplegicInForce.at(course.visits().get(2)).orElseThrow();
        assertThat(found.takenOn()).isEqualTo(LocalDate.parse("2024-03-14"));
        assertThat(found.equivalent()).isEqualTo(new PerEye<>(Dioptres.of(4.00 - 1.00 / 2), null));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            right | left  | hyperopia (D) | source
            +3.00 | +4.00 | 3.5           | (3.00 + 4.00)/2
            +3.00 |       | 3             | the eye that was refracted
                  | +4.00 | 4             | the eye that was refracted
            """)
    void hyperopia_is_the_mean_of_the_eyes_refracted(String right, String left, double hyperopia, String source) {
        Visit visit = CourseText.visit(
                "cycloplegic_right=" + (right == null ? "" : right), "cycloplegic_left=" + (left == null ? "" : left));
        assertThat(CycloplegicInForce.at(visit).orElseThrow().hyperopia())
                .as(source)
                .isEqualTo(Dioptres.of(hyperopia));
    }

    @Test
    void never_refracted_is_nothing() {
        assertThat(CycloplegicInForce.latest(CourseText.visit("manifest_right=+3.00")))
                .isEmpty();
    }
}
