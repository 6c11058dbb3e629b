package plusward.people;

import java.nio.charset.StandardCharsets;
import org.springframework.validation.Errors;

/**
 * What a password must be: 12 characters or more, and at most 72 bytes, beyond which bcrypt would not read it.
 *
 * <p>Length is asked for, no mixture of kinds: common practice, no source.
 */
final class Passphrase {

    static final int SHORTEST = 12;
    private static final int MOST_BYTES = 72;

    private Passphrase() {}

    static void check(String password, Errors errors) {
        if (password.length() < SHORTEST) {
            errors.rejectValue("password", "people.password.short");
        } else if (password.getBytes(StandardCharsets.UTF_8).length > MOST_BYTES) {
            errors.rejectValue("password", "people.password.long");
        }
    }
}
