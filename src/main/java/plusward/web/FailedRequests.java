package plusward.web;

import jakarta.servlet.RequestDispatcher;
import jakarta.servlet.http.HttpServletRequest;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import org.springframework.boot.webmvc.error.ErrorController;
import org.springframework.http.HttpStatus;
import org.springframework.http.HttpStatusCode;
import org.springframework.security.web.WebAttributes;
import org.springframework.stereotype.Controller;
import org.springframework.web.bind.annotation.RequestMapping;

/** Answers what fails outside the handlers: refused by security, by the firewall, or by the server itself. */
@Controller
class FailedRequests implements ErrorController {

    private final Troubles troubles;
    private final ErrorAnswers answers;

    FailedRequests(Troubles troubles, ErrorAnswers answers) {
        this.troubles = troubles;
        this.answers = answers;
    }

    @RequestMapping("/error")
    Object answer(HttpServletRequest request) {
        String path = ErrorAnswers.pathOf(request);
        HttpStatusCode status = HttpStatusCode.valueOf(
                (Integer) read(request, RequestDispatcher.ERROR_STATUS_CODE, HttpStatus.NOT_FOUND.value()));
        @Nullable Throwable cause = causeOf(request);
        return answers.answer(troubles.of(status, request.getMethod() + " " + path, cause), path);
    }

    private static @Nullable Throwable causeOf(HttpServletRequest request) {
        Object thrown = request.getAttribute(RequestDispatcher.ERROR_EXCEPTION);
        return (Throwable) (thrown == null ? request.getAttribute(WebAttributes.ACCESS_DENIED_403) : thrown);
    }

    private static Object read(HttpServletRequest request, String attribute, Object otherwise) {
        return Optional.ofNullable(request.getAttribute(attribute)).orElse(otherwise);
    }
}
