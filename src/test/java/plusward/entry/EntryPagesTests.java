package plusward.entry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.containsString;
import static org.hamcrest.Matchers.not;
import static org.mockito.ArgumentMatchers.any;
import static org.mockito.ArgumentMatchers.anyInt;
import static org.mockito.ArgumentMatchers.argThat;
import static org.mockito.ArgumentMatchers.eq;
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
import org.junit.jupiter.params.provider.CsvSource;
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
import plusward.draft.Draft;
import plusward.draft.Drafts;
import plusward.exam.Examination;
import plusward.exam.ExaminationReader;
import plusward.exam.Field;
import plusward.visit.Correction;
import plusward.visit.RecordedVisit;
import plusward.visit.VisitChange;
import plusward.visit.Visits;
import plusward.web.PageSlice;

@PageSlice({NewVisitController.class, StoredVisitController.class, ReadBackController.class})
@Import({EntryDesk.class, EntryPages.class, EntryAnswer.class, EntryDrafts.class})
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

    @MockitoBean
    Drafts drafts;

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
        verify(visits, never()).record(any(), any(), any());
        verify(visits, never()).correct(any(), any());
    }

    @Test
    void aNewVisitBeginsTodayWithTheLastOneBesideEachField() throws Exception {
        assertThat(page(get(NEW), 200))
                .contains("<title>New visit, Mara Ellwood</title>")
                .contains("value=\"" + LocalDate.now() + "\"")
                .contains("value=\"staff\"")
                .contains("data-last=\"+4.25 -0.50 x 180\"")
                .contains("id=\"turn_cc_near-last\"")
                .doesNotContain("id=\"errors\"");
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
        when(visits.record(any(), any(), any())).thenReturn(OCTOBER);
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
        when(visits.record(any(), any(), any())).thenThrow(new DataIntegrityViolationException("visit_once_a_day"));
        assertThat(page(post(NEW).param("visit_date", "2026-01-05").param("wear_hours", "9"), 422))
                .contains("href=\"/children/7/visits/71\"")
                .contains("value=\"9\"");
    }

    @Test
    void glassesAsLastTimeComeWithoutJavaScriptToo() throws Exception {
        assertThat(page(post(NEW).param("copy", "glasses").param("turn_cc_near", "nonsense"), 200))
                .contains("value=\"+4.25 -0.50 x 180\"")
                .contains("value=\"nonsense\"")
                .doesNotContain("id=\"errors\"");
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
                .doesNotContain("What was changed")
                .doesNotContain("<input type=\"text\"");
    }

    @Test
    void aCorrectionCarriesTheVersionThatWasRead() throws Exception {
        assertThat(page(get(EDIT), 200))
                .contains("name=\"version\" value=\"3\"")
                .contains("value=\"20/25-2\"");
        when(visits.correct(any(), any())).thenReturn(OCTOBER);
        browser.perform(post(EDIT)
                        .param("version", "3")
                        .param("visit_date", "2025-10-06")
                        .param("why", " typed wrong ")
                        .with(csrf()))
                .andExpect(redirectedUrl("/children/7?saved=2025-10-06"));
        Examination emptied = Examination.empty(LocalDate.parse("2025-10-06"));
        verify(visits).correct(MARA, new Correction(70, 3, emptied, "typed wrong", List.of()));
        verify(drafts).forget(new Draft.Place(7, 70, OCTOBER.date()));
    }

    @Test
    void anOvertakenCorrectionShowsBothVersionsAndAWayToSave() throws Exception {
        when(visits.correct(any(), any())).thenThrow(new OptimisticLockingFailureException("overtaken"));
        String page = page(
                post(EDIT)
                        .param("version", "2")
                        .param("why", "typed wrong")
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
                .contains("name=\"version\" value=\"3\"")
                .contains("name=\"why\" value=\"typed wrong\"");
    }

    @ParameterizedTest
    @CsvSource({
        "'', It is missing",
        "'   ', It is missing",
        "LONG, It has 201 characters",
        "a\u0000b, It has a character that cannot be shown"
    })
    void aCorrectionSaysWhy(String why, String problem) throws Exception {
        String page = page(
                post(EDIT)
                        .param("version", "3")
                        .param("visit_date", "2025-10-06")
                        .param("turn_cc_near", "ET 12")
                        .param("why", why.replace("LONG", "w".repeat(201))),
                422);
        assertThat(page)
                .contains("Not saved yet: 1 field to correct")
                .contains("href=\"#why\"")
                .contains(problem)
                .contains("at most 200 characters, for example: typed wrong")
                .contains("value=\"ET 12\"");
        verifyNothingStored();
    }

    @Test
    void aCorrectionThatChangesNothingNeedsNoReason() throws Exception {
        when(visits.correct(any(), any())).thenReturn(OCTOBER);
        MockHttpServletRequestBuilder same = post(EDIT).param("version", "3");
        VisitForm.of(OCTOBER).text().forEach((field, text) -> same.param(field.column(), text));
        browser.perform(same.with(csrf())).andExpect(redirectedUrl("/children/7?saved=2025-10-06"));
    }

    @Test
    void whatIsPossibleButUnlikelyIsAskedOnceAndItsAnswerIsKept() throws Exception {
        String token = "sign-flipped:worn_right:-4.25";
        String page = page(
                post(NEW)
                        .param("visit_date", "2026-01-05")
                        .param("worn_right", "-4.25")
                        .param("note", "kept"),
                422);
        assertThat(page)
                .contains("Not saved yet: 1 entry is possible, but unlikely")
                .contains("href=\"#worn_right\"")
                .contains("Is the sign right?")
                .contains("name=\"confirmed\" value=\"" + token + "\"")
                .contains(">kept</textarea>");
        verifyNothingStored();
        when(visits.record(any(), any(), any())).thenReturn(OCTOBER);
        browser.perform(post(NEW)
                        .param("visit_date", "2026-01-05")
                        .param("worn_right", "-4.25")
                        .param("confirmed", token)
                        .with(csrf()))
                .andExpect(redirectedUrl("/children/7?saved=2025-10-06"));
        verify(visits)
                .record(
                        any(),
                        any(),
                        argThat(confirmed -> confirmed.size() == 1
                                && confirmed.get(0).token().equals(token)));
    }

    @Test
    void aConfirmationOfAnotherTextDoesNotCount() throws Exception {
        page(
                post(NEW)
                        .param("visit_date", "2026-01-05")
                        .param("worn_right", "-4.25")
                        .param("confirmed", "sign-flipped:worn_right:-4.50"),
                422);
        verifyNothingStored();
    }

    @Test
    void whatWasConfirmedBeforeIsNotAskedAgainInACorrection() throws Exception {
        RecordedVisit march = visit(71, 0, Map.of(Field.VISIT_DATE, "2026-03-02", Field.WORN_RIGHT, "-4.25"));
        when(visits.of(MARA)).thenReturn(List.of(OCTOBER, march));
        when(visits.find(MARA, 71)).thenReturn(Optional.of(march));
        when(visits.changesOf(march))
                .thenReturn(List.of(new VisitChange(
                        march.enteredAt(),
                        "staff",
                        VisitChange.Kind.CONFIRMED,
                        Field.WORN_RIGHT,
                        "",
                        "-4.25",
                        "sign-flipped")));
        when(visits.correct(any(), any())).thenReturn(march);
        browser.perform(post("/children/7/visits/71/edit")
                        .param("version", "0")
                        .param("visit_date", "2026-03-02")
                        .param("worn_right", "-4.25")
                        .param("wear_hours", "9")
                        .param("why", "added later from the notes")
                        .with(csrf()))
                .andExpect(redirectedUrl("/children/7?saved=2026-03-02"));
    }

    @Test
    void aChangeKeepsTheDraftAndIsReadBack() throws Exception {
        when(drafts.keep(any(), anyInt(), any(), any())).thenReturn(true);
        String read = page(
                post(NEW + "/read-back")
                        .param("day", "2026-01-05")
                        .param("visit_date", "2026-01-05")
                        .param("worn_right", "+4.50 -0.50 x 180")
                        .param("turn_cc_near", "ET 30+25")
                        .param("made_left", "3.00"),
                200);
        assertThat(read)
                .contains("hx-swap-oob=\"innerHTML:#worn_right-read\"")
                .contains("SE +4.25 D")
                .contains("SE +0.25 D since 2025-10-06")
                .contains("inward, shows all the time, 59.5 Δ")
                .contains("lacks a sign")
                .contains("The turn is not held with the glasses")
                .contains("Draft kept at ")
                .doesNotContain("<html", "<form");
        verify(drafts)
                .keep(
                        eq(new Draft.Place(7, Draft.NEW, LocalDate.parse("2026-01-05"))),
                        eq(-1),
                        eq(""),
                        argThat(typed -> typed.get(Field.MADE_LEFT).equals("3.00")));
        verifyNothingStored();
    }

    @Test
    void whatIsTooLongToKeepIsSaid() throws Exception {
        assertThat(page(post(NEW + "/read-back").param("note", "x".repeat(500_000)), 200))
                .contains("Too long to keep as a draft");
    }

    @Test
    void aPageThatIsEmptyAgainIsForgotten() throws Exception {
        page(post(NEW + "/read-back").param("day", "2026-01-05").param("visit_date", "2026-01-05"), 200);
        verify(drafts).forget(new Draft.Place(7, Draft.NEW, LocalDate.parse("2026-01-05")));
        verify(drafts, never()).keep(any(), anyInt(), any(), any());
    }

    @Test
    void aDraftIsGoneOnWithAndCanBeThrownAway() throws Exception {
        LocalDate begun = LocalDate.parse("2026-01-05");
        Draft draft = new Draft(
                new Draft.Place(7, Draft.NEW, begun),
                -1,
                "",
                Map.of(Field.TURN_CC_NEAR, "ET 1x", Field.VISIT_DATE, "2026-01-05"),
                Instant.parse("2026-01-05T09:15:00Z"));
        when(drafts.mine()).thenReturn(List.of(draft));
        assertThat(page(get(NEW), 200))
                .contains("It was not saved.")
                .contains("name=\"day\" value=\"2026-01-05\"")
                .contains("value=\"ET 1x\"")
                .contains("Begin another for today");
        assertThat(page(get(NEW + "?another=today"), 200)).doesNotContain("ET 1x");
        browser.perform(post(NEW)
                        .param("discard", "yes")
                        .param("day", "2026-01-05")
                        .with(csrf()))
                .andExpect(redirectedUrl("/children/7"));
        verify(drafts).forget(draft.place());
    }

    @Test
    void aDraftOfACorrectionCarriesTheVersionThatWasReadAndItsReason() throws Exception {
        Draft draft = new Draft(
                new Draft.Place(7, 70, OCTOBER.date()),
                2,
                "read twice",
                Map.of(Field.TURN_CC_NEAR, "ET 12"),
                Instant.parse("2026-01-05T09:15:00Z"));
        when(drafts.find(draft.place())).thenReturn(Optional.of(draft));
        assertThat(page(get(EDIT), 200))
                .contains("name=\"version\" value=\"2\"")
                .contains("value=\"read twice\"")
                .contains("value=\"ET 12\"");
    }

    @Test
    void withoutJavaScriptTheCheckReadsBackTheSame() throws Exception {
        assertThat(page(
                        post(NEW)
                                .param("check", "yes")
                                .param("visit_date", "2026-01-05")
                                .param("wear_hours", "7x"),
                        200))
                .contains("What this visit would raise")
                .contains("7x")
                .contains("Enter");
        verifyNothingStored();
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
