package plusward.people;

import jakarta.servlet.ServletException;
import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import org.springframework.security.core.AuthenticationException;
import org.springframework.security.web.authentication.LoginUrlAuthenticationEntryPoint;

/** Leads a stranger to the sign-in page; a request for a piece of a page is told so instead of getting that page. */
final class AskToSignIn extends LoginUrlAuthenticationEntryPoint {

    AskToSignIn() {
        super("/sign-in");
    }

    @Override
    public void commence(HttpServletRequest request, HttpServletResponse response, AuthenticationException cause)
            throws IOException, ServletException {
        if (request.getHeader("HX-Request") != null) {
            response.sendError(HttpServletResponse.SC_UNAUTHORIZED);
        } else {
            super.commence(request, response, cause);
        }
    }
}
