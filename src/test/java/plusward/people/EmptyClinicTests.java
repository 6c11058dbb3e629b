package plusward.people;

import static org.assertj.core.api.Assertions.assertThat;

import java.net.http.HttpResponse;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.context.SpringBootTest;
import org.springframework.boot.test.context.SpringBootTest.WebEnvironment;
import org.springframework.boot.test.web.server.LocalServerPort;
import plusward.web.AClinicInMemory;
import plusward.web.Browser;

/** The whole application with nobody in it, from the first page to the first administrator at work. */
@SpringBootTest(webEnvironment = WebEnvironment.RANDOM_PORT)
@AClinicInMemory
class EmptyClinicTests {

    @LocalServerPort
    int port;

    @Autowired
    OneTimeCode code;

    @Autowired
    Welcome welcome;

    @Test
    void isTakenOverOnceByWhoeverSeesTheConsole() throws Exception {
        Browser browser = new Browser(port);
        everyPageLeadsToTheFirstAdministrator(browser);
        theConsoleShowsTheCode();
        aWrongCodeOrAShortPasswordMakesNobody(browser);
        theRightCodeMakesTheAdministrator(browser);
        thePageIsGoneAfterwards(browser);
        theAdministratorLandsOnTheExchangeAndMayNotOpenClinicalPages(browser);
        theMachineDoorKnowsTheAccountAtOnce();
    }

    private void everyPageLeadsToTheFirstAdministrator(Browser browser) throws Exception {
        for (String path : new String[] {"/", "/children", "/sign-in", "/people", "/nowhere"}) {
            HttpResponse<String> page = browser.get(path);
            assertThat(page.uri().getPath()).isEqualTo("/first-administrator");
            assertThat(page.body()).contains("Make the first administrator").doesNotContain("??");
        }
        assertThat(browser.get("/app.css").statusCode()).isEqualTo(200);
        assertThat(browser.get("/actuator/health").body()).isEqualTo("{\"status\":\"UP\"}");
    }

    private void theConsoleShowsTheCode() {
        assertThat(welcome.text())
                .contains("http://localhost:" + port + "/")
                .contains(code.printed())
                .doesNotContain("plain glass morning");
    }

    private void aWrongCodeOrAShortPasswordMakesNobody(Browser browser) throws Exception {
        assertThat(make(browser, "AAAA-AAAA-AAAA-AAAA", "long enough words").body())
                .contains("this is not the code on the console")
                .contains("<title>Error: ")
                .contains("role=\"alert\"");
        assertThat(make(browser, code.printed(), "too short 1").body()).contains("type 12 characters or more");
        assertThat(browser.get("/").uri().getPath()).isEqualTo("/first-administrator");
    }

    private void theRightCodeMakesTheAdministrator(Browser browser) throws Exception {
        HttpResponse<String> page = make(browser, code.printed().toLowerCase(Locale.ROOT), "long enough words");
        assertThat(page.uri().getPath()).isEqualTo("/sign-in");
        assertThat(page.body()).contains("The account is made");
    }

    private void thePageIsGoneAfterwards(Browser browser) throws Exception {
        assertThat(browser.get("/first-administrator").statusCode()).isEqualTo(404);
        assertThat(welcome.text()).doesNotContain(code.printed());
    }

    private void theAdministratorLandsOnTheExchangeAndMayNotOpenClinicalPages(Browser browser) throws Exception {
        assertThat(browser.signIn("P.Quillfeather", "long enough words").uri().getPath())
                .isEqualTo("/exchange");
        HttpResponse<String> refused = browser.get("/children");
        assertThat(refused.statusCode()).isEqualTo(403);
        assertThat(refused.body())
                .contains("Your account may not open this page")
                .contains("P. Quillfeather");
    }

    private void theMachineDoorKnowsTheAccountAtOnce() throws Exception {
        HttpResponse<String> answer =
                new Browser(port).getAs("p.quillfeather", "long enough words", "/api/nothing-here");
        assertThat(answer.statusCode()).isEqualTo(404);
        assertThat(answer.headers().firstValue("Content-Type")).contains("application/problem+json");
        assertThat(answer.headers().firstValue("Set-Cookie")).isEmpty();
    }

    private HttpResponse<String> make(Browser browser, String typedCode, String password) throws Exception {
        return browser.submit(
                "/first-administrator",
                new TreeMap<>(Map.of(
                        "code",
                        typedCode,
                        "name",
                        "p.quillfeather",
                        "displayName",
                        "P. Quillfeather",
                        "password",
                        password)));
    }
}
