package plusward.journeys;

import static com.microsoft.playwright.assertions.PlaywrightAssertions.assertThat;
import static org.assertj.core.api.Assertions.assertThat;

import com.microsoft.playwright.Locator;
import com.microsoft.playwright.Page;
import java.io.IOException;
import java.util.LinkedHashMap;
import java.util.Map;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.springframework.boot.test.web.server.LocalServerPort;
import plusward.exam.Field;

/** The main job from end to end in a real browser: a visit logged, a course read, a handout printed. */
@DemonstrationClinic
class MainJobTests {

    private static Chromium chromium;

    @LocalServerPort
    private int port;

    @BeforeAll
    static void startBrowser() {
        chromium = Chromium.start();
    }

    @AfterAll
    static void stopBrowser() {
        if (chromium != null) {
            chromium.close();
        }
    }

    @Test
    void aVisitTypedWithEveryFieldIsReadOnTheCourseAndGoesHomeOnPaper() throws IOException {
        Page page = chromium.page();
        DemonstrationClinic.SignIn.asDoctor(page, address());
        String course = addChild(page);

        page.navigate(course + "/visits/new");
        everyField().forEach((field, text) -> type(page, field, text));
        page.locator("button[type=submit][value=save], .savebar button[type=submit]")
                .first()
                .click();
        page.waitForURL(url -> url.startsWith(course) && !url.contains("/visits"));

        assertThat(page.locator("h1.answer")).containsText("not held at near");
        assertThat(page.locator(".finding")
                        .filter(new Locator.FilterOptions().setHasText("1.75 mm"))
                        .first())
                .isVisible();
        assertDrawn(page, "#chart1-plot");
        assertDrawn(page, "#chart2-plot");
        assertThat(body(page, course + "/course.json"))
                .contains("\"ccNear\":22.0")
                .contains("segment-below-pupil");
        assertThat(pdfText(page, course + "/handout.pdf")).contains("Wilmot").contains("+4.00");
    }

    private static String addChild(Page page) {
        page.navigate(page.url().replaceAll("(https?://[^/]+).*", "$1/children/new"));
        page.locator("[name=clinicNumber]").fill("J-1");
        page.locator("[name=givenName]").fill("Wilmot");
        page.locator("[name=familyName]").fill("Tarrant");
        page.locator("[name=bornOn]").fill("2020-05-02");
        page.locator("main form button[type=submit]:not([name])").first().click();
        page.waitForURL(url -> url.matches(".*/children/\\d+.*"));
        return page.url().replaceAll("[?#].*", "");
    }

    private static void type(Page page, Field field, String text) {
        Locator input = page.locator("[name=" + field.column() + "]");
        Locator folded = page.locator("details:not([open])").filter(new Locator.FilterOptions().setHas(input));
        if (folded.count() > 0) {
            folded.locator("summary").press("Enter");
        }
        if (input.evaluate("e => e.tagName").equals("SELECT")) {
            input.selectOption(text);
        } else {
            input.fill(text);
        }
    }

    private static Map<Field, String> everyField() {
        Map<Field, String> visit = new LinkedHashMap<>();
        visit.put(Field.VISIT_DATE, "2026-11-24");
        visit.put(Field.EXAMINER, "R. Tamsin");
        visit.put(Field.WEAR_HOURS, "13");
        visit.put(Field.WORN_RIGHT, "+4.00 -0.50 x 180");
        visit.put(Field.WORN_LEFT, "+4.25 -0.50 x 175");
        visit.put(Field.WORN_ADD, "2.50");
        visit.put(Field.WORN_SINCE, "2026-08-01");
        visit.put(Field.MADE_RIGHT, "+4.00 -0.50 x 180");
        visit.put(Field.MADE_LEFT, "+4.25 -0.50 x 174");
        visit.put(Field.MADE_ADD, "2.50");
        visit.put(Field.CYCLOPLEGIC_RIGHT, "+4.25 -0.50 x 180");
        visit.put(Field.CYCLOPLEGIC_LEFT, "+4.50 -0.50 x 175");
        visit.put(Field.CYCLOPLEGIC_AGENT, "cyclopentolate");
        visit.put(Field.MANIFEST_RIGHT, "+2.50 -0.50 x 180");
        visit.put(Field.MANIFEST_LEFT, "+2.75 -0.50 x 175");
        visit.put(Field.TURN_SC_DISTANCE, "ET 25");
        visit.put(Field.TURN_SC_NEAR, "ET' 20+15");
        visit.put(Field.TURN_CC_DISTANCE, "E 4");
        visit.put(Field.TURN_CC_NEAR, "ET 22");
        visit.put(Field.TURN_ADD_NEAR, "E(T) 14");
        visit.put(Field.TRIAL_PLUS, "3.00");
        visit.put(Field.TURN_TRIAL_NEAR, "E 8");
        visit.put(Field.SEGMENT_STYLE, "flat-top 28");
        visit.put(Field.SEGMENT_RIGHT_MM, "-4.0");
        visit.put(Field.SEGMENT_LEFT_MM, "-4.0");
        visit.put(Field.PUPIL_MM, "4.5");
        visit.put(Field.PD_MM, "52");
        visit.put(Field.ACUITY_RIGHT, "20/25");
        visit.put(Field.ACUITY_LEFT, "20/25-2");
        visit.put(Field.ACUITY_BOTH, "20/20");
        visit.put(Field.ACUITY_SC_RIGHT, "20/32");
        visit.put(Field.ACUITY_SC_LEFT, "20/40");
        visit.put(Field.ACUITY_SC_BOTH, "20/32");
        visit.put(Field.STEREO_ARCSEC, "400");
        visit.put(Field.ORDERED_RIGHT, "+4.25 -0.50 x 180");
        visit.put(Field.ORDERED_LEFT, "+4.50 -0.50 x 175");
        visit.put(Field.ORDERED_ADD, "2.50");
        visit.put(Field.NEXT_VISIT_WEEKS, "8");
        visit.put(Field.TURN_CC_UP, "E 2");
        visit.put(Field.TURN_CC_DOWN, "ET 12");
        visit.put(Field.TURN_CC_RIGHT_GAZE, "E 4");
        visit.put(Field.TURN_CC_LEFT_GAZE, "E 4 RH 2");
        visit.put(Field.DUCTIONS, "right adduction, left adduction");
        visit.put(Field.FIXATION_PREFERENCE, "prefers right");
        visit.put(Field.CYCLOPLEGIC_DROPS, "2");
        visit.put(Field.CYCLOPLEGIC_MINUTES, "40");
        visit.put(Field.SEGMENT_HEIGHT_RIGHT_MM, "15.5");
        visit.put(Field.SEGMENT_HEIGHT_LEFT_MM, "15.5");
        visit.put(Field.PUPIL_HEIGHT_RIGHT_MM, "19.5");
        visit.put(Field.PUPIL_HEIGHT_LEFT_MM, "19.5");
        visit.put(Field.NOTE, "Line sits low; refit.");
        return visit;
    }

    private static void assertDrawn(Page page, String canvas) {
        page.waitForFunction("() => document.documentElement.dataset.charts === 'drawn'");
        Object inked = page.locator(canvas)
                .evaluate("c => { const d = c.getContext('2d').getImageData(0, 0, c.width, c.height).data;"
                        + " let n = 0; for (let i = 3; i < d.length; i += 4) if (d[i] > 0) n++; return n; }");
        assertThat(((Number) inked).intValue()).isGreaterThan(2000);
    }

    private static String body(Page page, String address) {
        return page.context().request().get(address).text();
    }

    private static String pdfText(Page page, String address) throws IOException {
        try (PDDocument document =
                Loader.loadPDF(page.context().request().get(address).body())) {
            return new PDFTextStripper().getText(document);
        }
    }

    private String address() {
        return "http://localhost:" + port;
    }
}
