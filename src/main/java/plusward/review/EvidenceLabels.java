package plusward.review;

import java.util.Set;
import org.springframework.context.MessageSource;
import org.springframework.context.i18n.LocaleContextHolder;
import org.springframework.stereotype.Component;
import plusward.rules.Finding;
import plusward.web.Shown;

/** Names the numbers behind a finding on the screen; in templates as {@code @evidence}. */
@Component("evidence")
final class EvidenceLabels {

    /** Their check-first lines are the ladder, which the page shows right under the answer. */
    private static final Set<String> WITH_LADDER = Set.of("turn-not-held", "control-lost");

    private final MessageSource messages;
    private final Shown shown;

    EvidenceLabels(MessageSource messages, Shown shown) {
        this.messages = messages;
        this.shown = shown;
    }

    /** A number as it is shown; of a condition its name. */
    public String shown(String name, Object value) {
        return name.equals("condition") ? worded("condition." + value) : shown.of(value);
    }

    public String label(String name) {
        return worded("evidence." + name);
    }

    private String worded(String key) {
        return messages.getMessage(key, null, LocaleContextHolder.getLocale());
    }

    public boolean standsAbove(Finding.Met finding) {
        return WITH_LADDER.contains(finding.code());
    }
}
