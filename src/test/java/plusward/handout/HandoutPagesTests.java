package plusward.handout;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.containsString;
import static org.mockito.BDDMockito.given;
import static org.springframework.security.test.web.servlet.request.SecurityMockMvcRequestPostProcessors.user;
import static org.springframework.test.web.servlet.request.MockMvcRequestBuilders.get;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.content;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.status;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.context.annotation.Import;
import org.springframework.test.context.bean.override.mockito.MockitoBean;
import org.springframework.test.web.servlet.MockMvc;
import org.springframework.test.web.servlet.request.RequestPostProcessor;
import plusward.child.ChildCard;
import plusward.child.Children;
import plusward.course.Course;
import plusward.course.CourseText;
import plusward.exam.Examination;
import plusward.visit.Visits;
import plusward.web.PageSlice;
import plusward.web.PdfPrinter;

@PageSlice({HandoutController.class, HandoutApi.class})
@Import({PdfPrinter.class, Handouts.class, SheetWriter.class})
class HandoutPagesTests {

    private static final ChildCard CHILD =
            new ChildCard(1, "A-1", "Mara", "Ellwood", CourseText.BORN, null, "en", null, 0);
    private static final RequestPostProcessor STAFF = user("staff").roles("STAFF");
    private static final RequestPostProcessor MACHINE = user("machine").roles("MACHINE");
    private static final String[] LONGEST = {
        "worn_add=2.50", "turn_cc_near=ET 20", "turn_add_near=ET 14", "segment_right_mm=-5", "segment_left_mm=-5",
        "acuity_left=20/100", "wear_hours=3", "ordered_right=+4.50", "ordered_left=+4.50", "ordered_add=2.50"
    };

    @Autowired
    private MockMvc browser;

    @MockitoBean
    private Children children;

    @MockitoBean
    private Visits visits;

    @BeforeEach
    void oneChild() {
        given(children.find(1)).willReturn(Optional.of(CHILD));
        given(children.findByClinicNumber("A-1")).willReturn(Optional.of(CHILD));
        seen(CourseText.exam(Sheets.HELD));
    }

    private void seen(Examination... exams) {
        given(visits.courseOf(CHILD)).willReturn(new Course(CourseText.patient("2019-05-02"), List.of(exams)));
    }

    private byte[] pdf(String address) throws Exception {
        return browser.perform(get(address).with(STAFF))
                .andExpect(status().isOk())
                .andExpect(content().contentType("application/pdf"))
                .andReturn()
                .getResponse()
                .getContentAsByteArray();
    }

    @Test
    void thePreviewShowsTheSheetAndItsGrade() throws Exception {
        browser.perform(get("/children/1/handout").with(STAFF))
                .andExpect(status().isOk())
                .andExpect(content().string(containsString("Mara")))
                .andExpect(content().string(containsString("Flesch-Kincaid")));
    }

    @Test
    void thePdfHoldsTheChildsNumbers() throws Exception {
        try (PDDocument document = Loader.loadPDF(pdf("/children/1/handout.pdf"))) {
            assertThat(new PDFTextStripper().getText(document))
                    .contains("Mara")
                    .contains("+4.00 D")
                    .contains("ET 30");
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"a4", "letter"})
    void thePdfIsTaggedInItsLanguageWithATitleAndEmbeddedFontsOnTwoPagesAtMost(String paper) throws Exception {
        seen(CourseText.exam(
                Stream.concat(Stream.of(Sheets.HELD), Stream.of(LONGEST)).toArray(String[]::new)));
        try (PDDocument document = Loader.loadPDF(pdf("/children/1/handout.pdf?paper=" + paper))) {
            assertThat(document.getNumberOfPages()).isLessThanOrEqualTo(2);
            assertThat(document.getDocumentCatalog().getLanguage()).isEqualTo("en");
            assertThat(document.getDocumentCatalog().getMarkInfo().isMarked()).isTrue();
            assertThat(document.getDocumentCatalog().getStructureTreeRoot()).isNotNull();
            assertThat(document.getDocumentInformation().getTitle()).contains("Mara");
            assertThat(fontsEmbedded(document)).isNotEmpty().doesNotContain(false);
        }
    }

    private static List<Boolean> fontsEmbedded(PDDocument document) throws IOException {
        List<Boolean> embedded = new ArrayList<>();
        for (PDPage page : document.getPages()) {
            for (COSName name : page.getResources().getFontNames()) {
                embedded.add(page.getResources().getFont(name).isEmbedded());
            }
        }
        return embedded;
    }

    @Test
    void withoutATrueSheetThePageSaysWhatIsMissing() throws Exception {
        seen(CourseText.exam());
        browser.perform(get("/children/1/handout").with(STAFF))
                .andExpect(status().isUnprocessableContent())
                .andExpect(content().string(containsString("cycloplegic")));
        browser.perform(get("/api/children/A-1/handout.pdf").with(MACHINE))
                .andExpect(status().isUnprocessableContent())
                .andExpect(content().contentType("application/problem+json"));
    }

    @Test
    void aLanguageThatIsNotWrittenIsRefused() throws Exception {
        browser.perform(get("/api/children/A-1/handout.pdf?language=xx").with(MACHINE))
                .andExpect(status().isUnprocessableContent());
    }

    @Test
    void anUnknownChildIsNotFound() throws Exception {
        browser.perform(get("/children/2/handout.pdf").with(STAFF)).andExpect(status().isNotFound());
        browser.perform(get("/api/children/A-9/handout.pdf").with(MACHINE)).andExpect(status().isNotFound());
    }
}
