package plusward.people;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.springframework.mock.web.MockHttpServletRequest;
import org.springframework.mock.web.MockHttpServletResponse;
import org.springframework.security.authentication.TestingAuthenticationToken;
import org.springframework.security.web.savedrequest.NullRequestCache;

class LandingTests {

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, textBlock = """
            role,          back,                   lands on
            STAFF,         ,                       /
            DOCTOR,        ,                       /
            ADMINISTRATOR, ,                       /exchange
            STAFF,         /children/7/visits/new, /children/7/visits/new
            STAFF,         //elsewhere.example,    /
            STAFF,         https://elsewhere.example, /
            STAFF,         '/\\elsewhere.example', /
            STAFF,         /sign-out?x=1,          /
            """)
    void leadsToTheFirstPageOfTheRoleOrBackWithinTheApplication(String role, String back, String landsOn)
            throws Exception {
        MockHttpServletRequest request = new MockHttpServletRequest();
        MockHttpServletResponse response = new MockHttpServletResponse();
        if (back != null) {
            request.setParameter("back", back);
        }
        new Landing(new NullRequestCache())
                .onAuthenticationSuccess(request, response, new TestingAuthenticationToken("a", "b", "ROLE_" + role));
        assertThat(response.getRedirectedUrl()).isEqualTo(landsOn);
    }
}
