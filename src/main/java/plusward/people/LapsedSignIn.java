package plusward.people;

import jakarta.servlet.ServletException;
import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import java.net.URI;
import org.jspecify.annotations.Nullable;
import org.springframework.http.HttpHeaders;
import org.springframework.security.access.AccessDeniedException;
import org.springframework.security.core.context.SecurityContextHolder;
import org.springframework.security.web.WebAttributes;
import org.springframework.security.web.access.AccessDeniedHandler;
import org.springframework.security.web.access.AccessDeniedHandlerImpl;
import org.springframework.security.web.csrf.CsrfException;
import org.springframework.web.util.UriComponentsBuilder;

/**
 * A form sent after the sign-in has lapsed: leads to the sign-in page and from there back to the form, whose draft was
 * kept, instead of to a refusal.
 */
final class LapsedSignIn implements AccessDeniedHandler {

    private final AccessDeniedHandler refusal = new AccessDeniedHandlerImpl();

    @Override
    public void handle(HttpServletRequest request, HttpServletResponse response, AccessDeniedException cause)
            throws IOException, ServletException {
        if (!(cause instanceof CsrfException) || isSignedIn()) {
            request.setAttribute(WebAttributes.ACCESS_DENIED_403, cause);
            refusal.handle(request, response, cause);
        } else if (request.getHeader("HX-Request") != null) {
            response.sendError(HttpServletResponse.SC_UNAUTHORIZED);
        } else {
            response.sendRedirect(request.getContextPath() + signInAndReturn(request));
        }
    }

    private static boolean isSignedIn() {
        return SecurityContextHolder.getContext().getAuthentication() != null;
    }

    private static String signInAndReturn(HttpServletRequest request) {
        return UriComponentsBuilder.fromPath("/sign-in")
                .queryParam("away")
                .queryParam("back", "{page}")
                .encode()
                .buildAndExpand(pageOf(request.getHeader(HttpHeaders.REFERER), request.getContextPath()))
                .toUriString();
    }

    private static String pageOf(@Nullable String referer, String contextPath) {
        try {
            String path = referer == null ? "" : URI.create(referer).getPath();
            return path != null && path.startsWith(contextPath + "/") ? path.substring(contextPath.length()) : "/";
        } catch (IllegalArgumentException unreadable) {
            return "/";
        }
    }
}
