package plusward.recall;

import static org.hamcrest.Matchers.allOf;
import static org.hamcrest.Matchers.containsString;
import static org.hamcrest.Matchers.not;
import static org.mockito.ArgumentMatchers.any;
import static org.mockito.BDDMockito.given;
import static org.springframework.security.test.web.servlet.request.SecurityMockMvcRequestPostProcessors.user;
import static org.springframework.test.web.servlet.request.MockMvcRequestBuilders.get;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.content;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.redirectedUrlPattern;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.status;

import java.time.Clock;
import java.time.Instant;
import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.test.context.bean.override.mockito.MockitoBean;
import org.springframework.test.web.servlet.MockMvc;
import org.springframework.test.web.servlet.ResultActions;
import plusward.child.ChildCard;
import plusward.child.Children;
import plusward.course.Course;
import plusward.course.CourseText;
import plusward.draft.Draft;
import plusward.draft.Drafts;
import plusward.exam.Field;
import plusward.visit.Visits;
import plusward.web.PageSlice;

@PageSlice(NeedsALookController.class)
class NeedsALookPageTests {

    private static final ChildCard CHILD =
            new ChildCard(7, "A-1", "Ada", "Brook", LocalDate.parse("2019-05-02"), 30, "en", null, 0);

    @Autowired
    private MockMvc mvc;

    @Autowired
    private Clock clock;

    @MockitoBean
    private Children children;

    @MockitoBean
    private Visits visits;

    @MockitoBean
    private Drafts drafts;

    @Test
    void a_child_stands_with_its_reason_and_its_numbers() throws Exception {
        given(children.all()).willReturn(List.of(CHILD));
        Course course = new Course(
                CHILD.patient(), List.of(CourseText.exam("worn_right=+3.00", "worn_left=+3.00", "turn_cc_near=ET 14")));
        given(visits.coursesOf(any())).willReturn(Map.of(7L, course));
        page().andExpect(content()
                .string(allOf(
                        containsString("1 child of 1 needs a look"),
                        containsString("Ada Brook"),
                        containsString("The turn is not held with the glasses"),
                        containsString("ET 14 at near, with glasses: over the limit of 10 Δ."),
                        containsString("seen 2025-03-14"))));
    }

    @Test
    void an_empty_list_does_not_say_that_all_is_well() throws Exception {
        given(children.all()).willReturn(List.of(CHILD));
        given(visits.coursesOf(any())).willReturn(Map.of());
        page().andExpect(content()
                .string(allOf(
                        containsString("No child needs a look"),
                        containsString("What was not measured may still hide something"),
                        containsString("Nobody is expected today"))));
    }

    @Test
    void the_account_finds_its_drafts_with_the_way_back_to_them() throws Exception {
        LocalDate day = LocalDate.parse("2026-01-05");
        Instant at = Instant.parse("2026-01-05T09:15:00Z");
        given(children.all()).willReturn(List.of(CHILD));
        given(visits.coursesOf(any())).willReturn(Map.of());
        Map<Field, String> typed = Map.of(Field.NOTE, "secret text");
        given(drafts.mine())
                .willReturn(List.of(
                        new Draft(new Draft.Place(7, Draft.NEW, day), -1, "", typed, at),
                        new Draft(new Draft.Place(7, 70, day), 2, "", typed, at),
                        new Draft(new Draft.Place(8, Draft.NEW, day), -1, "", typed, at)));
        page().andExpect(content()
                .string(allOf(
                        containsString("href=\"/children/7/visits/new?day=2026-01-05\""),
                        containsString("Ada Brook, new visit of 2026-01-05"),
                        containsString("href=\"/children/7/visits/70/edit\""),
                        containsString("Ada Brook, correction of 2026-01-05"),
                        not(containsString("secret text")))));
    }

    @Test
    void the_next_child_expected_today_is_one_key_away() throws Exception {
        LocalDate lastTime = LocalDate.now(clock).minusWeeks(4);
        Course course =
                new Course(CHILD.patient(), List.of(CourseText.exam("visit_date=" + lastTime, "next_visit_weeks=4")));
        given(children.all()).willReturn(List.of(CHILD));
        given(visits.coursesOf(any())).willReturn(Map.of(7L, course));
        page().andExpect(content().string(containsString("href=\"/children/7/visits/new\" accesskey=\"t\"")));
    }

    @Test
    void nobody_sees_it_without_signing_in() throws Exception {
        mvc.perform(get("/")).andExpect(redirectedUrlPattern("/sign-in*"));
    }

    private ResultActions page() throws Exception {
        return mvc.perform(get("/").with(user("doctor").roles("DOCTOR"))).andExpect(status().isOk());
    }
}
