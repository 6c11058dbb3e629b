package plusward.people;

import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import org.jspecify.annotations.Nullable;
import org.springframework.security.core.Authentication;
import org.springframework.security.web.authentication.SavedRequestAwareAuthenticationSuccessHandler;
import org.springframework.security.web.savedrequest.RequestCache;

/** Where one lands after signing in: the page asked for, the form that was being filled in, or the first page of one's role. */
final class Landing extends SavedRequestAwareAuthenticationSuccessHandler {

    Landing(RequestCache asked) {
        setRequestCache(asked);
        setTargetUrlParameter("back");
    }

    @Override
    protected String determineTargetUrl(
            HttpServletRequest request, HttpServletResponse response, @Nullable Authentication person) {
        String back = request.getParameter("back");
        return back != null && isOurs(back) ? back : firstPage(person);
    }

    /** A path of this application and nothing that a browser would take for another site. */
    private static boolean isOurs(String path) {
        return path.matches("/(?:[A-Za-z0-9_.~-][A-Za-z0-9_.~/-]*)?");
    }

    private static String firstPage(@Nullable Authentication person) {
        boolean clinical = person != null
                && person.getAuthorities().stream()
                        .map(each -> String.valueOf(each.getAuthority()))
                        .anyMatch(role -> role.equals("ROLE_STAFF") || role.equals("ROLE_DOCTOR"));
        return clinical ? "/" : "/exchange";
    }
}
