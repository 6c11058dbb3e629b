package plusward.web;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.util.Locale;
import org.junit.jupiter.api.Test;

class BundlesTests {

    @Test
    void aNumberIsWrittenAsItIs() throws IOException {
        Object[] values = {2026, "D"};
        assertThat(new WebConfiguration().messageSource().getMessage("shown.quantity", values, Locale.ENGLISH))
                .isEqualTo("2026 D");
    }
}
