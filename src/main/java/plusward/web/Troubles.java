package plusward.web;

import java.security.SecureRandom;
import java.time.Clock;
import java.time.LocalDateTime;
import java.time.format.DateTimeFormatter;
import java.util.Locale;
import org.jspecify.annotations.Nullable;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import org.springframework.dao.OptimisticLockingFailureException;
import org.springframework.http.HttpStatus;
import org.springframework.http.HttpStatusCode;
import org.springframework.security.web.csrf.CsrfException;
import org.springframework.web.ErrorResponse;
import org.springframework.web.method.annotation.MethodArgumentTypeMismatchException;
import org.springframework.web.multipart.MaxUploadSizeExceededException;
import org.springframework.web.multipart.MultipartException;

/** Decides what a failure is called on the page, and logs the cause of those that the page cannot name. */
final class Troubles {

    private static final Logger LOG = LoggerFactory.getLogger(Troubles.class);
    private static final DateTimeFormatter MINUTE = DateTimeFormatter.ofPattern("yyyyMMdd-HHmm", Locale.ROOT);

    private final Clock clock;
    private final SecureRandom random = new SecureRandom();

    Troubles(Clock clock) {
        this.clock = clock;
    }

    Trouble of(Throwable cause, String where) {
        return of(statusOf(cause), where, cause);
    }

    Trouble of(HttpStatusCode status, String where, @Nullable Throwable cause) {
        // a form whose token belongs to an earlier sign-in
        String key = cause instanceof CsrfException ? "stale" : keyOf(status);
        boolean explained = !key.equals("unexpected") && !key.equals("refused");
        return new Trouble(status, key, explained ? null : logged(status, where, cause));
    }

    private String logged(HttpStatusCode status, String where, @Nullable Throwable cause) {
        String reference = MINUTE.format(LocalDateTime.now(clock)) + "-" + hex(random.nextInt(0x10000));
        if (status.is5xxServerError()) {
            LOG.error("Report {}: {}", reference, where, cause);
        } else {
            LOG.warn("Report {}: {} {}", reference, status.value(), where, cause);
        }
        return reference;
    }

    private static String hex(int number) {
        return String.format(Locale.ROOT, "%04x", number);
    }

    private static HttpStatusCode statusOf(Throwable cause) {
        if (cause instanceof ErrorResponse known) {
            return known.getStatusCode();
        }
        if (cause instanceof OptimisticLockingFailureException) {
            return HttpStatus.CONFLICT;
        }
        if (cause instanceof MultipartException) {
            return cause instanceof MaxUploadSizeExceededException
                    ? HttpStatus.CONTENT_TOO_LARGE
                    : HttpStatus.BAD_REQUEST;
        }
        // an address such as /children/abc, where a number belongs
        return cause instanceof MethodArgumentTypeMismatchException
                ? HttpStatus.NOT_FOUND
                : HttpStatus.INTERNAL_SERVER_ERROR;
    }

    private static String keyOf(HttpStatusCode status) {
        return switch (status.value()) {
            case 401, 403 -> "forbidden";
            case 404, 405, 410 -> "missing";
            case 409 -> "conflict";
            case 413 -> "too-large";
            default -> status.is4xxClientError() ? "refused" : "unexpected";
        };
    }
}
