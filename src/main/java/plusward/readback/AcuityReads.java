package plusward.readback;

import java.util.Optional;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import plusward.course.Visit;
import plusward.exam.Acuity;
import plusward.exam.Examination;
import plusward.exam.Reason;
import plusward.optics.LogMar;

/** An acuity read back in logMAR, beside the last one; what is not read on a chart has no number and is not compared. */
final class AcuityReads {

    /** Which acuity of an examination. */
    interface Which extends Function<Examination, @Nullable Acuity> {}

    /** A smaller difference would read as 0.00: 20/25 is 0.0969. */
    private static final LogMar SHOWN = LogMar.of(0.005);

    private AcuityReads() {}

    static Optional<Reason> of(Visit visit, Which which) {
        return logMar(visit, which)
                .map(now -> visit.lastBefore(each -> logMar(each, which).isPresent())
                        .map(then -> beside(then, logMar(then, which).orElseThrow(), now))
                        .orElseGet(() -> Reason.of("readback.acuity", now)));
    }

    private static Reason beside(Visit then, LogMar before, LogMar now) {
        LogMar change = now.minus(before);
        String key = change.size().isUnder(SHOWN) ? "same" : change.amount() < 0 ? "better" : "worse";
        return Reason.of("readback.acuity." + key, now, change.size(), then.date());
    }

    private static Optional<LogMar> logMar(Visit visit, Which which) {
        return Optional.ofNullable(which.apply(visit.exam())).flatMap(Acuity::logMar);
    }
}
