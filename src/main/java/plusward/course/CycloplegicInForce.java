package plusward.course;

import java.time.LocalDate;
import java.util.Optional;
import plusward.exam.PerEye;
import plusward.optics.Dioptres;
import plusward.optics.Lens;

/**
 * The cycloplegic refraction by which a visit is judged: the latest at or before it, at most 24 calendar months old.
 *
 * @param takenOn the day of that refraction
 * @param equivalent its spherical equivalents in dioptres; an eye that was not refracted is missing
 */
public record CycloplegicInForce(LocalDate takenOn, PerEye<Dioptres> equivalent) {

    private static final int OLDEST_MONTHS = 24;

    /** Empty when there is none, or when the latest is older than 24 calendar months on the day of the visit. */
    public static Optional<CycloplegicInForce> at(Visit visit) {
        return latest(visit).filter(found -> !visit.date().isAfter(found.takenOn.plusMonths(OLDEST_MONTHS)));
    }

    /** The latest at or before the visit, however old. */
    public static Optional<CycloplegicInForce> latest(Visit visit) {
        return visit.upToHere()
                .filter(each -> !each.exam().cycloplegic().isEmpty())
                .findFirst()
                .map(each -> new CycloplegicInForce(
                        each.date(), each.exam().cycloplegic().refraction().map(Lens::sphericalEquivalent)));
    }

    /** The child's hyperopia: the mean of the eyes that were refracted. */
    public Dioptres hyperopia() {
        return Worn.mean(equivalent);
    }
}
