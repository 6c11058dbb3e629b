package plusward.people;

import static org.springframework.security.test.web.servlet.request.SecurityMockMvcRequestPostProcessors.user;
import static org.springframework.test.web.servlet.request.MockMvcRequestBuilders.get;
import static org.springframework.test.web.servlet.request.MockMvcRequestBuilders.post;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.header;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.redirectedUrl;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.status;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.test.web.servlet.MockMvc;
import plusward.web.PageSlice;

/** The rules alone: only the sign-in page exists here, so that 404 means let through and 403 means refused. */
@PageSlice(SignInController.class)
class WhoMayOpenWhatTests {

    @Autowired
    MockMvc browser;

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, textBlock = """
            path,                      staff, doctor, administrator, machine
            /,                         404,   404,    403,           403
            /children,                 404,   404,    403,           403
            /children/1/visits/new,    404,   404,    403,           403
            /children/1/course.json,   404,   404,    403,           403
            /recall,                   404,   404,    403,           403
            /limits,                   403,   404,    403,           403
            /exchange,                 403,   403,    404,           403
            /exchange/preview,         403,   403,    404,           403
            /people,                   403,   403,    404,           403
            /trail,                    403,   403,    404,           403
            /api/export.zip,           403,   403,    404,           404
            /not-yet-thought-of,       404,   404,    403,           403
            """)
    void eachRoleOpensItsOwnPages(String path, int staff, int doctor, int administrator, int machine) throws Exception {
        expect(path, "STAFF", staff);
        expect(path, "DOCTOR", doctor);
        expect(path, "ADMINISTRATOR", administrator);
        expect(path, "MACHINE", machine);
    }

    private void expect(String path, String role, int status) throws Exception {
        browser.perform(get(path).with(user("someone").roles(role))).andExpect(status().is(status));
    }

    @ParameterizedTest
    @CsvSource({"/", "/children", "/exchange", "/people", "/actuator/env", "/h2-console"})
    void aStrangerIsAskedToSignIn(String path) throws Exception {
        browser.perform(get(path)).andExpect(status().isFound()).andExpect(redirectedUrl("/sign-in"));
    }

    @ParameterizedTest
    @CsvSource({"/app.css", "/icon.svg", "/focus.js", "/webjars/htmx.org/dist/htmx.min.js", "/sign-in"})
    void aStrangerMayReadWhatTheSignInPageNeeds(String path) throws Exception {
        browser.perform(get(path)).andExpect(status().isOk());
    }

    @Test
    void aStrangeProgramIsChallengedWithoutASession() throws Exception {
        browser.perform(get("/api/export.zip"))
                .andExpect(status().isUnauthorized())
                .andExpect(header().exists("WWW-Authenticate"))
                .andExpect(header().doesNotExist("Set-Cookie"));
    }

    @Test
    void aPieceOfAPageIsNotReplacedByTheSignInPage() throws Exception {
        browser.perform(get("/children").header("HX-Request", "true")).andExpect(status().isUnauthorized());
        browser.perform(post("/children").header("HX-Request", "true")).andExpect(status().isUnauthorized());
    }

    @Test
    void aFormSentAfterTheSignInLapsedLeadsBackToTheForm() throws Exception {
        browser.perform(post("/children/7/visits").header("Referer", "http://localhost:8080/children/7/visits/new"))
                .andExpect(redirectedUrl("/sign-in?away&back=%2Fchildren%2F7%2Fvisits%2Fnew"));
    }

    @Test
    void aFormWithoutItsTokenIsRefusedToSomeoneWhoIsSignedIn() throws Exception {
        browser.perform(post("/children").with(user("someone").roles("STAFF"))).andExpect(status().isForbidden());
    }

    @Test
    void programsNeedNoToken() throws Exception {
        browser.perform(post("/api/import").with(user("someone").roles("MACHINE")))
                .andExpect(status().isNotFound());
    }
}
