package plusward.course;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ControlHistoryTests {

    /** One visit a year on 1 June from 2020: h held, a held through the add, n not held, o turned out, - not to be judged. */
    private static final Map<Character, String> LINES = Map.of(
            'h', "| E 4   | E 4   | E 4",
            'a', "| E 4   | ET 14 | E 4",
            'n', "| ET 14 | ET 14 | ET 14",
            'o', "| XT 14 | XT 14 | XT 14",
            '-', "|       |       |");

    @ParameterizedTest
    @CsvSource(delimiter = '|', useHeadersInDisplayName = true, textBlock = """
            course | held since | held | of | longest run | lost on    | what it shows
            h      | 2020-06-01 | 1    | 1  | 1           |            | one held visit
            n      |            | 0    | 1  | 0           |            | never held is not lost
            -      |            | 0    | 0  | 0           |            | nothing to judge
            hah    | 2020-06-01 | 3    | 3  | 3           |            | through the add counts as held
            hhn    |            | 2    | 3  | 2           | 2022-06-01 | lost at the third visit
            hho    |            | 2    | 3  | 2           | 2022-06-01 | turned out is not held
            h-h    | 2020-06-01 | 2    | 2  | 2           |            | a visit without a judgement does not break the run
            h-n    |            | 1    | 2  | 1           | 2022-06-01 | nor does it hide a loss
            hn-    |            | 1    | 2  | 1           | 2021-06-01 | nor does it undo one
            hnh    | 2022-06-01 | 2    | 3  | 1           | 2021-06-01 | regained
            hhnhnn |            | 3    | 6  | 2           | 2024-06-01 | the latest loss is named
            nhhh   | 2021-06-01 | 3    | 4  | 3           |            | gained
            hhhnh  | 2024-06-01 | 4    | 5  | 3           | 2023-06-01 | the longest run may lie behind
            """)
    void a_course_is_counted_over_the_visits_that_could_be_judged(
            String states, LocalDate since, int held, int of, int longest, LocalDate lostOn, String shows) {
        assertThat(ControlHistory.of(course(states), Limits.DEFAULT))
                .as(shows)
                .isEqualTo(new ControlHistory(since, held, of, longest, lostOn));
    }

    @Test
    void an_earlier_visit_knows_nothing_of_later_ones() {
        Visit first = course("hn").visits().get(0);
        assertThat(ControlHistory.at(first, Limits.DEFAULT))
                .isEqualTo(new ControlHistory(LocalDate.parse("2020-06-01"), 1, 1, 1, null));
    }

    @Test
    void without_a_visit_there_is_nothing() {
        assertThat(ControlHistory.of(course(""), Limits.DEFAULT)).isEqualTo(new ControlHistory(null, 0, 0, 0, null));
    }

    @Test
    void the_states_come_oldest_first() {
        assertThat(ControlHistory.states(course("ha-no"), Limits.DEFAULT))
                .isEqualTo(List.of(
                        ControlState.HELD,
                        ControlState.HELD_THROUGH_ADD,
                        ControlState.NOT_ASSESSABLE,
                        ControlState.NOT_HELD_BOTH,
                        ControlState.TURNED_OUT));
    }

    private static Course course(String states) {
        String header = "visit_date | worn_right | worn_add | turn_cc_distance | turn_cc_near | turn_add_near\n";
        return CourseText.course(
                "2016-01-01",
                header
                        + IntStream.range(0, states.length())
                                .mapToObj(i -> (2020 + i) + "-06-01 | +3.00 | 2.50 " + LINES.get(states.charAt(i)))
                                .collect(Collectors.joining("\n")));
    }
}
