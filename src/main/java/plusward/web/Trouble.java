package plusward.web;

import org.jspecify.annotations.Nullable;
import org.springframework.http.HttpStatusCode;

/**
 * What went wrong, as far as the reader needs to know.
 *
 * @param key the middle of the message keys {@code error.<key>.title} and {@code .text}
 * @param reference the number under which the log has the cause; absent where the page already says all there is
 */
record Trouble(HttpStatusCode status, String key, @Nullable String reference) {}
