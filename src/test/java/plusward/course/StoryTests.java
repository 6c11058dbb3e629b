package plusward.course;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class StoryTests {

    @ParameterizedTest
    @MethodSource("stories")
    void every_visit_has_the_expected_state(Story story) {
        assertThat(ControlHistory.states(story.course(), story.limits()).stream()
                        .map(ControlState::code))
                .isEqualTo(story.states());
    }

    @ParameterizedTest
    @MethodSource("stories")
    void every_visit_has_the_expected_pattern(Story story) {
        assertThat(story.course().visits().stream()
                        .map(visit -> Pattern.at(visit, story.limits()).kind().code()))
                .isEqualTo(story.patterns());
    }

    static List<Story> stories() {
        return Story.all();
    }
}
