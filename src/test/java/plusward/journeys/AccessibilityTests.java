package plusward.journeys;

import static org.assertj.core.api.Assertions.assertThat;

import com.deque.html.axecore.playwright.AxeBuilder;
import com.deque.html.axecore.results.Rule;
import com.microsoft.playwright.Page;
import com.microsoft.playwright.options.ColorScheme;
import java.util.List;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.springframework.boot.test.web.server.LocalServerPort;

/** WCAG 2.2 AA as far as a machine can tell (axe), on every page, wide and narrow, light and dark. */
@DemonstrationClinic
class AccessibilityTests {

    private static final List<String> WCAG_22_AA = List.of("wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa");

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

    @ParameterizedTest
    @CsvSource({"1280, LIGHT", "1280, DARK", "390, LIGHT"})
    void clinicalPagesHaveNoViolation(int width, ColorScheme scheme) {
        Page page = chromium.page(width, 900, scheme);
        DemonstrationClinic.SignIn.asDoctor(page, address());
        for (String path : List.of(
                "/",
                "/children",
                "/children?q=nobody",
                "/children/new",
                course(page),
                course(page) + "/visits/new",
                course(page) + "/edit",
                course(page) + "/handout",
                "/no-such-page")) {
            assertClean(page, path);
        }
        page.context().close();
    }

    @Test
    void administrationAndSignInHaveNoViolation() {
        Page page = chromium.page();
        assertClean(page, "/sign-in");
        DemonstrationClinic.SignIn.asAdministrator(page, address());
        for (String path : List.of("/exchange", "/people")) {
            assertClean(page, path);
        }
        page.context().close();
    }

    @ParameterizedTest
    @CsvSource({"320", "390", "1280", "2560"})
    void noPageIsWiderThanItsWindow(int width) {
        Page page = chromium.page(width, 900, ColorScheme.LIGHT);
        DemonstrationClinic.SignIn.asDoctor(page, address());
        for (String path :
                List.of("/", "/children", course(page), course(page) + "/visits/new", course(page) + "/handout")) {
            page.navigate(address() + path);
            Object over = page.evaluate("() => document.documentElement.scrollWidth - window.innerWidth");
            assertThat(((Number) over).intValue()).as(path + " at " + width).isLessThanOrEqualTo(0);
        }
        page.context().close();
    }

    /** The course of a child with much to show. */
    private String course(Page page) {
        page.navigate(address() + "/children?q=A-1003");
        return String.valueOf(page.locator("a[href^='/children/']:has-text('Escamilla')")
                .first()
                .getAttribute("href"));
    }

    private void assertClean(Page page, String path) {
        page.navigate(address() + path);
        page.evaluate("() => document.querySelectorAll('details').forEach(folded => { folded.open = true; })");
        List<String> violations = new AxeBuilder(page)
                .withTags(WCAG_22_AA).analyze().getViolations().stream()
                        .map(AccessibilityTests::worded)
                        .toList();
        assertThat(violations).as(path).isEmpty();
    }

    private static String worded(Rule rule) {
        return rule.getId() + ": " + rule.getHelp() + " "
                + rule.getNodes().get(0).getHtml();
    }

    private String address() {
        return "http://localhost:" + port;
    }
}
