package plusward.rules;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import plusward.course.Course;
import plusward.course.Demonstration;
import plusward.course.Demonstration.ExpectedChild;
import plusward.course.Limits;
import plusward.course.Story;
import plusward.course.Visit;

/** Whole courses against the rulebook: what is met at each visit, as codes, with ! after those that ask for an act. */
class StoryFindingsTests {

    private static final Map<String, Course> COURSES = Demonstration.courses();

    @ParameterizedTest
    @MethodSource("stories")
    void every_visit_of_a_story_meets_the_expected_findings(Story story) {
        assertThat(story.course().visits().stream().map(visit -> codes(visit, story.judgedOn(), story.limits())))
                .isEqualTo(story.findings());
    }

    @ParameterizedTest
    @MethodSource("children")
    void every_visit_of_the_demonstration_clinic_meets_the_expected_findings(ExpectedChild child) {
        Map<LocalDate, List<String>> expected = new LinkedHashMap<>();
        child.visits().forEach(visit -> expected.put(visit.date(), visit.findings()));
        Map<LocalDate, List<String>> found = new LinkedHashMap<>();
        COURSES.get(child.clinicNumber())
                .visits()
                .forEach(visit -> found.put(visit.date(), codes(visit, Demonstration.JUDGED_ON, Limits.DEFAULT)));
        assertThat(found).isEqualTo(expected);
    }

    static List<Story> stories() {
        return Story.all();
    }

    static List<ExpectedChild> children() {
        return Demonstration.expected();
    }

    private static List<String> codes(Visit visit, LocalDate on, Limits limits) {
        return Rulebook.met(visit, on, limits).stream()
                .map(met -> met.code() + (met.weight() == Weight.ACT ? "!" : ""))
                .sorted()
                .distinct()
                .toList();
    }
}
