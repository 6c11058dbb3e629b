package plusward.web;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.time.LocalDate;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.springframework.context.NoSuchMessageException;
import org.springframework.context.support.StaticMessageSource;
import plusward.exam.Eye;
import plusward.exam.Reason;
import plusward.optics.Dioptres;

class SentencesTests {

    private final StaticMessageSource messages = new StaticMessageSource();
    private final Sentences sentences = new Sentences(messages, new Shown(messages));

    SentencesTests() {
        messages.setAlwaysUseMessageFormat(true);
        messages.addMessage("shown.quantity", Locale.ENGLISH, "{0} {1}");
        messages.addMessage("eye.right", Locale.ENGLISH, "right");
        messages.addMessage("short", Locale.ENGLISH, "the {0} lens is {1} short on {2}");
        messages.addMessage("because", Locale.ENGLISH, "Not held, because {0}, {1} times");
        messages.addMessage("short", Locale.forLanguageTag("es"), "faltan {1}");
        messages.addMessage("shown.quantity", Locale.forLanguageTag("es"), "{0} {1}");
        messages.addMessage("eye.right", Locale.forLanguageTag("es"), "derecho");
    }

    private static final Reason SHORT = Reason.of("short", Eye.RIGHT, Dioptres.of(-1), LocalDate.of(2026, 3, 14));

    @Test
    void putsTheValuesInAsTheyAreShown() {
        assertThat(sentences.of(SHORT, Locale.ENGLISH)).isEqualTo("the right lens is −1.00 D short on 2026-03-14");
    }

    @Test
    void wordsAReasonWithinAReason() {
        assertThat(sentences.of(Reason.of("because", SHORT, 12), Locale.ENGLISH))
                .isEqualTo("Not held, because the right lens is −1.00 D short on 2026-03-14, 12 times");
    }

    @Test
    void speaksTheLanguageAskedFor() {
        assertThat(sentences.of(SHORT, Locale.forLanguageTag("es"))).isEqualTo("faltan −1.00 D");
    }

    @Test
    void refusesAKeyThatNoBundleHasRatherThanShowingIt() {
        assertThatThrownBy(() -> sentences.of(Reason.of("nowhere"), Locale.ENGLISH))
                .isInstanceOf(NoSuchMessageException.class);
    }
}
