package plusward.web;

import jakarta.servlet.http.HttpServletRequest;
import org.springframework.core.Ordered;
import org.springframework.core.annotation.Order;
import org.springframework.security.access.AccessDeniedException;
import org.springframework.security.core.AuthenticationException;
import org.springframework.web.bind.annotation.ControllerAdvice;
import org.springframework.web.bind.annotation.ExceptionHandler;

/** Answers whatever a page or the machine door throws and does not handle itself. */
@ControllerAdvice
@Order(Ordered.LOWEST_PRECEDENCE)
class FailedHandlers {

    private final Troubles troubles;
    private final ErrorAnswers answers;

    FailedHandlers(Troubles troubles, ErrorAnswers answers) {
        this.troubles = troubles;
        this.answers = answers;
    }

    /** Left to the security filters, which know whether to ask for a sign-in or to refuse. */
    @ExceptionHandler({AccessDeniedException.class, AuthenticationException.class})
    void leaveToSecurity(RuntimeException refusal) {
        throw refusal;
    }

    @ExceptionHandler
    Object answer(Exception cause, HttpServletRequest request) {
        String path = ErrorAnswers.pathOf(request);
        return answers.answer(troubles.of(cause, request.getMethod() + " " + path), path);
    }
}
