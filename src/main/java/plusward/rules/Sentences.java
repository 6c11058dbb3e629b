package plusward.rules;

import java.util.List;
import plusward.exam.Reason;

/** Several reasons as one. */
final class Sentences {

    private Sentences() {}

    static Reason joined(List<Reason> reasons) {
        return reasons.stream()
                .reduce((one, other) -> Reason.of("sentences.two", one, other))
                .orElseGet(() -> Reason.of("sentences.none"));
    }

    static Reason listed(List<Reason> reasons) {
        return reasons.stream()
                .reduce((one, other) -> Reason.of("sentences.list", one, other))
                .orElseGet(() -> Reason.of("sentences.none"));
    }
}
