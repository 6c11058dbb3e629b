package plusward.course;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import plusward.course.Demonstration.ExpectedChild;

class DemonstrationTests {

    private static final Map<String, Course> COURSES = Demonstration.courses();

    @Test
    void every_child_of_the_demonstration_clinic_is_expected_something_of() {
        assertThat(expected().stream().map(ExpectedChild::clinicNumber))
                .containsExactlyInAnyOrderElementsOf(COURSES.keySet());
    }

    @ParameterizedTest
    @MethodSource("expected")
    void every_visit_has_the_expected_state(ExpectedChild child) {
        Map<LocalDate, String> expected = new LinkedHashMap<>();
        child.visits().forEach(visit -> expected.put(visit.date(), visit.state()));
        Map<LocalDate, String> found = new LinkedHashMap<>();
        course(child)
                .visits()
                .forEach(visit -> found.put(
                        visit.date(), Control.at(visit, Limits.DEFAULT).state().code()));
        assertThat(found).isEqualTo(expected);
    }

    @ParameterizedTest
    @MethodSource("expected")
    void every_child_has_the_expected_pattern(ExpectedChild child) {
        assertThat(Pattern.of(course(child), Limits.DEFAULT).kind().code()).isEqualTo(child.pattern());
    }

    static List<ExpectedChild> expected() {
        return Demonstration.expected();
    }

    private static Course course(ExpectedChild child) {
        return COURSES.get(child.clinicNumber());
    }
}
