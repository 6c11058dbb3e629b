package plusward.web;

import jakarta.servlet.RequestDispatcher;
import jakarta.servlet.http.HttpServletRequest;
import java.net.URI;
import java.util.Locale;
import org.jspecify.annotations.Nullable;
import org.springframework.context.MessageSource;
import org.springframework.http.HttpHeaders;
import org.springframework.http.HttpStatus;
import org.springframework.http.MediaType;
import org.springframework.http.ProblemDetail;
import org.springframework.http.ResponseEntity;
import org.springframework.web.servlet.ModelAndView;

/** The answer to a failure: a page for people, problem details (RFC 9457) for machines. Neither shows exception text. */
final class ErrorAnswers {

    private final MessageSource messages;

    ErrorAnswers(MessageSource messages) {
        this.messages = messages;
    }

    /** A {@link ModelAndView} or, under {@code /api/}, a {@link ResponseEntity}. */
    Object answer(Trouble trouble, String path) {
        return path.startsWith("/api/") ? problem(trouble, path) : page(trouble);
    }

    /** The path that was asked for, also while the server asks for its error page. */
    static String pathOf(HttpServletRequest request) {
        Object asked = request.getAttribute(RequestDispatcher.ERROR_REQUEST_URI);
        String path = asked == null ? request.getRequestURI() : asked.toString();
        return path.substring(request.getContextPath().length());
    }

    private static ModelAndView page(Trouble trouble) {
        ModelAndView page = new ModelAndView("web/error");
        page.setStatus(trouble.status());
        page.addObject("trouble", trouble);
        return page;
    }

    private ResponseEntity<ProblemDetail> problem(Trouble trouble, String path) {
        boolean unknown = trouble.status().isSameCodeAs(HttpStatus.UNAUTHORIZED);
        String detail = word("error.api." + (unknown ? "sign-in" : trouble.key()), trouble.reference());
        ProblemDetail problem = ProblemDetail.forStatusAndDetail(trouble.status(), detail);
        problem.setTitle(word("error." + trouble.key() + ".title", null));
        problem.setInstance(URI.create(path));
        if (trouble.reference() != null) {
            problem.setProperty("reference", trouble.reference());
        }
        return ResponseEntity.status(trouble.status())
                .header(HttpHeaders.CONTENT_TYPE, MediaType.APPLICATION_PROBLEM_JSON_VALUE)
                .body(problem);
    }

    private String word(String key, @Nullable String value) {
        return messages.getMessage(key, new Object[] {String.valueOf(value)}, Locale.ENGLISH);
    }
}
