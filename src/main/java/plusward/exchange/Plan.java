package plusward.exchange;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.List;
import java.util.stream.Stream;
import plusward.exchange.Outcome.Change;
import plusward.exchange.Outcome.Counts;

/** A file pair judged against the clinic as it is now: what would be stored, and what is refused. */
record Plan(Outcome<ChildFacts> children, Outcome<VisitFacts> visits, Refusals refusals) {

    boolean isRefused() {
        return !refusals.isEmpty();
    }

    Counts counts() {
        return children.counts().plus(visits.counts());
    }

    Counts countsOf(CsvKind file) {
        return file == CsvKind.CHILDREN ? children.counts() : visits.counts();
    }

    List<Change> changes() {
        return Stream.concat(children.changes().stream(), visits.changes().stream())
                .toList();
    }

    /** Equal for two plans that would do the same; what was looked at is what is stored, or nothing is. */
    String fingerprint() {
        MessageDigest digest = sha256();
        Stream.of(children.added(), children.changed(), visits.added(), visits.changed(), changes())
                .forEach(part -> {
                    part.forEach(each -> digest.update(each.toString().getBytes(StandardCharsets.UTF_8)));
                    digest.update((byte) 0);
                });
        return HexFormat.of().formatHex(digest.digest());
    }

    private static MessageDigest sha256() {
        try {
            return MessageDigest.getInstance("SHA-256");
        } catch (NoSuchAlgorithmException everyJavaHasIt) {
            throw new IllegalStateException(everyJavaHasIt);
        }
    }
}
