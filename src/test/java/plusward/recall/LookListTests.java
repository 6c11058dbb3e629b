package plusward.recall;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.tuple;

import java.time.LocalDate;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import plusward.child.ChildCard;
import plusward.course.Course;
import plusward.course.CourseText;
import plusward.course.Limits;

class LookListTests {

    private static final LocalDate TODAY = LocalDate.parse("2026-12-01");
    private static final String HELD = "+3.00 | +3.00 | +3.00 | +3.00 | E 4";
    private static final String LATENT = "+3.00 | +3.00 | +3.00 | +3.00 | E 14";
    private static final String NOT_HELD = "+3.00 | +3.00 | +3.00 | +3.00 | ET 20";
    private static final String OUTWARD = "+3.00 | +3.00 | +3.00 | +3.00 | XT 12";

    private final Map<ChildCard, Course> courses = new HashMap<>();

    @Test
    void what_needs_a_decision_comes_first_then_the_order_of_the_rulebook_then_who_was_seen_longest_ago() {
        child("A-1", visit("2026-11-05", LATENT));
        child("A-2", visit("2026-11-05", OUTWARD));
        child("A-3", visit("2026-11-05", NOT_HELD));
        child("A-4", visit("2026-11-04", NOT_HELD));
        child("A-5", visit("2026-11-04", NOT_HELD));
        assertThat(numbers()).containsExactly("A-4", "A-5", "A-3", "A-2", "A-1");
    }

    @Test
    void a_child_with_nothing_to_decide_or_look_at_is_left_out() {
        child("A-1", visit("2026-11-05", HELD));
        child("A-2");
        assertThat(list()).isEmpty();
    }

    @Test
    void only_the_latest_visit_counts() {
        child("A-1", visit("2026-08-05", NOT_HELD), visit("2026-11-05", HELD));
        assertThat(list()).isEmpty();
    }

    @Test
    void a_row_names_its_heaviest_finding_and_counts_the_others() {
        child("A-1", "2026-11-05 | | 5 | +4.00 | +4.00 | +3.00 | +3.00 | ET 20 | E 4");
        LookRow row = list().get(0);
        assertThat(row.first().code()).isEqualTo("turn-not-held");
        assertThat(row.others())
                .as("plus-short, wear-short, sudden excess at distance")
                .isEqualTo(3);
        assertThat(row.seenOn()).isEqualTo("2026-11-05");
        assertThat(row.dueOn()).isNull();
    }

    @Test
    void a_child_whose_set_day_has_passed_is_overdue_from_the_day_after() {
        child("A-1", "2026-11-03 | 4 | 12 | " + HELD + " | E 4");
        assertThat(LookList.of(courses, LocalDate.parse("2026-12-01"), Limits.DEFAULT))
                .isEmpty();
        assertThat(LookList.of(courses, LocalDate.parse("2026-12-02"), Limits.DEFAULT))
                .singleElement()
                .satisfies(row -> {
                    assertThat(row.first().code()).isEqualTo("visit-overdue");
                    assertThat(row.dueOn()).isEqualTo("2026-12-01");
                });
    }

    @Test
    void today_lists_who_is_expected_by_the_set_day_and_who_was_seen() {
        child("A-3", "2026-11-03 | 4 | 12 | " + HELD + " | E 4");
        child("A-2", visit("2026-12-01", HELD));
        child("A-1", "2026-11-02 | 4 | 12 | " + HELD + " | E 4");
        child("A-4");
        assertThat(TodayRow.of(courses, TODAY))
                .extracting(row -> row.child().clinicNumber(), TodayRow::seen)
                .containsExactly(tuple("A-2", true), tuple("A-3", false));
    }

    private static String visit(String day, String measures) {
        String near = measures.substring(measures.lastIndexOf('|'));
        return day + " |  | 12 | " + measures + " " + near;
    }

    private void child(String number, String... visits) {
        ChildCard card =
                new ChildCard(courses.size(), number, "Ada", "Brook", LocalDate.parse("2020-05-02"), 30, "en", null, 0);
        String head = "visit_date | next_visit_weeks | wear_hours | cycloplegic_right | cycloplegic_left | worn_right"
                + " | worn_left | turn_cc_distance | turn_cc_near\n";
        courses.put(card, CourseText.course(card.patient(), head + String.join("\n", visits)));
    }

    private List<LookRow> list() {
        return LookList.of(courses, TODAY, Limits.DEFAULT);
    }

    private List<String> numbers() {
        return list().stream().map(row -> row.child().clinicNumber()).toList();
    }
}
