package plusward.course;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import plusward.exam.Eye;
import plusward.exam.Glasses;
import plusward.exam.PerEye;
import plusward.optics.Dioptres;
import plusward.optics.Lens;

/** The plus that is worn, against the hyperopia. Spherical equivalents in dioptres, as ordered. */
public final class Worn {

    /** How far worn plus may fall short and still be full: 0.50 D (common practice, no source). */
    public static final Dioptres FULL_WITHIN = Dioptres.of(0.50);

    private Worn() {}

    /** Whether the full plus is on. */
    public enum Fullness {
        /** In neither eye more than 0.50 D short. */
        FULL,
        /** More than 0.50 D short in an eye. */
        SHORT,
        /** Not to be told: an eye has no lens or no refraction on record, and no eye is known to be short. */
        UNKNOWN
    }

    /** The spherical equivalents of the lenses worn; a missing lens stays missing. */
    public static PerEye<Dioptres> equivalent(Glasses glasses) {
        return glasses.asOrdered().lenses().map(Lens::sphericalEquivalent);
    }

    /** The mean of the lenses on record; empty when there is none. */
    public static Optional<Dioptres> meanEquivalent(Glasses glasses) {
        return glasses.areWorn() ? Optional.of(mean(equivalent(glasses))) : Optional.empty();
    }

    /**
     * How far the glasses fall short of the cycloplegic refraction in force: cycloplegic minus worn, in dioptres; positive
     * is short, negative is too much. Missing for an eye without a lens or without a refraction.
     */
    public static PerEye<Dioptres> shortBy(Visit visit) {
        PerEye<Dioptres> worn = equivalent(visit.glasses());
        PerEye<Dioptres> found =
                CycloplegicInForce.at(visit).map(CycloplegicInForce::equivalent).orElse(PerEye.none());
        return new PerEye<>(
                worn.right() == null || found.right() == null
                        ? null
                        : found.right().minus(worn.right()),
                worn.left() == null || found.left() == null
                        ? null
                        : found.left().minus(worn.left()));
    }

    /** Against the cycloplegic refraction in force; 0.50 D short in an eye is still full. */
    public static Fullness fullness(Visit visit) {
        PerEye<Dioptres> shortBy = shortBy(visit);
        if (shortBy.measured().anyMatch(eye -> eye.isOver(FULL_WITHIN))) {
            return Fullness.SHORT;
        }
        return shortBy.isComplete() ? Fullness.FULL : Fullness.UNKNOWN;
    }

    /** The mean of the eyes that have a value; of none it is refused with {@link IllegalArgumentException}. */
    static Dioptres mean(PerEye<Dioptres> eyes) {
        List<Dioptres> values = eyes.measured().toList();
        if (values.isEmpty()) {
            throw new IllegalArgumentException("no eye to average");
        }
        Dioptres sum = values.stream().reduce(Dioptres.ZERO, Dioptres::plus);
        return sum.times(1.0 / values.size());
    }

    /** True when both visits' glasses have the same lenses, in either cylinder form, and the same add. */
    public static boolean isSame(Glasses one, Glasses other) {
        return one.asOrdered().addOrZero().equals(other.asOrdered().addOrZero())
                && isSame(one, other, Eye.RIGHT)
                && isSame(one, other, Eye.LEFT);
    }

    /** True when the powers are the same and no two dates of first wear, where both are known, tell two pairs apart. */
    public static boolean isSamePair(Glasses one, Glasses other) {
        LocalDate since = one.since();
        LocalDate otherSince = other.since();
        return isSame(one, other) && (since == null || otherSince == null || since.equals(otherSince));
    }

    private static boolean isSame(Glasses one, Glasses other, Eye eye) {
        Lens first = one.asOrdered().lenses().of(eye);
        Lens second = other.asOrdered().lenses().of(eye);
        return (first == null && second == null) || (first != null && second != null && first.isSamePowerAs(second));
    }
}
