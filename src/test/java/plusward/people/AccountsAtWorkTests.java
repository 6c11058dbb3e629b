package plusward.people;

import static org.assertj.core.api.Assertions.assertThat;

import java.net.http.HttpResponse;
import java.util.Map;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.springframework.boot.test.context.SpringBootTest;
import org.springframework.boot.test.context.SpringBootTest.WebEnvironment;
import org.springframework.boot.test.web.server.LocalServerPort;
import plusward.web.AClinicInMemory;
import plusward.web.Browser;

/** The whole application, started unattended with an administrator from the environment. */
@SpringBootTest(
        webEnvironment = WebEnvironment.RANDOM_PORT,
        properties = {"PLUSWARD_ADMIN_NAME=Root", "PLUSWARD_ADMIN_PASSWORD=orchard steps lamp"})
@AClinicInMemory
class AccountsAtWorkTests {

    private static final String PASSWORD = "orchard steps lamp";

    @LocalServerPort
    int port;

    private Browser administrator;

    @BeforeEach
    void signIn() throws Exception {
        administrator = new Browser(port);
        assertThat(administrator.signIn("root", PASSWORD).uri().getPath()).isEqualTo("/exchange");
    }

    @Test
    void aFailedSignInSaysTheSameWhicheverWasWrong() throws Exception {
        String wrongName =
                withoutToken(new Browser(port).signIn("nobody", PASSWORD).body());
        String wrongPassword =
                withoutToken(new Browser(port).signIn("root", "something else").body());
        assertThat(wrongName).contains("Name and password do not match").isEqualTo(wrongPassword);
    }

    @Test
    void aProgramMayNotGuessEither() throws Exception {
        HttpResponse<String> answer = new Browser(port).getAs("root", "something else", "/api/export.zip");
        assertThat(answer.statusCode()).isEqualTo(401);
        assertThat(answer.headers().firstValue("Content-Type")).contains("application/problem+json");
        assertThat(answer.body()).contains("\"status\":401").contains("Sign in with HTTP Basic");
    }

    @Test
    void anAccountIsAddedSignsInAndIsClosed() throws Exception {
        HttpResponse<String> list = add("r.tamsin", "R. Tamsin", "plain words here", "STAFF");
        assertThat(list.uri().getPath()).isEqualTo("/people");
        assertThat(list.body()).contains("r.tamsin").contains("R. Tamsin").contains(">staff<");
        Browser staff = new Browser(port);
        assertThat(staff.signIn("R.Tamsin", "plain words here").uri().getPath()).isEqualTo("/");
        close("r.tamsin");
        assertThat(staff.get("/children").uri().getPath()).isEqualTo("/sign-in");
        assertThat(staff.signIn("r.tamsin", "plain words here").body()).contains("Name and password do not match");
    }

    @Test
    void everyMistakeIsNamedAtOnceAndNothingIsStored() throws Exception {
        HttpResponse<String> page =
                administrator.submit("/people/new", Map.of("name", "a b", "displayName", "", "password", "short"));
        assertThat(page.body())
                .contains("4 things to correct")
                .contains("href=\"#name\"")
                .contains("href=\"#displayName\"")
                .contains("href=\"#password\"")
                .contains("href=\"#roles\"")
                .contains("value=\"a b\"")
                .doesNotContain("value=\"short\"");
    }

    @Test
    void aNameIsGivenOnlyOnce() throws Exception {
        assertThat(add("ROOT", "Another", "plain words here", "STAFF").body())
                .contains("already an account of this name");
    }

    @Test
    void theLastAdministratorCannotBeShutOut() throws Exception {
        assertThat(close("root").body()).contains("the last open account that administers the others");
    }

    @Test
    void aFormShownBeforeSomeoneElsesChangeOverwritesNothing() throws Exception {
        add("o.vellacott", "Dr. O. Vellacott", "plain words here", "DOCTOR");
        change("o.vellacott", "0", "First");
        HttpResponse<String> late = change("o.vellacott", "0", "Second");
        assertThat(late.statusCode()).isEqualTo(409);
        assertThat(late.body()).contains("Someone else saved this first");
        assertThat(administrator.get("/people").body()).contains("First").doesNotContain("Second");
    }

    @Test
    void anUnknownAccountIsAPageThatDoesNotExist() throws Exception {
        assertThat(administrator.get("/people/nobody").statusCode()).isEqualTo(404);
    }

    @Test
    void aFormFromAnEarlierSignInSaysWhyItWasNotStored() throws Exception {
        HttpResponse<String> page = administrator.submit("/app.css", "/people/new", Map.of("name", "without-token"));
        assertThat(page.statusCode()).isEqualTo(403);
        assertThat(page.body()).contains("This page was open for too long").doesNotContain("??");
    }

    @Test
    void signingOutEndsTheSession() throws Exception {
        assertThat(administrator.submit("/people", "/sign-out", Map.of()).body())
                .contains("You are signed out");
        assertThat(administrator.get("/people").uri().getPath()).isEqualTo("/sign-in");
    }

    private HttpResponse<String> add(String name, String displayName, String password, String role) throws Exception {
        return administrator.submit(
                "/people/new", Map.of("name", name, "displayName", displayName, "password", password, "roles", role));
    }

    private HttpResponse<String> change(String name, String version, String displayName) throws Exception {
        return administrator.submit(
                "/people/" + name,
                Map.of("name", name, "version", version, "displayName", displayName, "roles", "DOCTOR"));
    }

    private HttpResponse<String> close(String name) throws Exception {
        return administrator.submit(
                "/people/" + name,
                Map.of("name", name, "version", "0", "displayName", "R. Tamsin", "roles", "STAFF", "closed", "true"));
    }

    private static String withoutToken(String page) {
        return page.replaceAll("name=\"_csrf\" value=\"[^\"]+\"", "");
    }
}
