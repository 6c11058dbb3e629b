package plusward.exchange;

import jakarta.servlet.FilterChain;
import jakarta.servlet.ServletException;
import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import org.springframework.beans.factory.annotation.Value;
import org.springframework.core.Ordered;
import org.springframework.core.annotation.Order;
import org.springframework.stereotype.Component;
import org.springframework.util.unit.DataSize;
import org.springframework.web.filter.OncePerRequestFilter;

/**
 * Says that an upload is too large before the form is read.
 *
 * <p>Later it would look like a form without its token, since the server drops all fields of a form that is too large.
 */
@Component
@Order(Ordered.HIGHEST_PRECEDENCE)
class LargeUploads extends OncePerRequestFilter {

    private final DataSize most;

    LargeUploads(@Value("${spring.servlet.multipart.max-request-size}") DataSize most) {
        this.most = most;
    }

    @Override
    protected void doFilterInternal(HttpServletRequest request, HttpServletResponse response, FilterChain chain)
            throws ServletException, IOException {
        if (request.getContentLengthLong() > most.toBytes()) {
            response.sendError(HttpServletResponse.SC_REQUEST_ENTITY_TOO_LARGE);
        } else {
            chain.doFilter(request, response);
        }
    }
}
