package plusward.handout;

import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import plusward.course.Visit;
import plusward.exam.LensPair;
import plusward.exam.PerEye;
import plusward.optics.Dioptres;
import plusward.optics.Lens;

/**
 * The lenses that the child has from this visit on: those ordered, and where none was ordered those worn.
 *
 * @param worn the glasses worn at the visit
 * @param ordered what was ordered at the visit
 */
record Lenses(LensPair worn, LensPair ordered) {

    static Lenses after(Visit visit) {
        return new Lenses(visit.glasses().asOrdered(), visit.exam().ordered());
    }

    /** True when neither worn nor ordered lenses are on record. */
    boolean areMissing() {
        return equivalent().isEmpty();
    }

    /** The spherical equivalents of the lenses to wear; a lens that is not on record stays missing. */
    PerEye<Dioptres> equivalent() {
        PerEye<Lens> eyes = new PerEye<>(
                Optional.ofNullable(ordered.lenses().right())
                        .orElse(worn.lenses().right()),
                Optional.ofNullable(ordered.lenses().left())
                        .orElse(worn.lenses().left()));
        return eyes.map(Lens::sphericalEquivalent);
    }

    /** The near add to wear; 0 for none. A new pair of lenses without an add has none. */
    Dioptres add() {
        boolean newPair = ordered.lenses().isComplete() || ordered.hasAdd();
        return newPair ? ordered.addOrZero() : worn.addOrZero();
    }

    boolean haveAdd() {
        return add().isOver(Dioptres.ZERO);
    }

    /** The mean of the lenses on record; empty when there is none. */
    Optional<Dioptres> mean() {
        List<Dioptres> lenses = equivalent().measured().toList();
        return lenses.stream().reduce(Dioptres::plus).map(sum -> sum.times(1.0 / lenses.size()));
    }

    /** True when the lenses on record are plus lenses on average. */
    boolean arePlus() {
        return mean().filter(lens -> lens.isOver(Dioptres.ZERO)).isPresent();
    }

    /** True when lenses were ordered that differ from those worn. */
    boolean areNew() {
        return !ordered.isEmpty()
                && (!add().equals(worn.addOrZero())
                        || isChanged(ordered.lenses().right(), worn.lenses().right())
                        || isChanged(ordered.lenses().left(), worn.lenses().left()));
    }

    boolean areFirst() {
        return areNew() && worn.lenses().isEmpty();
    }

    private static boolean isChanged(@Nullable Lens ordered, @Nullable Lens worn) {
        return ordered != null && (worn == null || !ordered.isSamePowerAs(worn));
    }
}
