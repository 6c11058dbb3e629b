package plusward.rules;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import plusward.course.Visit;
import plusward.exam.Eye;
import plusward.exam.PerEye;
import plusward.exam.Reason;
import plusward.optics.Dioptres;
import plusward.optics.Lens;

/**
 * This visit's cycloplegic refraction shows less plus than the manifest one, or is far from one of the last 6 months.
 *
 * <p>Spherical equivalents, eye by eye. Undecided when an eye that was refracted has nothing to be compared with.
 */
final class CycloplegiaDoubtful implements Rule {

    /** How far a cycloplegic refraction may fall under the manifest one: 0.25 D (common practice, no source). */
    private static final Limit<Dioptres> UNDER_MANIFEST = Limit.atMost(Dioptres.of(0.25));

    /** How far two within six months may be apart: 1.00 D (common practice, no source). */
    private static final Limit<Dioptres> APART = Limit.atMost(Dioptres.of(1.00));

    private static final int RECENT_MONTHS = 6;

    @Override
    public String code() {
        return "cycloplegia-doubtful";
    }

    @Override
    public Source source() {
        return Source.COMMON_PRACTICE;
    }

    @Override
    public List<Weight> weights() {
        return List.of(Weight.LOOK);
    }

    @Override
    public Finding judge(Situation situation) {
        Visit visit = situation.visit();
        if (visit.exam().cycloplegic().isEmpty()) {
            return notApplicable("no-cycloplegic-today");
        }
        return underManifest(visit)
                .or(() -> recent(visit)
                        .flatMap(other -> apart(visit, other).stream())
                        .findFirst())
                .orElseGet(() -> isCompared(visit) ? not(visit.date()) : missing(visit.date()));
    }

    private Optional<Finding> underManifest(Visit visit) {
        PerEye<Dioptres> under = underManifestBy(visit);
        if (under.measured().noneMatch(UNDER_MANIFEST::isCrossedBy)) {
            return Optional.empty();
        }
        Evidence evidence = Evidence.none()
                .andEyes("cycloplegic", cycloplegic(visit))
                .andEyes("manifest", manifest(visit))
                .andEyes("underManifest", under)
                .limit(UNDER_MANIFEST);
        Reason why = Reason.of("finding.cycloplegia-doubtful.under", visit.date(), EyeValues.of(under), UNDER_MANIFEST);
        return Optional.of(met(Weight.LOOK, evidence, checks(1), why));
    }

    /** True when this eye's cycloplegic refraction shows less plus than its manifest one, by more than is allowed. */
    static boolean isUnderManifest(Visit visit, Eye eye) {
        Dioptres under = underManifestBy(visit).of(eye);
        return under != null && UNDER_MANIFEST.isCrossedBy(under);
    }

    private static PerEye<Dioptres> underManifestBy(Visit visit) {
        return differences(manifest(visit), cycloplegic(visit));
    }

    private Optional<Finding> apart(Visit visit, Visit earlier) {
        PerEye<Dioptres> apart =
                differences(cycloplegic(visit), cycloplegic(earlier)).map(Dioptres::size);
        if (apart.measured().noneMatch(APART::isCrossedBy)) {
            return Optional.empty();
        }
        Evidence evidence = Evidence.of("earlierOn", earlier.date())
                .andEyes("cycloplegic", cycloplegic(visit))
                .andEyes("earlier", cycloplegic(earlier))
                .andEyes(apart)
                .limit(APART);
        Reason why = Reason.of(
                "finding.cycloplegia-doubtful.apart",
                visit.date(),
                EyeValues.written(Size.each(apart)),
                earlier.date(),
                APART);
        return Optional.of(met(Weight.LOOK, evidence, checks(1), why));
    }

    /** True when each eye that was refracted stands beside a manifest refraction or an earlier cycloplegic one. */
    private static boolean isCompared(Visit visit) {
        return Stream.of(Eye.values())
                .filter(eye -> cycloplegic(visit).of(eye) != null)
                .allMatch(eye -> manifest(visit).of(eye) != null
                        || recent(visit).anyMatch(each -> cycloplegic(each).of(eye) != null));
    }

    private static Stream<Visit> recent(Visit visit) {
        LocalDate earliest = visit.date().minusMonths(RECENT_MONTHS);
        return visit.before().filter(each -> !each.date().isBefore(earliest));
    }

    private static PerEye<Dioptres> cycloplegic(Visit visit) {
        return visit.exam().cycloplegic().refraction().map(Lens::sphericalEquivalent);
    }

    private static PerEye<Dioptres> manifest(Visit visit) {
        return visit.exam().manifest().map(Lens::sphericalEquivalent);
    }

    private static PerEye<Dioptres> differences(PerEye<Dioptres> one, PerEye<Dioptres> other) {
        return new PerEye<>(difference(one.right(), other.right()), difference(one.left(), other.left()));
    }

    private static @Nullable Dioptres difference(@Nullable Dioptres one, @Nullable Dioptres other) {
        return one == null || other == null ? null : one.minus(other);
    }
}
