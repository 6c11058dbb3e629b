package plusward.review;

import static org.hamcrest.Matchers.containsInAnyOrder;
import static org.hamcrest.Matchers.containsString;
import static org.hamcrest.Matchers.hasItem;
import static org.hamcrest.Matchers.not;
import static org.mockito.BDDMockito.given;
import static org.springframework.security.test.web.servlet.request.SecurityMockMvcRequestPostProcessors.httpBasic;
import static org.springframework.security.test.web.servlet.request.SecurityMockMvcRequestPostProcessors.user;
import static org.springframework.test.web.servlet.request.MockMvcRequestBuilders.get;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.content;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.jsonPath;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.status;

import java.time.Instant;
import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.context.annotation.Import;
import org.springframework.test.context.bean.override.mockito.MockitoBean;
import org.springframework.test.web.servlet.MockMvc;
import org.springframework.test.web.servlet.ResultActions;
import org.springframework.test.web.servlet.request.RequestPostProcessor;
import plusward.child.ChildCard;
import plusward.child.Children;
import plusward.course.Course;
import plusward.course.CourseText;
import plusward.exam.Examination;
import plusward.visit.RecordedVisit;
import plusward.visit.Visits;
import plusward.web.PageSlice;

@PageSlice(CourseController.class)
@Import({CoursePages.class, CourseDocuments.class, EvidenceLabels.class})
class CoursePageTests {

    private static final ChildCard CHILD =
            new ChildCard(7, "A-1", "Ada", "Brook", LocalDate.parse("2019-05-02"), 30, "en", null, 0);
    private static final RequestPostProcessor DOCTOR = user("doctor").roles("DOCTOR");

    @Autowired
    private MockMvc mvc;

    @MockitoBean
    private Children children;

    @MockitoBean
    private Visits visits;

    @BeforeEach
    void oneChild() {
        given(children.find(7)).willReturn(Optional.of(CHILD));
        given(children.findByClinicNumber("A-1")).willReturn(Optional.of(CHILD));
    }

    /** The worked example of the model: base 2 Δ, 4 Δ for each dioptre; near exceeds distance by 12 Δ through the add. */
    private static Examination workedExample() {
        return CourseText.exam(
                "worn_right=+3.00",
                "worn_left=+3.00",
                "worn_add=2.00",
                "cycloplegic_right=+3.00",
                "cycloplegic_left=+3.00",
                "turn_sc_distance=ET 14",
                "turn_sc_near=ET 26",
                "turn_cc_distance=E 2",
                "turn_cc_near=ET 14",
                "turn_add_near=E 6",
                "segment_right_mm=-3.5",
                "segment_left_mm=-3.0",
                "pupil_mm=4");
    }

    private ResultActions page(Examination... exams) throws Exception {
        recorded(exams);
        return mvc.perform(get("/children/7").with(DOCTOR));
    }

    private ResultActions data(Examination... exams) throws Exception {
        recorded(exams);
        return mvc.perform(get("/children/7/course.json").with(DOCTOR));
    }

    private void recorded(Examination... exams) {
        given(visits.of(CHILD))
                .willReturn(
                        List.of(exams).stream().map(CoursePageTests::recorded).toList());
        given(visits.courseOf(CHILD)).willReturn(new Course(CHILD.patient(), List.of(exams)));
    }

    private static RecordedVisit recorded(Examination exam) {
        return new RecordedVisit(exam.date().toEpochDay(), 0, exam, "staff", Instant.EPOCH, "staff", Instant.EPOCH);
    }

    @Test
    void theFirstLineAnswersAndSaysSinceWhen() throws Exception {
        page(workedExample())
                .andExpect(status().isOk())
                .andExpect(content()
                        .string(containsString("With the glasses the turn is held, at near only through the add")))
                .andExpect(content().string(containsString("since 2025-03-14")));
    }

    @Test
    void aSegmentBelowThePupilIsShownWithItsNumbersAndItsSource() throws Exception {
        page(workedExample())
                .andExpect(content().string(containsString("The segment sits below the pupil")))
                .andExpect(content().string(containsString("right +1.5 mm")))
                .andExpect(content().string(containsString("ANSI Z80.1")));
    }

    @Test
    void aChangeIsShownWithTheConditionInWords() throws Exception {
        page(distanceTurn("2025-01-10", "E 2"), distanceTurn("2025-03-14", "E 4"))
                .andExpect(content().string(containsString("at distance, with glasses; since 2025-01-10")))
                .andExpect(content().string(not(containsString("at cc-distance"))));
    }

    @Test
    void theModelIsSaidInASentenceWithItsUncertainty() throws Exception {
        page(workedExample()).andExpect(content().string(containsString("About 4 Δ of turn")));
    }

    @Test
    void aChildWithoutVisitsHasAPageThatSaysSo() throws Exception {
        page().andExpect(status().isOk()).andExpect(content().string(containsString("No visit yet")));
    }

    @Test
    void anEmptyVisitIsNotCalledNormal() throws Exception {
        page(CourseText.exam())
                .andExpect(content().string(containsString("cannot be told")))
                .andExpect(content().string(not(containsString("the turn is held,"))));
    }

    @Test
    void namesAreEscaped() throws Exception {
        ChildCard hostile = new ChildCard(8, "A-2", "<script>x</script>", null, CHILD.bornOn(), null, "en", null, 0);
        given(children.find(8)).willReturn(Optional.of(hostile));
        given(visits.of(hostile)).willReturn(List.of());
        mvc.perform(get("/children/8").with(DOCTOR)).andExpect(content().string(not(containsString("<script>x"))));
    }

    @Test
    void anUnknownChildIsNotFound() throws Exception {
        given(children.find(9)).willReturn(Optional.empty());
        mvc.perform(get("/children/9").with(DOCTOR)).andExpect(status().isNotFound());
        mvc.perform(get("/children/9/course.json").with(DOCTOR)).andExpect(status().isNotFound());
    }

    @Test
    void theDataHasTheNamesOfTheFixedFormat() throws Exception {
        data(workedExample())
                .andExpect(jsonPath("$.clinicNumber").value("A-1"))
                .andExpect(jsonPath("$.bornOn").value("2019-05-02"))
                .andExpect(jsonPath("$.pattern.kind").value("convergence-excess"))
                .andExpect(jsonPath("$.pattern.because[0]").isString())
                .andExpect(jsonPath("$.trend.right").isMap())
                .andExpect(jsonPath("$.visits[0].date").value("2025-03-14"))
                .andExpect(jsonPath("$.visits[0].ageYears").value(5.87))
                .andExpect(jsonPath("$.visits[0].control.state").value("held-through-add"))
                .andExpect(jsonPath("$.visits[0].control.because").isString());
    }

    @Test
    void theDataHoldsTheDerivedValues() throws Exception {
        String derived = "$.visits[0].derived.";
        data(workedExample())
                .andExpect(jsonPath(derived + "cycloplegicSeRight").value(3.0))
                .andExpect(jsonPath(derived + "plusShortLeft").value(0.0))
                .andExpect(jsonPath(derived + "turns.keys()")
                        .value(containsInAnyOrder(
                                "scDistance", "scNear", "ccDistance", "ccNear", "addNear", "trialNear")))
                .andExpect(jsonPath(derived + "turns.ccNear").value(14.0))
                .andExpect(jsonPath(derived + "turns.trialNear").isEmpty())
                // read 2 Δ through +3.00: 2/(1 − 0.025 × 3) = 2.162
                .andExpect(jsonPath(derived + "turnsTrue.ccDistance").value(2.162))
                .andExpect(jsonPath(derived + "acaGradient.value").value(4.0))
                .andExpect(jsonPath(derived + "accommodativeModel.base").value(2.0))
                .andExpect(jsonPath(derived + "accommodativeModel.perDioptre").value(4.0))
                .andExpect(jsonPath(derived + "accommodativeModel.nearExtra").value(0.0))
                .andExpect(jsonPath(derived + "accommodativeModel.from").value(5))
                // pupil 4 mm: the edge is at −2.0, so −3.5 lies 1.5 below and −3.0 lies 1.0 below
                .andExpect(jsonPath(derived + "segmentBelowEdgeRight").value(1.5))
                .andExpect(jsonPath(derived + "segmentBelowEdgeLeft").value(1.0));
    }

    @Test
    void aFindingCarriesWeightTextEvidenceAndSource() throws Exception {
        String finding = "$.visits[0].findings[?(@.code=='segment-below-pupil')].";
        data(workedExample())
                .andExpect(jsonPath(finding + "weight").value(hasItem("act")))
                .andExpect(jsonPath(finding + "evidence.limit").value(hasItem(1.0)))
                .andExpect(jsonPath(finding + "checkFirst[0]").isNotEmpty())
                .andExpect(jsonPath(finding + "source").value(hasItem(containsString("ANSI Z80.1"))));
    }

    @Test
    void aChangeCarriesTheConditionAsItsCode() throws Exception {
        data(distanceTurn("2025-01-10", "E 2"), distanceTurn("2025-03-14", "E 4"))
                .andExpect(jsonPath("$.visits[1].findings[?(@.code=='within-noise')].evidence.condition")
                        .value(hasItem("cc-distance")));
    }

    private static Examination distanceTurn(String day, String turn) {
        return CourseText.exam("visit_date=" + day, "worn_right=+3.00", "worn_left=+3.00", "turn_cc_distance=" + turn);
    }

    @Test
    void aDoctorMayReadAndAnAdministratorAloneMayNot() throws Exception {
        page(workedExample()).andExpect(status().isOk());
        mvc.perform(get("/children/7").with(user("admin").roles("ADMINISTRATOR")))
                .andExpect(status().isForbidden());
    }

    @Test
    void theMachineDoorGivesTheSameDocument() throws Exception {
        String page = data(workedExample()).andReturn().getResponse().getContentAsString();
        mvc.perform(get("/api/children/A-1/course").with(user("machine").roles("MACHINE")))
                .andExpect(status().isOk())
                .andExpect(content().json(page));
        mvc.perform(get("/api/children/A-1/course").with(httpBasic("nobody", "wrong")))
                .andExpect(status().isUnauthorized());
    }
}
