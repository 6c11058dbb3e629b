package plusward.people;

import jakarta.servlet.FilterChain;
import jakarta.servlet.ServletException;
import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import org.springframework.web.filter.OncePerRequestFilter;

/** While nobody can sign in, every page leads to the one that makes the first administrator. */
final class EmptyClinicFilter extends OncePerRequestFilter {

    private static final String FIRST = "/first-administrator";

    private final Accounts accounts;

    EmptyClinicFilter(Accounts accounts) {
        this.accounts = accounts;
    }

    @Override
    protected boolean shouldNotFilter(HttpServletRequest request) {
        String path = request.getServletPath();
        return path.equals(FIRST)
                || path.startsWith("/api/")
                || path.startsWith("/actuator/")
                || path.startsWith("/webjars/")
                || path.matches("/[^/]*\\.(css|js|svg)");
    }

    @Override
    protected void doFilterInternal(HttpServletRequest request, HttpServletResponse response, FilterChain chain)
            throws ServletException, IOException {
        if (accounts.isEmpty()) {
            response.sendRedirect(request.getContextPath() + FIRST);
        } else {
            chain.doFilter(request, response);
        }
    }
}
