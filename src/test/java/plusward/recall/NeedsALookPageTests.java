package plusward.recall;

import static org.hamcrest.Matchers.allOf;
import static org.hamcrest.Matchers.containsString;
import static org.mockito.ArgumentMatchers.any;
import static org.mockito.BDDMockito.given;
import static org.springframework.security.test.web.servlet.request.SecurityMockMvcRequestPostProcessors.user;
import static org.springframework.test.web.servlet.request.MockMvcRequestBuilders.get;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.content;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.redirectedUrlPattern;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.status;

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
import plusward.visit.Visits;
import plusward.web.PageSlice;

@PageSlice(NeedsALookController.class)
class NeedsALookPageTests {

    private static final ChildCard CHILD =
            new ChildCard(7, "A-1", "Ada", "Brook", LocalDate.parse("2019-05-02"), 30, "en", null, 0);

    @Autowired
    private MockMvc mvc;

    @MockitoBean
    private Children children;

    @MockitoBean
    private Visits visits;

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
    void nobody_sees_it_without_signing_in() throws Exception {
        mvc.perform(get("/")).andExpect(redirectedUrlPattern("/sign-in*"));
    }

    private ResultActions page() throws Exception {
        return mvc.perform(get("/").with(user("doctor").roles("DOCTOR"))).andExpect(status().isOk());
    }
}
