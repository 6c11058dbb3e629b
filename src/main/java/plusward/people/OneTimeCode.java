package plusward.people;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.SecureRandom;
import java.util.Locale;
import java.util.stream.Collectors;
import org.springframework.stereotype.Component;

/**
 * The code that shows that whoever makes the first administrator also sees the console: 16 letters and digits without
 * look-alikes, new at each start, good for one use.
 */
@Component
class OneTimeCode {

    private static final String ALPHABET = "ABCDEFGHJKMNPQRSTUVWXYZ23456789";

    private final String code = new SecureRandom()
            .ints(16, 0, ALPHABET.length())
            .mapToObj(each -> ALPHABET.substring(each, each + 1))
            .collect(Collectors.joining());
    private boolean spent;

    /** In groups of four, as it is printed. */
    String printed() {
        return code.replaceAll("(.{4})(?!$)", "$1-");
    }

    /** True once, for the right code; blanks, dashes and case do not matter. */
    synchronized boolean spend(String typed) {
        String plain = typed.replaceAll("[\\s-]", "").toUpperCase(Locale.ROOT);
        boolean right = !spent && MessageDigest.isEqual(bytes(plain), bytes(code));
        spent = spent || right;
        return right;
    }

    private static byte[] bytes(String text) {
        return text.getBytes(StandardCharsets.UTF_8);
    }
}
