package plusward.rules;

import java.time.LocalDate;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import plusward.course.Visit;
import plusward.exam.PerEye;
import plusward.exam.Reason;
import plusward.optics.Dioptres;
import plusward.optics.Lens;

/** This visit's cycloplegic refraction shows less plus than the manifest one, or is far from one of the last 6 months. */
final class CycloplegiaDoubtful implements Rule {

    /** How far a cycloplegic refraction may fall under the manifest one: 0.25 D (common practice, no source). */
    private static final Limit<Dioptres> UNDER_MANIFEST = Limit.atMost(Dioptres.of(0.25));

    private static final int RECENT_MONTHS = 6;
    private static final Limit<Dioptres> APART = Limit.atMost(Dioptres.of(1.00));

    @Override
    public String code() {
        return "cycloplegia-doubtful";
    }

    @Override
    public Source source() {
        return Source.COMMON_PRACTICE;
    }

    @Override
    public Finding judge(Situation situation) {
        Visit visit = situation.visit();
        if (visit.exam().cycloplegic().isEmpty()) {
            return notApplicable("no-cycloplegic-today");
        }
        PerEye<Dioptres> now = cycloplegic(visit);
        Optional<Visit> earlier = earlier(visit);
        return underManifest(now, visit.exam().manifest().map(Lens::sphericalEquivalent))
                .or(() -> earlier.flatMap(other -> apart(now, other)))
                .orElseGet(() -> visit.exam().manifest().isEmpty() && earlier.isEmpty() ? missing() : not());
    }

    private Optional<Finding> underManifest(PerEye<Dioptres> cycloplegic, PerEye<Dioptres> manifest) {
        PerEye<Dioptres> under = differences(manifest, cycloplegic);
        Evidence evidence = Evidence.of("underManifestRight", under.right())
                .and("underManifestLeft", under.left())
                .limit(UNDER_MANIFEST);
        Reason why = Reason.of("finding.cycloplegia-doubtful.under", EyeValues.of(under), UNDER_MANIFEST);
        return under.measured().anyMatch(UNDER_MANIFEST::isCrossedBy)
                ? Optional.of(met(Weight.LOOK, evidence, checks(1), why))
                : Optional.empty();
    }

    private Optional<Finding> apart(PerEye<Dioptres> now, Visit earlier) {
        PerEye<Dioptres> apart = differences(now, cycloplegic(earlier)).map(Dioptres::size);
        Evidence evidence =
                Evidence.of("earlierOn", earlier.date()).andEyes(apart).limit(APART);
        Reason why = Reason.of("finding.cycloplegia-doubtful.apart", EyeValues.of(apart), earlier.date(), APART);
        return apart.measured().anyMatch(APART::isCrossedBy)
                ? Optional.of(met(Weight.LOOK, evidence, checks(1), why))
                : Optional.empty();
    }

    private static Optional<Visit> earlier(Visit visit) {
        LocalDate earliest = visit.date().minusMonths(RECENT_MONTHS);
        return visit.lastBefore(
                each -> !each.exam().cycloplegic().isEmpty() && !each.date().isBefore(earliest));
    }

    private static PerEye<Dioptres> cycloplegic(Visit visit) {
        return visit.exam().cycloplegic().refraction().map(Lens::sphericalEquivalent);
    }

    private static PerEye<Dioptres> differences(PerEye<Dioptres> one, PerEye<Dioptres> other) {
        return new PerEye<>(difference(one.right(), other.right()), difference(one.left(), other.left()));
    }

    private static @Nullable Dioptres difference(@Nullable Dioptres one, @Nullable Dioptres other) {
        return one == null || other == null ? null : one.minus(other);
    }
}
