package plusward.handout;

import java.util.Comparator;
import java.util.Optional;
import plusward.course.CycloplegicInForce;
import plusward.exam.Eye;
import plusward.exam.PerEye;
import plusward.optics.Accommodation;
import plusward.optics.Age;
import plusward.optics.Amplitude;
import plusward.optics.Dioptres;

/** What the child's hyperopia costs without glasses, far away. */
record Focusing(CycloplegicInForce cycloplegic, Age age) {

    /** As in the finding {@code unequal-hyperopia} (common practice, no source). */
    private static final Dioptres UNEQUAL_FROM = Dioptres.of(1.00);

    /** Below this there is no hyperopia to explain (common practice, no source). */
    private static final Dioptres WORTH_SAYING_FROM = Dioptres.of(0.50);

    /** The youngest children of the series by which amplitude is told: Anderson et al., IOVS 2008;49:2919 (from memory). */
    private static final Age AMPLITUDE_FROM = Age.of(3);

    private PerEye<Dioptres> eyes() {
        return cycloplegic.equivalent();
    }

    /** True when one eye has at least 1.00 D more than the other. */
    boolean isUnequal() {
        Dioptres right = eyes().right();
        Dioptres left = eyes().left();
        return right != null && left != null && !right.minus(left).size().isUnder(UNEQUAL_FROM);
    }

    /** The eye with more hyperopia, or the only one that was refracted. */
    Eye strongerEye() {
        Dioptres right = eyes().right();
        Dioptres left = eyes().left();
        return left == null || (right != null && right.isOver(left)) ? Eye.RIGHT : Eye.LEFT;
    }

    /** The hyperopia of that eye. */
    Dioptres most() {
        return eyes().measured().max(Comparator.naturalOrder()).orElse(Dioptres.ZERO);
    }

    /**
     * The focusing that seeing far away takes: by the mean of the eyes, or, where they are unequal, by the eye that needs
     * less, since no child is known to focus for the other.
     */
    Dioptres need() {
        Dioptres hyperopia =
                isUnequal() ? eyes().measured().min(Comparator.naturalOrder()).orElseThrow() : cycloplegic.hyperopia();
        return Accommodation.neededForDistance(hyperopia, Dioptres.ZERO);
    }

    static boolean isWorthSaying(Dioptres hyperopia) {
        return !hyperopia.isUnder(WORTH_SAYING_FROM);
    }

    boolean isWorthSaying() {
        return isWorthSaying(need());
    }

    /** How near a thing would have to be for an eye without hyperopia to focus as hard: 100/D. +4.00 D is 25 cm. */
    long centimetres() {
        return Math.round(100 / need().amount());
    }

    /** The same to the nearest inch. */
    long inches() {
        return Math.round(100 / need().amount() / 2.54);
    }

    /**
     * The focusing power of children of this age, by the lower of the published figures, which in a child is the objectively
     * measured mean. Empty below 3 years, and where the other figure would be the lower, as it is no mean.
     */
    Optional<Dioptres> amplitude() {
        Dioptres mean = Amplitude.objectiveMean(age);
        return age.isUnder(AMPLITUDE_FROM) || mean.isOver(Amplitude.least(age)) ? Optional.empty() : Optional.of(mean);
    }

    /** What part of that power is used: 4.00 of 7.30 D is 0.55. */
    Optional<Double> share() {
        return amplitude().map(power -> need().amount() / power.amount());
    }
}
