package plusward.review;

import java.util.Set;
import org.springframework.context.MessageSource;
import org.springframework.context.i18n.LocaleContextHolder;
import org.springframework.stereotype.Component;
import plusward.rules.Finding;

/** Names the numbers behind a finding on the screen; in templates as {@code @evidence}. */
@Component("evidence")
final class EvidenceLabels {

    /** Their check-first lines are the ladder, which the page shows right under the answer. */
    private static final Set<String> WITH_LADDER = Set.of("turn-not-held", "control-lost");

    private final MessageSource messages;

    EvidenceLabels(MessageSource messages) {
        this.messages = messages;
    }

    public String label(String name) {
        return messages.getMessage("evidence." + name, null, LocaleContextHolder.getLocale());
    }

    public boolean standsAbove(Finding.Met finding) {
        return WITH_LADDER.contains(finding.code());
    }
}
