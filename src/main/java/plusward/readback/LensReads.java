package plusward.readback;

import java.util.Optional;
import java.util.stream.Stream;
import plusward.course.Visit;
import plusward.exam.Eye;
import plusward.exam.LensMeasure;
import plusward.exam.Reason;
import plusward.optics.Dioptres;
import plusward.optics.Lens;

/** A lens read back: its spherical equivalent, and the change since it was last measured. */
final class LensReads {

    private LensReads() {}

    static Stream<Reason> of(Visit visit, LensMeasure measure, Eye eye) {
        return measure.in(visit.exam(), eye).stream()
                .flatMap(lens -> Stream.concat(
                        Stream.of(Reason.of("readback.lens.equivalent", lens.sphericalEquivalent())),
                        change(visit, measure, eye, lens).stream()));
    }

    private static Optional<Reason> change(Visit visit, LensMeasure measure, Eye eye, Lens now) {
        return visit.lastBefore(each -> measure.in(each.exam(), eye).isPresent())
                .map(then -> change(then, measure.in(then.exam(), eye).orElseThrow(), now));
    }

    private static Reason change(Visit then, Lens before, Lens now) {
        Dioptres change = now.sphericalEquivalent().minus(before.sphericalEquivalent());
        if (now.isSamePowerAs(before)) {
            return Reason.of("readback.same", then.date());
        }
        String key = change.amount() == 0 ? "readback.lens.cylinder" : "readback.lens.change";
        return Reason.of(key, change, then.date());
    }
}
