package plusward.course;

import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import plusward.exam.PerEye;
import plusward.exam.TurnCondition;
import plusward.optics.Dioptres;
import plusward.optics.Lens;
import plusward.optics.PrismDioptres;
import plusward.optics.ThroughGlasses;

/**
 * What follows from one visit's measurements, before any judgement. Everything may be missing.
 *
 * @param cycloplegic spherical equivalent found at this visit under cycloplegia, in dioptres
 * @param inForce the cycloplegic refraction by which the visit is judged; absent when none is recent enough
 * @param manifest spherical equivalent found at this visit without drops
 * @param worn spherical equivalent of the glasses worn, as ordered
 * @param latent hyperopia that only cycloplegia showed: cycloplegic minus manifest, both of this visit
 * @param shortBy how far worn plus falls short of the cycloplegic refraction in force; negative is too much
 * @param turns horizontal turns, inward positive
 * @param turnsTrue distance readings through glasses, corrected for the prismatic effect of the lenses
 */
public record Derived(
        PerEye<Dioptres> cycloplegic,
        @Nullable CycloplegicInForce inForce,
        PerEye<Dioptres> manifest,
        PerEye<Dioptres> worn,
        PerEye<Dioptres> latent,
        PerEye<Dioptres> shortBy,
        Map<TurnCondition, PrismDioptres> turns,
        Map<TurnCondition, PrismDioptres> turnsTrue) {

    public static Derived at(Visit visit) {
        PerEye<Dioptres> cycloplegic = equivalents(visit.exam().cycloplegic().refraction());
        PerEye<Dioptres> manifest = equivalents(visit.exam().manifest());
        return new Derived(
                cycloplegic,
                CycloplegicInForce.at(visit).orElse(null),
                manifest,
                Worn.equivalent(visit.glasses()),
                new PerEye<>(
                        difference(cycloplegic.right(), manifest.right()),
                        difference(cycloplegic.left(), manifest.left())),
                Worn.shortBy(visit),
                turns(visit),
                turnsTrue(visit));
    }

    private static PerEye<Dioptres> equivalents(PerEye<Lens> refraction) {
        return refraction.map(Lens::sphericalEquivalent);
    }

    private static @Nullable Dioptres difference(@Nullable Dioptres one, @Nullable Dioptres other) {
        return one == null || other == null ? null : one.minus(other);
    }

    private static Map<TurnCondition, PrismDioptres> turns(Visit visit) {
        Map<TurnCondition, PrismDioptres> turns = new EnumMap<>(TurnCondition.class);
        for (TurnCondition condition : TurnCondition.values()) {
            PrismDioptres turn = visit.exam().turns().signedAt(condition);
            if (turn != null) {
                turns.put(condition, turn);
            }
        }
        return turns;
    }

    private static Map<TurnCondition, PrismDioptres> turnsTrue(Visit visit) {
        return trueDistance(visit)
                .map(turn -> Map.of(TurnCondition.CC_DISTANCE, turn))
                .orElse(Map.of());
    }

    private static Optional<PrismDioptres> trueDistance(Visit visit) {
        PrismDioptres read = visit.exam().turns().signedAt(TurnCondition.CC_DISTANCE);
        PerEye<Lens> lenses = visit.glasses().asOrdered().lenses();
        Lens right = lenses.right();
        Lens left = lenses.left();
        return read == null || right == null || left == null
                ? Optional.empty()
                : ThroughGlasses.trueTurn(read, ThroughGlasses.horizontalPower(right, left));
    }
}
