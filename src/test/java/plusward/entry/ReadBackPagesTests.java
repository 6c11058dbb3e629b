package plusward.entry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.mockito.ArgumentMatchers.any;
import static org.mockito.ArgumentMatchers.anyInt;
import static org.mockito.ArgumentMatchers.argThat;
import static org.mockito.ArgumentMatchers.eq;
import static org.mockito.Mockito.never;
import static org.mockito.Mockito.verify;
import static org.mockito.Mockito.verifyNoInteractions;
import static org.mockito.Mockito.when;
import static org.springframework.security.test.web.servlet.request.SecurityMockMvcRequestPostProcessors.csrf;
import static org.springframework.test.web.servlet.request.MockMvcRequestBuilders.post;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.status;

import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.context.annotation.Import;
import org.springframework.security.test.context.support.WithMockUser;
import org.springframework.test.context.bean.override.mockito.MockitoBean;
import org.springframework.test.web.servlet.MockMvc;
import org.springframework.test.web.servlet.request.MockHttpServletRequestBuilder;
import plusward.child.ChildCard;
import plusward.child.Children;
import plusward.draft.Draft;
import plusward.draft.Drafts;
import plusward.exam.Field;
import plusward.visit.RecordedVisit;
import plusward.visit.Visits;
import plusward.web.PageSlice;

/** Reading back the correction of a stored visit, and addresses at which there is nothing to read back. */
@PageSlice(ReadBackController.class)
@Import({EntryPages.class, EntryDrafts.class})
@WithMockUser(username = "staff", roles = "STAFF")
class ReadBackPagesTests {

    private static final String NEW = "/children/7/visits/new/read-back";
    private static final String EDIT = "/children/7/visits/70/edit/read-back";
    private static final ChildCard MARA =
            new ChildCard(7, "A-1007", "Mara", "Ellwood", LocalDate.parse("2019-05-02"), 30, "en", null, 0);
    private static final RecordedVisit JUNE =
            EntryPagesTests.visit(69, 0, Map.of(Field.VISIT_DATE, "2025-06-02", Field.TURN_CC_NEAR, "E 2"));
    private static final RecordedVisit OCTOBER =
            EntryPagesTests.visit(70, 3, Map.of(Field.VISIT_DATE, "2025-10-06", Field.TURN_CC_NEAR, "E 6"));

    @Autowired
    MockMvc browser;

    @MockitoBean
    Children children;

    @MockitoBean
    Visits visits;

    @MockitoBean
    Drafts drafts;

    @BeforeEach
    void aChildWithTwoVisits() {
        when(children.find(7)).thenReturn(Optional.of(MARA));
        when(visits.of(MARA)).thenReturn(List.of(JUNE, OCTOBER));
        when(visits.find(MARA, 70)).thenReturn(Optional.of(OCTOBER));
        when(drafts.keep(any(), anyInt(), any(), any())).thenReturn(true);
    }

    private String answer(MockHttpServletRequestBuilder request, int status) throws Exception {
        return browser.perform(request.with(csrf()))
                .andExpect(status().is(status))
                .andReturn()
                .getResponse()
                .getContentAsString();
    }

    @Test
    void aCorrectionIsReadBackAgainstTheVisitBeforeAndNotAgainstItself() throws Exception {
        String read = answer(
                post(EDIT)
                        .param("version", "3")
                        .param("why", "read twice")
                        .param("visit_date", "2025-10-06")
                        .param("turn_cc_near", "E(T) 14")
                        .param("worn_left", "3.00"),
                200);
        assertThat(read)
                .contains("hx-swap-oob=\"innerHTML:#turn_cc_near-read\"")
                .contains("inward, shows at times, 14 Δ")
                .contains("12 Δ further in since 2025-06-02: likely real")
                .contains("lacks a sign")
                .contains("Draft kept at ")
                .doesNotContain("since 2025-10-06")
                .doesNotContain("??", "<html", "<form");
    }

    @Test
    void theDraftOfACorrectionIsKeptForTheDayOfItsVisit() throws Exception {
        answer(
                post(EDIT)
                        .param("version", "3")
                        .param("why", "read twice")
                        .param("day", "2026-01-05")
                        .param("visit_date", "2025-10-07")
                        .param("turn_cc_near", "E(T) 14"),
                200);
        verify(drafts)
                .keep(
                        eq(new Draft.Place(7, 70, OCTOBER.date())),
                        eq(3),
                        eq("read twice"),
                        argThat(typed -> typed.get(Field.TURN_CC_NEAR).equals("E(T) 14")));
        verify(visits, never()).correct(any(), any());
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"", "today", "+999999999-12-31", "-999999999-01-01", "2026-02-30", "2026-1-5", "2026-01-05\u0000"
            })
    void aDayThatCannotBeReadIsToday(String day) throws Exception {
        answer(post(NEW).param("day", day).param("turn_cc_near", "E(T) 14"), 200);
        verify(drafts).keep(eq(new Draft.Place(7, Draft.NEW, LocalDate.now())), anyInt(), any(), any());
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "/children/8/visits/new/read-back",
                "/children/x/visits/new/read-back",
                "/children/8/visits/70/edit/read-back",
                "/children/7/visits/71/edit/read-back",
                "/children/7/visits/x/edit/read-back",
                "/children/7/visits/99999999999999999999/edit/read-back",
                "/children/7/visits/70/read-back"
            })
    void whereThereIsNoVisitThereIsNothingToReadBack(String path) throws Exception {
        answer(post(path).param("turn_cc_near", "E(T) 14"), 404);
        verifyNoInteractions(drafts);
    }
}
