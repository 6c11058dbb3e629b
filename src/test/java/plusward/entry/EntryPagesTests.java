package plusward.entry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.containsString;
import static org.hamcrest.Matchers.not;
import static org.mockito.ArgumentMatchers.any;
import static org.mockito.ArgumentMatchers.anyInt;
import static org.mockito.ArgumentMatchers.anyLong;
import static org.mockito.Mockito.never;
import static org.mockito.Mockito.verify;
import static org.mockito.Mockito.when;
import static org.springframework.security.test.web.servlet.request.SecurityMockMvcRequestPostProcessors.csrf;
import static org.springframework.test.web.servlet.request.MockMvcRequestBuilders.get;
import static org.springframework.test.web.servlet.request.MockMvcRequestBuilders.post;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.content;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.redirectedUrl;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.status;

import java.time.Instant;
import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.context.annotation.Import;
import org.springframework.dao.DataIntegrityViolationException;
import org.springframework.dao.OptimisticLockingFailureException;
import org.springframework.security.test.context.support.WithMockUser;
import org.springframework.test.context.bean.override.mockito.MockitoBean;
import org.springframework.test.web.servlet.MockMvc;
import org.springframework.test.web.servlet.request.MockHttpServletRequestBuilder;
import org.springframework.web.util.HtmlUtils;
import plusward.child.ChildCard;
import plusward.child.Children;
import plusward.exam.Examination;
import plusward.exam.ExaminationReader;
import plusward.exam.Field;
import plusward.visit.RecordedVisit;
import plusward.visit.Visits;
import plusward.web.PageSlice;

@PageSlice({NewVisitController.class, StoredVisitController.class})
@Import({EntryDesk.class, EntryPages.class, EntryAnswer.class})
@WithMockUser(username = "staff", roles = "STAFF")
class EntryPagesTests {

    private static final String NEW = "/children/7/visits/new";
    private static final String EDIT = "/children/7/visits/70/edit";
    private static final ChildCard MARA =
            new ChildCard(7, "A-1007", "Mara", "Ellwood", LocalDate.parse("2019-05-02"), 30, "en", null, 0);
    private static final RecordedVisit OCTOBER = visit(
            70,
            3,
            Map.of(
                    Field.VISIT_DATE, "2025-10-06",
                    Field.WORN_RIGHT, "+4.25 -0.50 x 180",
                    Field.TURN_CC_NEAR, "E 6",
                    Field.ACUITY_RIGHT, "20/25-2"));

    @Autowired
    MockMvc browser;

    @MockitoBean
    Children children;

    @MockitoBean
    Visits visits;

    static RecordedVisit visit(long id, int version, Map<Field, String> text) {
        Examination examination = ExaminationReader.read(text).examination();
        Instant at = Instant.parse("2025-10-06T14:29:00Z");
        return new RecordedVisit(id, version, examination, "r.tamsin", at, "d.hale", at);
    }

    @BeforeEach
    void aChildWithOneVisit() {
        when(children.find(7)).thenReturn(Optional.of(MARA));
        when(visits.of(MARA)).thenReturn(List.of(OCTOBER));
        when(visits.find(MARA, 70)).thenReturn(Optional.of(OCTOBER));
        when(visits.findOn(MARA, OCTOBER.date())).thenReturn(Optional.of(OCTOBER));
    }

    private String page(MockHttpServletRequestBuilder request, int status) throws Exception {
        return browser.perform(request.with(csrf()))
                .andExpect(status().is(status))
                .andExpect(content().string(not(containsString("??"))))
                .andReturn()
                .getResponse()
                .getContentAsString();
    }

    private void verifyNothingStored() {
        verify(visits, never()).record(any(), any());
        verify(visits, never()).correct(any(), anyLong(), anyInt(), any());
    }

    @Test
    void aNewVisitBeginsTodayWithTheLastOneBesideEachField() throws Exception {
        assertThat(page(get(NEW), 200))
                .contains("<title>New visit, Mara Ellwood</title>")
                .contains("value=\"" + LocalDate.now() + "\"")
                .contains("value=\"staff\"")
                .contains("data-last=\"+4.25 -0.50 x 180\"")
                .contains("id=\"turn_cc_near-last\"")
                .doesNotContain("role=\"alert\"");
    }

    @ParameterizedTest
    @EnumSource
    void nothingTypedIsLostAndEveryRefusalSaysWhatToEnter(Field field) throws Exception {
        String bad = field == Field.NOTE ? "n".repeat(4001) : field == Field.EXAMINER ? "e".repeat(81) : "<b>zzz";
        Field other = field == Field.WEAR_HOURS ? Field.PD_MM : Field.WEAR_HOURS;
        String page = page(post(NEW).param(other.column(), "12.5x").param(field.column(), bad), 422);
        assertThat(page)
                .contains("<title>Error: New visit")
                .contains("role=\"alert\" tabindex=\"-1\" id=\"errors\"")
                .contains("href=\"#" + field.column() + "\"")
                .contains("id=\"" + field.column() + "-wrong\"")
                .contains("value=\"12.5x\"")
                .contains(HtmlUtils.htmlEscape(bad))
                .containsPattern("(Enter|Choose|Type|Up to|At most|Write)[^<]{6,}")
                .doesNotContain("<b>zzz");
        verifyNothingStored();
    }

    @ParameterizedTest
    @EnumSource
    void controlCharactersAreRefusedOrHarmlessInEveryField(Field field) throws Exception {
        String page = page(post(NEW).param(field.column(), "a\u0000\u0007\u001b[31m"), 422);
        assertThat(page).contains("href=\"#" + field.column() + "\"");
        verifyNothingStored();
    }

    @Test
    void whatFewVisitsNeedIsFoldedUntilItIsRefused() throws Exception {
        assertThat(page(get(NEW), 200)).contains("<details>").doesNotContain("<details open");
        assertThat(page(post(NEW).param("ductions", "right"), 422)).containsOnlyOnce("<details open=\"open\">");
    }

    @Test
    void anOffsetAtOddsWithItsHeightsIsRefusedWithBothNumbers() throws Exception {
        String page = page(
                post(NEW)
                        .param("visit_date", "2026-01-05")
                        .param("segment_left_mm", "-3.5")
                        .param("segment_height_left_mm", "18.5")
                        .param("pupil_height_left_mm", "20"),
                422);
        assertThat(page)
                .contains("href=\"#segment_left_mm\"")
                .contains("“-3.5” mm was entered for the top of the segment")
                .contains("of this eye is -1.5 mm")
                .contains("for example 18.5 and 20.0 give -1.5");
        verifyNothingStored();
    }

    @Test
    void aNoteOfAMegabyteIsRefusedAndKept() throws Exception {
        String note = "x".repeat(1_000_000);
        assertThat(page(post(NEW).param("visit_date", "2026-01-05").param("note", note), 422))
                .contains("href=\"#note\"")
                .contains(note);
    }

    @Test
    void textFromRightToLeftIsStored() throws Exception {
        when(visits.record(any(), any())).thenReturn(OCTOBER);
        browser.perform(post(NEW)
                        .param("visit_date", "2026-01-05")
                        .param("note", "הערה \u202eabc")
                        .with(csrf()))
                .andExpect(redirectedUrl("/children/7?saved=2025-10-06"));
    }

    @Test
    void anEmptyRequestIsRefusedForItsDateAlone() throws Exception {
        assertThat(page(post(NEW), 422))
                .contains("Not saved yet: 1 field to correct")
                .contains("href=\"#visit_date\"");
    }

    @Test
    void aSecondVisitOnOneDayLeadsToTheFirst() throws Exception {
        assertThat(page(post(NEW).param("visit_date", "2025-10-06").param("wear_hours", "9"), 422))
                .contains("already has a visit on 2025-10-06")
                .contains("href=\"/children/7/visits/70\"")
                .contains("formaction=\"/children/7/visits/70/edit\"")
                .contains("value=\"9\"");
        verifyNothingStored();
    }

    @Test
    void twoWhoSaveTheSameDayAtOnceLoseNothing() throws Exception {
        when(visits.findOn(MARA, LocalDate.parse("2026-01-05")))
                .thenReturn(Optional.empty())
                .thenReturn(Optional.of(visit(71, 0, Map.of(Field.VISIT_DATE, "2026-01-05"))));
        when(visits.record(any(), any())).thenThrow(new DataIntegrityViolationException("visit_once_a_day"));
        assertThat(page(post(NEW).param("visit_date", "2026-01-05").param("wear_hours", "9"), 422))
                .contains("href=\"/children/7/visits/71\"")
                .contains("value=\"9\"");
    }

    @Test
    void glassesAsLastTimeComeWithoutJavaScriptToo() throws Exception {
        assertThat(page(post(NEW).param("copy", "glasses").param("turn_cc_near", "nonsense"), 200))
                .contains("value=\"+4.25 -0.50 x 180\"")
                .contains("value=\"nonsense\"")
                .doesNotContain("role=\"alert\"");
        verifyNothingStored();
    }

    @Test
    void theVisitIsReadWithItsHistory() throws Exception {
        assertThat(page(get("/children/7/visits/70"), 200))
                .contains("Visit of 2025-10-06")
                .contains("20/25-2")
                .contains("not measured")
                .contains("by r.tamsin")
                .contains("by d.hale")
                .doesNotContain("<input type=\"text\"");
    }

    @Test
    void aCorrectionCarriesTheVersionThatWasRead() throws Exception {
        assertThat(page(get(EDIT), 200))
                .contains("name=\"version\" value=\"3\"")
                .contains("value=\"20/25-2\"");
        when(visits.correct(any(), anyLong(), anyInt(), any())).thenReturn(OCTOBER);
        browser.perform(post(EDIT)
                        .param("version", "3")
                        .param("visit_date", "2025-10-06")
                        .with(csrf()))
                .andExpect(redirectedUrl("/children/7?saved=2025-10-06"));
        verify(visits).correct(MARA, 70, 3, Examination.empty(LocalDate.parse("2025-10-06")));
    }

    @Test
    void anOvertakenCorrectionShowsBothVersionsAndAWayToSave() throws Exception {
        when(visits.correct(any(), anyLong(), anyInt(), any()))
                .thenThrow(new OptimisticLockingFailureException("overtaken"));
        String page = page(
                post(EDIT)
                        .param("version", "2")
                        .param("visit_date", "2025-10-06")
                        .param("turn_cc_near", "ET 12")
                        .param("examiner", "R. Tamsin")
                        .param("worn_right", "+4.25-0.50x180"),
                409);
        assertThat(page)
                .contains("Two versions of this visit")
                .contains("d.hale")
                .contains("3 fields differ")
                .contains("id=\"turn_cc_near-mine\" name=\"turn_cc_near\" value=\"ET 12\" checked=\"checked\"")
                .contains("id=\"turn_cc_near-theirs\" name=\"turn_cc_near\" value=\"E 6\">")
                .contains("id=\"acuity_right-theirs\" name=\"acuity_right\" value=\"20/25-2\" checked=\"checked\"")
                .contains("type=\"hidden\" name=\"worn_right\" value=\"+4.25-0.50x180\"")
                .contains("name=\"version\" value=\"3\"");
    }

    @Test
    void fromTwoVersionsOneCanGoOnTyping() throws Exception {
        assertThat(page(post(EDIT).param("type", "yes").param("version", "3").param("turn_cc_near", "ET 12"), 200))
                .contains("value=\"ET 12\"")
                .contains("name=\"version\" value=\"3\"");
        verifyNothingStored();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "/children/8/visits/new",
                "/children/x/visits/new",
                "/children/7/visits/71",
                "/children/7/visits/x",
                "/children/7/visits/99999999999999999999",
                "/children/7/visits/71/edit",
                "/children/7/visits/x/edit",
                "/children/8/visits/70"
            })
    void whatDoesNotExistIsAPageWithAWayBack(String path) throws Exception {
        assertThat(page(get(path), 404)).contains("There is no such page");
    }
}
